import type { Finding } from '../checks';
import { testLineOf } from '../checks/support/test-line';
import type { Vec } from '../geo';
import {
  findPiece,
  footprintOf,
  isUnit,
  piecesOf,
  placeOf,
  placesOf,
  rodsOf,
  SYSTEMS,
  unitOf,
  type System,
} from '../layout';
import type { Frame } from './frame';
import { nearestOf } from './nearest';

export type Ends = { readonly from: Vec; readonly to: Vec };

type Find = (frame: Frame, subjects: readonly string[]) => Ends | null;

/** Between which places a rule measured, for the rules that measure a distance on the ground. */
const ENDS: Readonly<Record<string, Find>> = {
  'rods-apart': (frame, [a, b]) => betweenShapes(shape(frame, a), [shape(frame, b)]),
  'systems-apart': (frame, [a, b]) => systemsApart(frame, a, b),
  'z-distance': (frame, [system]) => toProbe(frame, system, 'z'),
  'y-distance': (frame, [system]) => toProbe(frame, system, 'y'),
  'outside-hot-zone': (frame, [id]) =>
    betweenShapes(
      shape(frame, id),
      piecesOf(frame.sheet.layout.pieces, 'hot-zone').flatMap((z) => placesOf(frame.plane, z)),
    ),
  'ignition-clear': (frame, [id]) =>
    betweenShapes(
      shape(frame, id),
      piecesOf(frame.sheet.layout.pieces, 'release-point', 'pool').flatMap((source) =>
        placesOf(frame.plane, source),
      ),
    ),
  'vent-clear': (frame, [id]) =>
    betweenShapes(
      shape(frame, id),
      piecesOf(frame.sheet.layout.pieces, 'vent').map((vent) => [placeOf(frame.plane, vent)]),
    ),
  'clear-of-buried-lines': (frame, [id, line]) =>
    betweenShapes(shape(frame, id), linesOf(frame, line)),
  'clear-of-overhead': (frame, [id, line]) => betweenShapes(shape(frame, id), linesOf(frame, line)),
};

/** The two places that a finding's distance lies between; null where it is no such distance. */
export const dimensionEnds = (frame: Frame, finding: Finding): Ends | null =>
  finding.measured?.unit === 'ft' ? (ENDS[finding.rule]?.(frame, finding.subjects) ?? null) : null;

/** A piece by id, or a unit by its system's letter, as the ground it takes. */
function shape(frame: Frame, subject: string | undefined): readonly Vec[] {
  if (subject === undefined) return [];
  const { sheet, plane } = frame;
  const piece =
    findPiece(sheet, subject) ?? (isSystem(subject) ? unitOf(sheet.layout, subject) : null);
  if (!piece) return [];
  if (isUnit(piece)) return footprintOf(plane, piece);
  return 'at' in piece ? [placeOf(plane, piece)] : [];
}

const betweenShapes = (one: readonly Vec[], others: readonly (readonly Vec[])[]): Ends | null =>
  one.length === 0 ? null : nearestOf(one, others);

function linesOf(frame: Frame, id: string | undefined): readonly (readonly Vec[])[] {
  const line = id === undefined ? null : findPiece(frame.sheet, id);
  return line ? placesOf(frame.plane, line) : [];
}

export function systemsApart(
  frame: Frame,
  a: string | undefined,
  b: string | undefined,
): Ends | null {
  const rods = (system: string | undefined): (readonly Vec[])[] =>
    system !== undefined && isSystem(system)
      ? rodsOf(frame.sheet.layout, system).map((rod) => [placeOf(frame.plane, rod)])
      : [];
  let best: Ends | null = null;
  for (const one of rods(a)) {
    const ends = nearestOf(one, rods(b));
    if (ends && (!best || apart(ends) < apart(best))) best = ends;
  }
  return best;
}

function toProbe(frame: Frame, system: string | undefined, which: 'z' | 'y'): Ends | null {
  if (system === undefined || !isSystem(system)) return null;
  const test = testLineOf(frame.sheet.layout, system);
  const probe = test[which];
  return test.centre && probe ? { from: test.centre, to: probe.at } : null;
}

export const apart = ({ from, to }: Ends): number => Math.hypot(to.x - from.x, to.y - from.y);

const isSystem = (word: string): word is System => (SYSTEMS as readonly string[]).includes(word);
