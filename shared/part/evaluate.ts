/** From a restored document to figures, or to the path of every field that gives none. */
import { isReturnBend } from '../geometry/tolerance';
import { findMaterial } from '../reference/materials';
import type { FieldError } from '../result';
import type { Allowance, Bend, Joggle, Leg, Measure, Nose, PartDocument, Tolerances } from './document';
import { isBend, isLeg } from './document';
import { FieldReader } from './field-reader';
import type { FigureAllowance, FigureHole, FigureLeg, Joint, PartFigures } from './figures';
import { measureEnds } from './measure';
import { evaluateVariables } from './variables';

export type Evaluation =
  { readonly ok: true; readonly figures: PartFigures } | { readonly ok: false; readonly errors: readonly FieldError[] };

/**
 * Every figure of a document, in the part's unit and in degrees.
 *
 * @param document from `restore` @returns figures, or the errors with their paths
 */
export function evaluateDocument(document: PartDocument): Evaluation {
  const { scope, errors } = evaluateVariables(document.variables ?? {}, document.unit);
  if (errors.length > 0) return { ok: false, errors };
  const reader = new FieldReader(document.unit, scope);
  const thickness = reader.length(document.thickness, 'thickness', { above: 0, says: 'The thickness' });
  const width =
    document.width === undefined ? null : reader.length(document.width, 'width', { above: 0, says: 'The width' });
  const general = readAllowance(reader, document.allowance, 'allowance');
  if (general.method === 'measured') {
    reader.fail(
      'allowance/method',
      'A measured allowance belongs to one bend: state it on the bend it was measured on.',
    );
  }
  const nose = readNose(reader, document.nose, 'nose');
  const legs: FigureLeg[] = [];
  const joints: Joint[] = [];
  document.chain.forEach((entry, i) => {
    if (isLeg(entry)) legs.push(readLeg(reader, entry, i));
    else joints.push(readJoint(reader, entry, i, general, nose));
  });
  refuseMeasuresAtReturnBends(reader, legs, joints);
  refuseSharpDin(reader, joints, thickness);
  const holes = (document.holes ?? []).flatMap((_, i) => readHole(reader, document, i, legs, joints));
  const seat = document.seat ?? null;
  if (seat !== null && seat >= legs.length) {
    reader.fail('seat', `There is no leg ${seat}: legs are counted from 0 to ${legs.length - 1}.`);
  }
  const trim = {
    start: reader.length(document.trim?.start ?? 0, 'trim/start', { least: 0, says: 'A trim allowance' }),
    end: reader.length(document.trim?.end ?? 0, 'trim/end', { least: 0, says: 'A trim allowance' }),
  };
  checkTolerances(reader, document.tolerances ?? {});
  for (const error of dashErrors(document)) reader.fail(error.path, error.message);
  if (reader.errors.length > 0) return { ok: false, errors: reader.errors };
  const named = typeof document.material === 'string' ? findMaterial(document.material) : null;
  const material = typeof document.material === 'string' ? named : (document.material ?? null);
  return {
    ok: true,
    figures: {
      unit: document.unit,
      thickness,
      width,
      material,
      unknownMaterial: typeof document.material === 'string' && named === null ? document.material : null,
      grain: document.grain ?? null,
      legs,
      joints: document.hand === 'opposite' ? joints.map(turnedOver) : joints,
      holes,
      noses: chosenNoses(document),
      seat,
      trim,
    },
  };
}

/** The variables of a dash number stand over the part's own; a broken one is an error like any other. */
function dashErrors(document: PartDocument): readonly FieldError[] {
  return (document.dashNumbers ?? []).flatMap(({ variables }, i) => {
    if (variables === undefined) return [];
    const { errors } = evaluateVariables({ ...document.variables, ...variables }, document.unit);
    return errors.map(({ path, message }) => ({ path: `dashNumbers/${i}/${path}`, message }));
  });
}

function chosenNoses(document: PartDocument): ReadonlySet<number> {
  const chosen = document.chain.map((entry) => !isLeg(entry) && (entry.nose ?? document.nose) !== undefined);
  return new Set(chosen.flatMap((is, i) => (is ? [i] : [])));
}

/** The opposite hand is the mirror image in the plane of the sheet: every turn goes the other way, stations and holes stay. */
const turnedOver = (joint: Joint): Joint => ({ ...joint, turn: joint.turn === 'up' ? 'down' : 'up' });

function readLeg(reader: FieldReader, leg: Leg, i: number): FigureLeg {
  return {
    chain: i,
    name: leg.name ?? null,
    dimension: reader.length(leg.leg, `chain/${i}/leg`, { above: 0, says: 'The length of a leg' }),
    measure: measureEnds(leg),
  };
}

function readJoint(
  reader: FieldReader,
  entry: Bend | Joggle,
  i: number,
  general: FigureAllowance,
  nose: number | null,
): Joint {
  const path = `chain/${i}`;
  const radius = reader.length(entry.radius, `${path}/radius`, { least: 0, says: 'The bend radius' });
  const own = readNose(reader, entry.nose, `${path}/nose`);
  const rest = {
    chain: i,
    name: entry.name ?? null,
    turn: entry.turn,
    radius,
    allowance: entry.allowance === undefined ? general : readAllowance(reader, entry.allowance, `${path}/allowance`),
    noseRadius: own ?? nose ?? radius,
  };
  if (isBend(entry)) {
    const angle = reader.angle(entry.bend, `${path}/bend`, { above: 0, most: 180, says: 'The bend angle' });
    return { kind: 'bend', angle, ...rest };
  }
  return {
    kind: 'joggle',
    depth: reader.length(entry.joggle, `${path}/joggle`, { above: 0, says: 'The depth of a joggle' }),
    run: reader.length(entry.run, `${path}/run`, { above: 0, says: 'The run of a joggle' }),
    ...rest,
  };
}

function readAllowance(reader: FieldReader, allowance: Allowance, path: string): FigureAllowance {
  switch (allowance.method) {
    case 'k-factor':
    case 'shop': {
      const k = reader.number(allowance.k, `${path}/k`, { above: 0, most: 1, says: 'The K-factor' });
      return { method: allowance.method, k, path };
    }
    case 'rule-90':
      return { method: 'rule-90', hardness: allowance.hardness, path };
    case 'measured': {
      const length = reader.length(allowance.allowance, `${path}/allowance`, {
        above: 0,
        says: 'A measured allowance',
      });
      return { method: 'measured', length, path };
    }
    default:
      return { method: allowance.method, path };
  }
}

function readNose(reader: FieldReader, nose: Nose | undefined, path: string): number | null {
  return nose === undefined
    ? null
    : reader.length(nose.radius, `${path}/radius`, { least: 0, says: 'The nose radius' });
}

/** A 180° bend has no mold point, so nothing can be measured to one. */
function refuseMeasuresAtReturnBends(reader: FieldReader, legs: readonly FigureLeg[], joints: readonly Joint[]): void {
  const refuse = (leg: FigureLeg | undefined, measure: Measure | undefined): void => {
    if (leg === undefined || (measure !== 'mold-line' && measure !== 'inside')) return;
    const path = `chain/${leg.chain}/measure`;
    if (reader.errors.some((error) => error.path === path)) return;
    reader.fail(
      path,
      `A 180° bend has no mold point to measure to: measure this leg by calipers ("outside-edge") or "flat" there.`,
    );
  };
  joints.forEach((joint, i) => {
    if (joint.kind !== 'bend' || !isReturnBend(joint.angle)) return;
    refuse(legs[i], legs[i]?.measure[1]);
    refuse(legs[i + 1], legs[i + 1]?.measure[0]);
  });
}

/** DIN 6935 has no answer for a sharp bend, nor for one so sharp that its k would not be above 0. */
function refuseSharpDin(reader: FieldReader, joints: readonly Joint[], thickness: number): void {
  for (const joint of joints) {
    if (joint.allowance.method !== 'din-6935' || !(thickness > 0) || Number.isNaN(joint.radius)) continue;
    if (0.65 + 0.5 * Math.log10(joint.radius / thickness) > 0) continue;
    reader.fail(
      `chain/${joint.chain}/radius`,
      'DIN 6935 gives no allowance for a radius this small against the thickness: use a larger radius or another method.',
    );
  }
}

function readHole(
  reader: FieldReader,
  document: PartDocument,
  i: number,
  legs: readonly FigureLeg[],
  joints: readonly Joint[],
): FigureHole[] {
  const hole = document.holes![i]!;
  const path = `holes/${i}`;
  const diameter = reader.length(hole.diameter, `${path}/diameter`, { above: 0, says: 'The diameter of a hole' });
  const at = reader.length(hole.at, `${path}/at`, { says: 'The distance of a hole' });
  const across = reader.length(hole.across, `${path}/across`, { says: 'The distance of a hole' });
  const count = hole.count ?? 1;
  const pitch =
    hole.pitch === undefined
      ? null
      : reader.length(hole.pitch, `${path}/pitch`, { above: 0, says: 'The pitch of a row' });
  if (count > 1 && pitch === null) reader.fail(`${path}/pitch`, 'A row of holes needs its pitch.');
  if (hole.leg >= legs.length)
    reader.fail(`${path}/leg`, `There is no leg ${hole.leg}: legs are counted from 0 to ${legs.length - 1}.`);
  const joint =
    hole.from === 'mold-start' ? joints[hole.leg - 1] : hole.from === 'mold-end' ? joints[hole.leg] : undefined;
  if (joint?.kind === 'bend' && isReturnBend(joint.angle)) {
    reader.fail(`${path}/from`, 'A 180° bend has no mold point to measure from.');
  }
  return Array.from({ length: count }, (_, k) => ({
    hole: i,
    leg: hole.leg,
    diameter,
    from: hole.from,
    at,
    across: across + k * (pitch ?? 0),
  }));
}

function checkTolerances(reader: FieldReader, tolerances: Tolerances): void {
  for (const [name, pair] of Object.entries(tolerances)) {
    (pair as readonly (number | string)[] | undefined)?.forEach((value, side) => {
      const path = `tolerances/${name}/${side}`;
      const limits = { least: 0, says: 'A tolerance' };
      if (name === 'angle') reader.angle(value, path, limits);
      else if (name === 'k') reader.number(value, path, limits);
      else reader.length(value, path, limits);
    });
  }
}
