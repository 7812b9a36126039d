import fc from 'fast-check';
import { anchorOf, bring, mayJoin, type Edit, type Wanted } from '@/lib/edits';
import { feetToMetres, type LonLat } from '@/lib/geo';
import {
  isRun,
  isUnit,
  LAYOUT_KINDS,
  placeKey,
  planeOf,
  SITE_KINDS,
  type Kind,
  type Piece,
  type Sheet,
} from '@/lib/layout';

/** Dice for one edit; what they mean depends on the sheet that they fall on. */
export type Dice = { type: number; pick: number; other: number; east: number; north: number };

export const dice: fc.Arbitrary<Dice> = fc.record({
  type: fc.nat(99),
  pick: fc.nat(9999),
  other: fc.nat(9999),
  east: fc.double({ min: -150, max: 150, noNaN: true }),
  north: fc.double({ min: -150, max: 150, noNaN: true }),
});

const RUNS: readonly Kind[] = ['jumper', 'ground-cable', 'bond-cable', 'hose', 'test-lead'];
const KINDS: readonly Kind[] = [...LAYOUT_KINDS, ...SITE_KINDS];
const UTILITIES = ['electric', 'gas-oil-steam', 'sewer'];

const one = <T>(list: readonly T[], pick: number): T | undefined => list[pick % list.length];

/** An edit that a person might make on this sheet; now and then one that can't be made. */
export function randomEdit(sheet: Sheet, roll: Dice, newId: () => string): Edit {
  const { type, pick, other } = roll;
  const all: readonly Piece[] = [...sheet.layout.pieces, ...sheet.site.features];
  const piece = one(all, pick);
  if (type < 30 || !piece) return bring(sheet, wantedFrom(sheet, roll), { newId });
  if (type < 50) return { type: 'move', moves: movesFrom(sheet, all, roll) };
  if (type < 62) return reshapeFrom(sheet, piece, roll);
  if (type < 68) return { type: 'turn', id: one(all.filter(isUnit), pick)?.id ?? 'nobody', heading_deg: other / 10 }; // prettier-ignore
  if (type < 74) return { type: 'remove', ids: [piece.id] };
  if (type < 80) return joinFrom(sheet, roll);
  if (type < 88) return setPieceFrom(piece, roll);
  if (type < 90) return { type: 'renumber' };
  if (type < 93) return { type: 'set-conditions', conditions: { wind: other % 5 ? { from_deg: other % 360, speed_mph: pick % 30 } : null } }; // prettier-ignore
  if (type < 95) return { type: 'set-layout', members: { name: `Plan ${pick}`, pump: one(['separate', 'none', null] as const, other) ?? null } }; // prettier-ignore
  if (type < 97) return { type: 'set-ground', answers: { sewer: other % 3 ? { answer: 'clear' } : null } }; // prettier-ignore
  if (type < 98) return { type: 'remove', ids: ['nobody'] };
  const next = { ...roll, type: type === 98 ? 40 : 55, pick: other };
  return { type: 'together', edits: [{ type: 'renumber' }, randomEdit(sheet, next, newId)] };
}

function placeFrom(sheet: Sheet, { east, north }: Dice, aside = 0): LonLat {
  const [x, y] = [feetToMetres(east + aside), feetToMetres(north + aside / 2)];
  return planeOf(sheet.layout).toLonLat({ x, y });
}

function wantedFrom(sheet: Sheet, roll: Dice): Wanted {
  const kind = one(KINDS, roll.pick)!;
  if (RUNS.includes(kind)) return wantedRun(sheet, kind as 'jumper', roll);
  const corners = [0, 12, 31].map((aside) => placeFrom(sheet, roll, aside * (1 + aside / 50)));
  const places = placeKey(kind) === 'at' || roll.other % 4 === 0 ? corners.slice(0, 1) : corners;
  const line = placeKey(kind) === 'path' || placeKey(kind) === 'paths';
  return {
    kind,
    places: line ? corners : places,
    ...(kind === 'buried-line' && { members: { utility: one(UTILITIES, roll.other) } }),
  };
}

function wantedRun(sheet: Sheet, kind: 'jumper', roll: Dice): Wanted {
  const from = one(sheet.layout.pieces.filter((p) => mayJoin(kind, 'from', p)), roll.other); // prettier-ignore
  const to = one(sheet.layout.pieces.filter((p) => mayJoin(kind, 'to', p) && p !== from), roll.pick); // prettier-ignore
  if (!from || !to) return { kind: 'note', places: [placeFrom(sheet, roll)] };
  return { kind, places: [], ends: [from.id, to.id] };
}

function movesFrom(sheet: Sheet, all: readonly Piece[], roll: Dice) {
  const movable = all.filter((piece) => !isRun(piece));
  const chosen = new Set([one(movable, roll.pick), one(movable, roll.other)]);
  return [...chosen].flatMap((piece, i) =>
    piece
      ? [{ id: piece.id, to: roll.type === 31 ? anchorOf(piece) : placeFrom(sheet, roll, i * 9) }]
      : [],
  );
}

function reshapeFrom(sheet: Sheet, piece: Piece, roll: Dice): Edit {
  const parts =
    'path' in piece ? [piece.path] : 'paths' in piece ? piece.paths : 'rings' in piece ? piece.rings : [[]]; // prettier-ignore
  return {
    type: 'reshape',
    id: piece.id,
    part: roll.other % parts.length,
    vertex: roll.pick % (parts[0]!.length + 1),
    to: roll.type % 4 === 0 ? null : placeFrom(sheet, roll),
    insert: roll.type % 4 === 1,
  };
}

function joinFrom(sheet: Sheet, roll: Dice): Edit {
  const run = one(sheet.layout.pieces.filter(isRun), roll.pick);
  const end = roll.other % 2 ? 'from' : 'to';
  // Mostly to what it may be led to, now and then to anything at all.
  const targets = sheet.layout.pieces.filter((p) => roll.type === 74 || (run && mayJoin(run.kind, end, p))); // prettier-ignore
  return { type: 'join', id: run?.id ?? 'nobody', end, piece: one(targets, roll.other)?.id ?? 'x' };
}

function setPieceFrom(piece: Piece, { other, type }: Dice): Edit {
  const set = (members: Record<string, unknown>): Edit => ({
    type: 'set-piece',
    id: piece.id,
    members,
  });
  if (piece.kind === 'rod') return set(type % 2 ? { system: 'CRP'[other % 3] } : { length_ft: (other % 12) - 1 }); // prettier-ignore
  if (isUnit(piece)) return set({ length_ft: other % 80, width_ft: other % 2 ? null : 8 });
  if (piece.kind === 'vent') return set({ of: other % 2 ? null : 'nobody' });
  return set({ label: other % 3 ? `label ${other}` : null });
}
