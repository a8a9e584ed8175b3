import type { Bend, ChainEntry, Leg, PartDocument } from '../document';
import { isLeg } from '../document';
import { freshIds, legNumberAt, renumberLegs } from './entry';

/** What a new bend starts from: the radius that the part already uses nearest to it. */
function radiusNear(document: PartDocument, index: number): Bend['radius'] {
  const bent = document.chain
    .map((entry, at) => ({ entry, distance: Math.abs(at - index) }))
    .filter(({ entry }) => !isLeg(entry))
    .sort((a, b) => a.distance - b.distance)[0]?.entry;
  if (bent && !isLeg(bent)) return bent.radius;
  return document.unit === 'in' ? '1/8' : 3;
}

function newLeg(document: PartDocument): Leg['leg'] {
  return document.unit === 'in' ? 1 : 25;
}

function withId<Entry extends ChainEntry>(entry: Entry, id: string | undefined): Entry {
  return id === undefined ? entry : { ...entry, id };
}

/**
 * A leg with its bend, put in behind the leg at `index`: behind the last one it lengthens the chain, between two it makes
 * a new leg there. The bend is 90° up with the radius of its neighbours.
 */
export function addLegAfter(document: PartDocument, index: number): PartDocument {
  const entry = document.chain[index];
  if (!entry || !isLeg(entry)) return document;
  const [bendId, legId] = freshIds(document, 2);
  const bend: Bend = { bend: 90, turn: 'up', radius: radiusNear(document, index) };
  const added = [withId(bend, bendId), withId({ leg: newLeg(document) }, legId)];
  const chain = [...document.chain.slice(0, index + 1), ...added, ...document.chain.slice(index + 1)];
  const number = legNumberAt(document, index);
  return renumberLegs({ ...document, chain }, (leg) => (leg > number ? leg + 1 : leg));
}

/** A leg with its bend before the first leg. Every leg behind it keeps its holes; the new one becomes the datum end. */
export function addLegAtStart(document: PartDocument): PartDocument {
  const [legId, bendId] = freshIds(document, 2);
  const bend: Bend = { bend: 90, turn: 'up', radius: radiusNear(document, 0) };
  const added = [withId({ leg: newLeg(document) }, legId), withId(bend, bendId)];
  return renumberLegs({ ...document, chain: [...added, ...document.chain] }, (leg) => leg + 1);
}
