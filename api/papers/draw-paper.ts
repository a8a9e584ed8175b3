import {
  PDFDocument,
  PDFHexString,
  closePath,
  degrees,
  fill as fillPath,
  grayscale,
  lineTo,
  moveTo,
  setDashPattern,
  setFillingGrayscaleColor,
  setLineWidth,
  setStrokingGrayscaleColor,
  stroke,
} from 'pdf-lib';
import type { PDFFont, PDFOperator, PDFPage } from 'pdf-lib';
import { createHash } from 'node:crypto';
import { widthOf } from './lettering';
import { rectangle } from './sheet';
import type { CircleMark, Mark, Paper, Pen, ShapeMark, Sheet, TextMark } from './sheet';
import { face, runsOf } from './typefaces';
import type { Coverage, FaceName } from './typefaces';
import type { Weight } from './sheet';

const POINTS_PER_MM = 72 / 25.4;
const PRODUCER = 'Leafwright';
/** Paper-white left around a text that a line breaks for. */
const CLEARANCE = 0.6;

type Fonts = ReadonlyMap<FaceName, PDFFont>;

/** Copies a paper out as a PDF. Nothing in it comes from the clock or from chance: the same paper gives the same bytes. */
export async function drawPaper(paper: Paper): Promise<Uint8Array> {
  const pdf = await PDFDocument.create({ updateMetadata: false });
  pdf.setTitle(paper.title);
  pdf.setAuthor(paper.author);
  pdf.setProducer(PRODUCER);
  pdf.setCreator(PRODUCER);
  pdf.setCreationDate(paper.issuedAt);
  pdf.setModificationDate(paper.issuedAt);
  const fonts = await embedFonts(pdf);
  for (const sheet of paper.sheets) drawSheet(pdf, sheet, fonts);
  const digest = createHash('sha256').update(JSON.stringify(paper)).digest('hex').slice(0, 32);
  pdf.context.trailerInfo.ID = pdf.context.obj([PDFHexString.of(digest), PDFHexString.of(digest)]);
  return pdf.save({ addDefaultPage: false });
}

/** The parsed faces are handed over as they are; pdf-lib would parse the bytes again for every paper. */
async function embedFonts(pdf: PDFDocument): Promise<Fonts> {
  const fonts = new Map<FaceName, PDFFont>();
  for (const weight of ['regular', 'semibold'] as const satisfies readonly Weight[]) {
    for (const coverage of ['Latin', 'LatinExt'] as const satisfies readonly Coverage[]) {
      const { name, bytes, font } = face(weight, coverage);
      pdf.registerFontkit({ create: () => font });
      // Ligatures and kerning would make the ink differ from what the layout measured.
      const features = { liga: false, kern: false, calt: false };
      fonts.set(name, await pdf.embedFont(bytes, { subset: true, features }));
    }
  }
  return fonts;
}

function drawSheet(pdf: PDFDocument, sheet: Sheet, fonts: Fonts): void {
  const page = pdf.addPage([sheet.width * POINTS_PER_MM, sheet.height * POINTS_PER_MM]);
  const pen = new SheetPen(page, sheet, fonts);
  const order = (mark: Mark): number => (mark.kind === 'text' ? 1 : mark.kind === 'watermark' ? 2 : 0);
  // Lines lie under texts, or a text's clearing could be crossed by a line drawn after it.
  for (const mark of [...sheet.marks].sort((a, b) => order(a) - order(b))) pen.draw(mark);
}

class SheetPen {
  constructor(
    private readonly page: PDFPage,
    private readonly sheet: Sheet,
    private readonly fonts: Fonts,
  ) {}

  draw(mark: Mark): void {
    switch (mark.kind) {
      case 'line':
        return this.path([mark.from, mark.to], mark.pen, null, false);
      case 'shape':
        return this.path(mark.points, mark.pen, mark.fill, true);
      case 'circle':
        return this.circle(mark);
      case 'text':
        return this.text(mark);
      case 'watermark':
        return this.watermark(mark.text);
    }
  }

  private x = (mm: number): number => mm * POINTS_PER_MM;
  private y = (mm: number): number => (this.sheet.height - mm) * POINTS_PER_MM;

  private path(points: ShapeMark['points'], pen: Pen | null, fill: number | null, closed: boolean): void {
    const trace = (): PDFOperator[] => [
      ...points.map(({ x, y }, index) => (index === 0 ? moveTo(this.x(x), this.y(y)) : lineTo(this.x(x), this.y(y)))),
      ...(closed ? [closePath()] : []),
    ];
    if (fill !== null) this.page.pushOperators(setFillingGrayscaleColor(fill), ...trace(), fillPath());
    if (pen) {
      this.page.pushOperators(
        setStrokingGrayscaleColor(pen.shade),
        setLineWidth(this.x(pen.width)),
        setDashPattern((pen.dash ?? []).map(this.x), 0),
        ...trace(),
        stroke(),
      );
    }
  }

  private circle({ centre, radius, pen, fill }: CircleMark): void {
    this.page.drawCircle({
      x: this.x(centre.x),
      y: this.y(centre.y),
      size: this.x(radius),
      ...(fill === null ? {} : { color: grayscale(fill) }),
      ...(pen ? { borderColor: grayscale(pen.shade), borderWidth: this.x(pen.width) } : {}),
    });
  }

  private text({ text, at, size, weight, shade, upward, clear, box }: TextMark): void {
    if (clear) {
      const { x, y, width, height } = box;
      const around = {
        x: x - CLEARANCE,
        y: y - CLEARANCE,
        width: width + 2 * CLEARANCE,
        height: height + 2 * CLEARANCE,
      };
      this.draw(rectangle(around, null, 1));
    }
    let along = 0;
    for (const run of runsOf(text, weight)) {
      const font = this.fonts.get(run.face.name);
      if (!font) throw new Error(`face ${run.face.name} is not embedded`);
      this.page.drawText(run.text, {
        x: this.x(upward ? at.x : at.x + along),
        y: this.y(upward ? at.y - along : at.y),
        size: this.x(size),
        font,
        color: grayscale(shade),
        ...(upward ? { rotate: degrees(90) } : {}),
      });
      along += widthOf(run.text, size, weight);
    }
  }

  /** From corner to corner, over everything but so light that every figure under it stays readable. */
  private watermark(words: string): void {
    const { width, height } = this.sheet;
    const font = this.fonts.get('SemiBold-Latin');
    if (!font) throw new Error('the watermark has no face');
    const turn = Math.atan2(height, width);
    const size = (Math.hypot(width, height) * 0.72) / widthOf(words, 1, 'semibold');
    const half = widthOf(words, size, 'semibold') / 2;
    const drop = size * 0.35;
    this.page.drawText(words, {
      x: this.x(width / 2 - half * Math.cos(turn) + drop * Math.sin(turn)),
      y: this.y(height / 2 + half * Math.sin(turn) + drop * Math.cos(turn)),
      size: this.x(size),
      font,
      color: grayscale(0),
      opacity: 0.07,
      rotate: degrees((turn * 180) / Math.PI),
    });
  }
}
