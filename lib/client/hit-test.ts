import type { DisplayList, Group, Hit } from '../draw';
import { distance, insideArea, nearestOnPath, type Vec } from '../geo';

/** How near a press has to come to a thing, px: a mouse points, a finger covers. */
export const REACH_PX = { mouse: 4, pen: 10, touch: 22 } as const;
export type PointerType = keyof typeof REACH_PX;

type Found = { readonly id: string; readonly rank: number; readonly metres: number };

/**
 * Small things before what they lie on, and what is drawn here before the ground beneath: else a
 * rod on a vehicle, or a vehicle on a road, could never be taken. Least is taken first.
 */
const RANK: Record<'layout' | 'ground', Record<Hit['type'] | 'edge' | 'unit', number>> = {
  layout: { spot: 0, unit: 1, lines: 2, edge: 4, area: 6 },
  ground: { spot: 3, unit: 1, lines: 5, edge: 5.5, area: 7 },
};

/** Ids of the pieces under a place, the one most likely meant first. */
export function piecesAt(
  lists: readonly DisplayList[],
  at: Vec,
  metresPerPx: number,
  pointer: PointerType,
): string[] {
  const found = new Map<string, Found>();
  for (const list of lists) {
    for (const group of list.groups) {
      const hit = group.hit && hitGroup(group, group.hit, at, metresPerPx, REACH_PX[pointer]);
      if (!hit) continue;
      const before = found.get(hit.id);
      if (!before || isBetter(hit, before)) found.set(hit.id, hit);
    }
  }
  return [...found.values()]
    .sort((a, b) => a.rank - b.rank || a.metres - b.metres)
    .map(({ id }) => id);
}

const isBetter = (a: Found, b: Found): boolean =>
  a.rank < b.rank || (a.rank === b.rank && a.metres < b.metres);

function hitGroup(
  { id, layer }: Group,
  hit: Hit,
  at: Vec,
  metresPerPx: number,
  reachPx: number,
): Found | null {
  const ranks = RANK[layer === 'ground' ? 'ground' : 'layout'];
  const within = (px: number, metres: number, rank: number): Found | null =>
    metres <= Math.max(px, reachPx) * metresPerPx ? { id, rank, metres } : null;
  switch (hit.type) {
    case 'spot':
      return within(hit.radiusPx, distance(at, hit.at), ranks.spot);
    case 'lines':
      return within(hit.nearPx, nearest(at, hit.lines), ranks.lines);
    case 'area': {
      const isUnit = layer === 'piece';
      if (!hit.edge && insideArea(at, hit.rings)) {
        return { id, rank: isUnit ? ranks.unit : ranks.area, metres: sizeOf(hit.rings) };
      }
      return within(hit.nearPx, nearest(at, hit.rings), isUnit ? ranks.unit : ranks.edge);
    }
  }
}

const nearest = (at: Vec, lines: readonly (readonly Vec[])[]): number =>
  Math.min(...lines.map((line) => nearestOnPath(at, line).metres));

/** Of two areas under a press the smaller is meant. */
function sizeOf(rings: readonly (readonly Vec[])[]): number {
  const xs = (rings[0] ?? []).map((v) => v.x);
  const ys = (rings[0] ?? []).map((v) => v.y);
  return Math.hypot(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys));
}
