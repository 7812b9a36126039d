import type { Vec } from './position';

/**
 * Many line segments, found by place: a uniform grid over typed arrays. A segment is listed in
 * every cell that its box touches. Built once a site, asked at every move of a piece.
 */
export type SegmentIndex = {
  readonly count: number;
  /** Ends of segment i: x1, y1, x2, y2 at 4i … 4i + 3, metres. */
  readonly ends: Float64Array;
  /** Which line segment i belongs to, as given to the builder. */
  readonly lineOf: Int32Array;
  /** Calls `visit` with each segment whose cell meets the box, maybe more than once. */
  visitBox(minX: number, minY: number, maxX: number, maxY: number, visit: Visit): void;
  /**
   * Visits segments outwards from p, ring of cells by ring, until `reach()` (metres, asked after
   * each ring) is nearer than anything still unseen. May visit a segment more than once.
   */
  visitAround(p: Vec, reach: () => number, visit: Visit): void;
};

type Visit = (segment: number) => void;

/** Small enough that a cell of a dense street holds a handful, large enough to skip quickly. */
const CELL_METRES = 10;
/** A grid of more cells than this would cost more to make than it saves: the cells grow instead. */
const MOST_CELLS = 1 << 20;

export function segmentIndex(lines: readonly (readonly (readonly Vec[])[])[]): SegmentIndex {
  const { ends, lineOf, count } = flatten(lines);
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (let i = 0; i < ends.length; i += 2) {
    minX = Math.min(minX, ends[i]!);
    maxX = Math.max(maxX, ends[i]!);
    minY = Math.min(minY, ends[i + 1]!);
    maxY = Math.max(maxY, ends[i + 1]!);
  }
  const area = count === 0 ? 0 : (maxX - minX + CELL_METRES) * (maxY - minY + CELL_METRES);
  const cell = Math.max(CELL_METRES, Math.sqrt(area / MOST_CELLS));
  const columns = count === 0 ? 0 : Math.floor((maxX - minX) / cell) + 1;
  const rows = count === 0 ? 0 : Math.floor((maxY - minY) / cell) + 1;
  const column = (x: number): number => clamp(Math.floor((x - minX) / cell), columns);
  const row = (y: number): number => clamp(Math.floor((y - minY) / cell), rows);

  // Counting sort: how many segments each cell holds, then where its list starts, then the list.
  const starts = new Int32Array(columns * rows + 1);
  eachCell((at) => starts[at + 1]!++);
  for (let i = 1; i < starts.length; i++) starts[i]! += starts[i - 1]!;
  const fill = starts.slice(0, -1);
  const listed = new Int32Array(starts.at(-1) ?? 0);
  eachCell((at, segment) => (listed[fill[at]!++] = segment));

  function eachCell(use: (cellAt: number, segment: number) => void): void {
    for (let s = 0; s < count; s++) {
      const [x1, y1, x2, y2] = [ends[4 * s]!, ends[4 * s + 1]!, ends[4 * s + 2]!, ends[4 * s + 3]!];
      const [c1, c2] = [column(Math.min(x1, x2)), column(Math.max(x1, x2))];
      const [r1, r2] = [row(Math.min(y1, y2)), row(Math.max(y1, y2))];
      for (let r = r1; r <= r2; r++) {
        for (let c = c1; c <= c2; c++) {
          if (crossesCell(x1, y1, x2, y2, minX + c * cell, minY + r * cell, cell)) {
            use(r * columns + c, s);
          }
        }
      }
    }
  }

  function visitCell(r: number, c: number, visit: Visit): void {
    if (r < 0 || c < 0 || r >= rows || c >= columns) return;
    const at = r * columns + c;
    for (let i = starts[at]!; i < starts[at + 1]!; i++) visit(listed[i]!);
  }

  return {
    count,
    ends,
    lineOf,
    visitBox(x1, y1, x2, y2, visit) {
      if (count === 0 || x2 < minX || x1 > maxX || y2 < minY || y1 > maxY) return;
      const [c1, c2, r1, r2] = [column(x1), column(x2), row(y1), row(y2)];
      for (let r = r1; r <= r2; r++) for (let c = c1; c <= c2; c++) visitCell(r, c, visit);
    },
    visitAround(p, reach, visit) {
      if (count === 0) return;
      const c0 = Math.floor((p.x - minX) / cell);
      const r0 = Math.floor((p.y - minY) / cell);
      // From outside the grid the first rings are empty; start at the one that touches it.
      const first = Math.max(0, -c0, c0 - columns + 1, -r0, r0 - rows + 1);
      const last = Math.max(c0, columns - 1 - c0, r0, rows - 1 - r0, 0);
      for (let ring = first; ring <= last; ring++) {
        // Cells of this ring and beyond are at least ring − 1 cells away, wherever p is in its own.
        if ((ring - 1) * cell > reach()) return;
        visitRing(c0, r0, ring, (r, c) => visitCell(r, c, visit));
      }
    },
  };

  function visitRing(
    c0: number,
    r0: number,
    ring: number,
    visit: (r: number, c: number) => void,
  ): void {
    const fromC = Math.max(0, c0 - ring);
    const toC = Math.min(columns - 1, c0 + ring);
    const fromR = Math.max(0, r0 - ring);
    const toR = Math.min(rows - 1, r0 + ring);
    for (let c = fromC; c <= toC; c++) {
      visit(r0 - ring, c);
      if (ring > 0) visit(r0 + ring, c);
    }
    for (let r = Math.max(fromR, r0 - ring + 1); r <= Math.min(toR, r0 + ring - 1); r++) {
      visit(r, c0 - ring);
      visit(r, c0 + ring);
    }
  }
}

const clamp = (cellNumber: number, cells: number): number =>
  Math.min(cells - 1, Math.max(0, cellNumber));

/** False where the segment's line passes the cell on one side, corners included. */
function crossesCell(
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  left: number,
  bottom: number,
  size: number,
): boolean {
  const side = (x: number, y: number): number => (x2 - x1) * (y - y1) - (y2 - y1) * (x - x1);
  const a = side(left, bottom);
  const b = side(left + size, bottom);
  const c = side(left, bottom + size);
  const d = side(left + size, bottom + size);
  return !((a > 0 && b > 0 && c > 0 && d > 0) || (a < 0 && b < 0 && c < 0 && d < 0));
}

function flatten(lines: readonly (readonly (readonly Vec[])[])[]) {
  const count = lines.reduce(
    (all, paths) => all + paths.reduce((n, path) => n + Math.max(0, path.length - 1), 0),
    0,
  );
  const ends = new Float64Array(count * 4);
  const lineOf = new Int32Array(count);
  let s = 0;
  lines.forEach((paths, line) => {
    for (const path of paths) {
      for (let i = 1; i < path.length; i++, s++) {
        ends.set([path[i - 1]!.x, path[i - 1]!.y, path[i]!.x, path[i]!.y], s * 4);
        lineOf[s] = line;
      }
    }
  });
  return { ends, lineOf, count };
}

/** Metres from p to segment s of the index. */
export function metresToSegment(index: SegmentIndex, s: number, p: Vec): number {
  const x1 = index.ends[4 * s]!;
  const y1 = index.ends[4 * s + 1]!;
  const dx = index.ends[4 * s + 2]! - x1;
  const dy = index.ends[4 * s + 3]! - y1;
  const length2 = dx * dx + dy * dy;
  const t = length2 === 0 ? 0 : ((p.x - x1) * dx + (p.y - y1) * dy) / length2;
  const along = t < 0 ? 0 : t > 1 ? 1 : t;
  return Math.hypot(p.x - x1 - along * dx, p.y - y1 - along * dy);
}
