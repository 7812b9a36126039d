import type { Extent, Ft } from './scene';
import type { Height } from './terrain';

export type Contour = { readonly height_ft: number; readonly path: readonly Ft[] };

type Crossing = { readonly at: Ft; readonly joined: string[] };

/**
 * Lines of equal height at every whole foot inside the extent, by marching squares on a grid of
 * `cellFt`. A line that closes repeats its first point.
 */
export function contours(height: Height, extent: Extent, cellFt: number): Contour[] {
  const columns = Math.ceil((extent.east - extent.west) / cellFt);
  const rows = Math.ceil((extent.north - extent.south) / cellFt);
  const at = (i: number, j: number): Ft => [extent.west + i * cellFt, extent.south + j * cellFt];
  const heights = Array.from({ length: rows + 1 }, (_, j) =>
    Float64Array.from({ length: columns + 1 }, (_, i) => height(at(i, j))),
  );
  const levels = new Map<number, Map<string, Crossing>>();
  for (let j = 0; j < rows; j++) {
    const [south, north] = [heights[j]!, heights[j + 1]!];
    for (let i = 0; i < columns; i++) {
      const [a, b, c, d] = [south[i]!, south[i + 1]!, north[i + 1]!, north[i]!];
      // Most cells are crossed by no line at all: only those between their heights are looked at.
      const highest = Math.floor(Math.max(a, b, c, d));
      for (let level = Math.ceil(Math.min(a, b, c, d)); level <= highest; level++) {
        let crossings = levels.get(level);
        if (!crossings) levels.set(level, (crossings = new Map()));
        crossCell(i, j, level, heights, at, crossings);
      }
    }
  }
  return [...levels]
    .sort(([a], [b]) => a - b)
    .flatMap(([level, crossings]) =>
      join(crossings).map((path): Contour => ({ height_ft: level, path })),
    );
}

/** Notes where the level crosses the cell's edges and which crossings belong together. */
function crossCell(
  i: number,
  j: number,
  level: number,
  heights: readonly Float64Array[],
  at: (i: number, j: number) => Ft,
  crossings: Map<string, Crossing>,
): void {
  const h = (di: number, dj: number): number => heights[j + dj]![i + di]!;
  // Anticlockwise from the south-west corner; an edge's name is the same from both its cells.
  const corners = [
    [0, 0],
    [1, 0],
    [1, 1],
    [0, 1],
  ] as const;
  const names = [`h${i},${j}`, `v${i + 1},${j}`, `h${i},${j + 1}`, `v${i},${j}`];
  const met: string[] = [];
  corners.forEach(([ai, aj], k) => {
    const [bi, bj] = corners[(k + 1) % 4]!;
    const [a, b] = [h(ai, aj), h(bi, bj)];
    if (a >= level === b >= level) return;
    const name = names[k]!;
    met.push(name);
    if (crossings.has(name)) return;
    const part = (level - a) / (b - a);
    const [from, to] = [at(i + ai, j + aj), at(i + bi, j + bj)];
    crossings.set(name, {
      at: [from[0] + (to[0] - from[0]) * part, from[1] + (to[1] - from[1]) * part],
      joined: [],
    });
  });
  if (met.length === 4) {
    // A saddle: the cell's middle decides which corners its lines cut off.
    const middle = (h(0, 0) + h(1, 0) + h(1, 1) + h(0, 1)) / 4;
    const joinedThroughMiddle = middle >= level === h(0, 0) >= level;
    const [first, second] = joinedThroughMiddle ? [met[1]!, met[3]!] : [met[3]!, met[1]!];
    link(crossings, met[0]!, first);
    link(crossings, met[2]!, second);
  } else if (met.length === 2) {
    link(crossings, met[0]!, met[1]!);
  }
}

function link(crossings: Map<string, Crossing>, a: string, b: string): void {
  crossings.get(a)!.joined.push(b);
  crossings.get(b)!.joined.push(a);
}

/** Follows the links from end to end; open lines first, what is left is closed. */
function join(crossings: Map<string, Crossing>): Ft[][] {
  const used = new Set<string>();
  const walk = (start: string): Ft[] => {
    const path: Ft[] = [];
    let name: string | undefined = start;
    while (name !== undefined && !used.has(name)) {
      used.add(name);
      const crossing: Crossing = crossings.get(name)!;
      path.push(crossing.at);
      name = crossing.joined.find((next) => !used.has(next));
    }
    return path;
  };
  const names = [...crossings.keys()];
  const open = names.filter((name) => crossings.get(name)!.joined.length === 1);
  const lines = open.map((name) => (used.has(name) ? [] : walk(name)));
  const closed = names.map((name) => {
    if (used.has(name)) return [];
    const path = walk(name);
    return [...path, path[0]!];
  });
  return [...lines, ...closed].filter((path) => path.length > 1);
}
