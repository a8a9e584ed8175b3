import { FINDING_LEVELS, placeWords } from '../../shared/part/finding-words';
import type { Finding, FindingLevel, Solved } from '../../shared/result';
import { widthOf, wrap } from './lettering';
import { TYPE } from './paper-size';
import type { SheetFlow } from './sheet-flow';
import { cellRoom, columnWidths, drawTable } from './table';
import type { Column } from './table';

const whereOf = ({ at }: Finding, result: Solved): string => placeWords(result, at) || 'the part';

/** Stops first, then cautions, then notes; within a level in the engine's order. */
export const inOrder = (findings: readonly Finding[]): Finding[] =>
  FINDING_LEVELS.flatMap((level) => findings.filter((finding) => finding.level === level));

const COLUMNS: readonly Column[] = [
  { head: ['level'], width: 20 },
  { head: ['where'], width: 44 },
  { head: ['finding'], width: 'rest' },
  { head: ['source'], width: 60 },
];

/** Every finding in full; gives the sheet of the flow on which the list begins, null when there is none. */
export function drawFindings(flow: SheetFlow, result: Solved): number | null {
  if (result.findings.length === 0) return null;
  const rooms = columnWidths(COLUMNS, flow.area.width).map(cellRoom);
  const cell = (words: string, column: number): string[] => wrap(words, rooms[column] ?? 0, TYPE.body, 12);
  const rows = inOrder(result.findings).map((finding) => [
    { lines: [finding.level], weight: 'semibold' as const },
    { lines: cell(whereOf(finding, result), 1), even: true },
    { lines: cell(finding.message, 2), even: true },
    { lines: cell(finding.source, 3), even: true },
  ]);
  return drawTable(flow, 'Findings', COLUMNS, rows);
}

const count = (findings: readonly Finding[], level: FindingLevel): number =>
  findings.filter((finding) => finding.level === level).length;

export interface Summary {
  readonly head: string;
  readonly lines: readonly string[];
}

/** The findings for the first sheet, as many as there is room for, the gravest first, and where the rest stands. */
export function summarise(result: Solved, room: number, most: number, sheet: number | null): Summary {
  const counted = FINDING_LEVELS.map((level) => ({ level, many: count(result.findings, level) }));
  const head = counted.map(({ level, many }) => `${many} ${level}${many === 1 ? '' : 's'}`).join(' · ');
  if (result.findings.length === 0) return { head, lines: ['The checks that were run found nothing.'] };
  const pending = inOrder(result.findings);
  const lines: string[] = [];
  for (const [index, finding] of pending.entries()) {
    const wrapped = wrap(`${finding.level} · ${whereOf(finding, result)}: ${finding.message}`, room, TYPE.small);
    const last = index === pending.length - 1;
    if (lines.length + wrapped.length > most - (last && sheet === null ? 0 : 1)) break;
    lines.push(...wrapped);
  }
  const pointer = sheet === null ? '' : `All in full, with their sources: sheet ${sheet}.`;
  return { head, lines: pointer !== '' && widthOf(pointer, TYPE.small) <= room ? [...lines, pointer] : lines };
}
