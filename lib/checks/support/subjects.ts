import {
  footprintOf,
  nameOf,
  piecesOf,
  placeOf,
  planeOf,
  pumpIsSeparate,
  UNIT_WORDS,
  unitOf,
  type Layout,
  type PieceOf,
  type System,
  type Unit,
} from '../../layout';
import type { Ring, Vec } from '../../geo';

/** What a rule is asked about: a piece with its place, or a unit that was never drawn. */
export type Subject =
  | {
      readonly kind: 'piece';
      readonly id: string;
      readonly name: string;
      readonly role: Role;
      readonly at: Vec;
      /** The ground it covers; null for what is drawn as a point. */
      readonly ring: Ring | null;
      /** A pump drawn although none stands apart: nothing is asked of it. */
      readonly outOfUse: boolean;
    }
  | { readonly kind: 'undrawn'; readonly id: System; readonly name: string; readonly role: Role };

export type Role = 'rod' | 'probe' | 'tester' | 'unit';
export type DrawnSubject = Extract<Subject, { kind: 'piece' }>;

type PointKind = 'rod' | 'z-probe' | 'y-probe' | 'tester';
const ROLE: Record<PointKind, Role> = {
  rod: 'rod',
  'z-probe': 'probe',
  'y-probe': 'probe',
  tester: 'tester',
};

/** The pieces of those kinds, then the units by the system they belong to, drawn or not. */
export function subjectsOf(
  layout: Layout,
  kinds: readonly PointKind[],
  units: readonly System[],
): Subject[] {
  const plane = planeOf(layout);
  const points = piecesOf(layout.pieces, ...kinds).map((piece: PieceOf<PointKind>): Subject => ({
    kind: 'piece',
    id: piece.id,
    name: nameOf(piece),
    role: ROLE[piece.kind],
    at: placeOf(plane, piece),
    ring: null,
    outOfUse: false,
  }));
  return [...points, ...units.flatMap((system) => unitSubject(layout, system))];
}

function unitSubject(layout: Layout, system: System): Subject[] {
  const unit: Unit | null = unitOf(layout, system);
  const inUse = system !== 'P' || pumpIsSeparate(layout);
  if (!unit) {
    return inUse
      ? [{ kind: 'undrawn', id: system, name: `the ${UNIT_WORDS[system]}`, role: 'unit' }]
      : [];
  }
  const plane = planeOf(layout);
  return [
    {
      kind: 'piece',
      id: unit.id,
      name: `the ${nameOf(unit)}`,
      role: 'unit',
      at: placeOf(plane, unit),
      ring: footprintOf(plane, unit),
      outOfUse: !inUse,
    },
  ];
}

/** The ground a subject would cover, or the place it would have, if it stood at `at`. */
export const shapeAt = (subject: DrawnSubject, at: Vec): Vec | Ring =>
  subject.ring?.map((v) => ({ x: v.x + at.x - subject.at.x, y: v.y + at.y - subject.at.y })) ?? at;
