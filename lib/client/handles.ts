import { distance, feetToMetres, toRadians, type LocalPlane, type Vec } from '../geo';
import { isRun, isUnit, placesOf, unitSizeFt, type Piece, type Unit } from '../layout';
import type { Under } from './tools';

/** Something of the selected piece that can be taken by itself: a corner, an end, its turning. */
export type Handle = {
  readonly under: NonNullable<Under>;
  readonly at: Vec;
  /** What it is called, to be followed by the piece's name: "corner 3 of". */
  readonly words: string;
};

/** The turning handle stands this far before a unit's front, px. */
const TURN_PX = 34;
/** Corners nearer together than this are thinned out, and get no middles between them, px. */
const CROWDED_PX = 26;
/** An edge must be this long to offer a new corner in its middle, px. */
const ROOM_PX = 56;

export function handlesOf(plane: LocalPlane, piece: Piece, metresPerPx: number): Handle[] {
  if (isUnit(piece)) return [turnHandle(plane, piece, metresPerPx)];
  if ('at' in piece) return [];
  const parts = placesOf(plane, piece);
  return parts.flatMap((part, i) =>
    isRun(piece)
      ? runHandles(piece, part, metresPerPx)
      : cornerHandles(piece, part, i, metresPerPx),
  );
}

function turnHandle(plane: LocalPlane, unit: Unit, metresPerPx: number): Handle {
  const centre = placesOf(plane, unit)[0]![0]!;
  const reach = feetToMetres(unitSizeFt(unit).length) / 2 + TURN_PX * metresPerPx;
  const along = toRadians((unit.heading_deg ?? 0) - plane.convergence(centre));
  return {
    under: { type: 'turn', id: unit.id },
    at: { x: centre.x + Math.sin(along) * reach, y: centre.y + Math.cos(along) * reach },
    words: 'heading of',
  };
}

function runHandles(run: Piece, path: readonly Vec[], metresPerPx: number): Handle[] {
  const { id } = run;
  const [first, last] = [path[0], path.at(-1)];
  if (!first || !last) return [];
  const ends: Handle[] = [
    { under: { type: 'end', id, end: 'from' }, at: first, words: 'start of' },
    { under: { type: 'end', id, end: 'to' }, at: last, words: 'end of' },
  ];
  // A jumper is a straight line by its nature; everything else may be led round things.
  if (run.kind === 'jumper') return ends;
  const bends = path.slice(1, -1).map((at, i): Handle => ({
    under: { type: 'vertex', id, part: 0, vertex: i + 1 },
    at,
    words: `bend ${i + 1} of`,
  }));
  return [...ends, ...bends, ...middles(id, path, 0, metresPerPx)];
}

function cornerHandles(
  { id, ...piece }: Piece,
  path: readonly Vec[],
  part: number,
  metresPerPx: number,
): Handle[] {
  const closed = 'rings' in piece;
  const corners = closed ? path.slice(0, -1) : path;
  const edge =
    path.slice(1).reduce((sum, v, i) => sum + distance(path[i]!, v), 0) / (path.length - 1);
  const every = Math.max(1, Math.ceil((CROWDED_PX * metresPerPx) / Math.max(edge, 1e-6)));
  const vertices = corners.flatMap((at, vertex): Handle[] =>
    vertex % every === 0 || (!closed && vertex === corners.length - 1)
      ? [{ under: { type: 'vertex', id, part, vertex }, at, words: `corner ${vertex + 1} of` }]
      : [],
  );
  return [...vertices, ...middles(id, path, part, metresPerPx)];
}

function middles(id: string, path: readonly Vec[], part: number, metresPerPx: number): Handle[] {
  return path.slice(1).flatMap((b, i): Handle[] => {
    const a = path[i]!;
    if (distance(a, b) < ROOM_PX * metresPerPx) return [];
    return [
      {
        under: { type: 'middle', id, part, vertex: i + 1 },
        at: { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 },
        words: `new corner ${i + 1} in`,
      },
    ];
  });
}

/** The handle under a place, nearest first; corners and ends before middles. */
export function handleAt(handles: readonly Handle[], at: Vec, reachMetres: number): Handle | null {
  const near = handles
    .map((handle) => ({ handle, metres: distance(handle.at, at) }))
    .filter(({ metres }) => metres <= reachMetres)
    .sort(
      (a, b) =>
        Number(a.handle.under.type === 'middle') - Number(b.handle.under.type === 'middle') ||
        a.metres - b.metres,
    );
  return near[0]?.handle ?? null;
}
