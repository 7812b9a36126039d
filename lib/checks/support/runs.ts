import type { Vec } from '../../geo';
import {
  isUnit,
  placeOf,
  placesOf,
  planeOf,
  type Layout,
  type LayoutPiece,
  type Run,
} from '../../layout';

/** A run's path with its ends on the rods, probes and tester they name: the reference wins. */
export function runPath(layout: Layout, run: Run): Vec[] {
  const plane = planeOf(layout);
  const path = [...placesOf(plane, run)[0]!];
  const snap = (vertex: number, id: string): void => {
    const piece = layout.pieces.find((candidate) => candidate.id === id);
    if (piece && 'at' in piece && !isUnit(piece)) path[vertex] = placeOf(plane, piece);
  };
  snap(0, run.from);
  snap(path.length - 1, run.to);
  return path;
}

export const pieceById = (layout: Layout, id: string): LayoutPiece | null =>
  layout.pieces.find((piece) => piece.id === id) ?? null;

/** How many separate groups `members` form when `links` tie them together. */
export function groupsOf(
  members: readonly string[],
  links: readonly (readonly [string, string])[],
): string[][] {
  const leader = new Map(members.map((member) => [member, member]));
  const find = (member: string): string => {
    const up = leader.get(member)!;
    return up === member ? member : find(up);
  };
  for (const [a, b] of links) {
    if (leader.has(a) && leader.has(b)) leader.set(find(a), find(b));
  }
  const groups = new Map<string, string[]>();
  for (const member of members) {
    const head = find(member);
    groups.set(head, [...(groups.get(head) ?? []), member]);
  }
  return [...groups.values()];
}
