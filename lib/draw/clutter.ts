import type { Vec } from '../geo';
import type { Frame } from './frame';

/** A rectangle on the sheet, px from the layout's origin, y down. */
export type Box = {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
};

const CELL_PX = 48;
const DOT_EVERY_PX = 7;
/** What one dot of a line under a word costs, beside a px² of another word or symbol. */
const DOT_COST = 45;
const BOX_COST = 1.5;
const OFF_SHEET_COST = 1e5;

type Cell = { readonly boxes: Box[]; readonly dots: number[] };

/** What already lies on the sheet, asked what a word would cover. Kept by cells of the sheet. */
export class Clutter {
  private readonly cells = new Map<number, Cell>();
  private readonly seen: Box | null;

  constructor(private readonly frame: Frame) {
    const { bounds } = frame.view;
    const [low, high] = bounds ? [this.toPx(bounds.min), this.toPx(bounds.max)] : [];
    this.seen =
      low && high
        ? { x: low.x + 4, y: high.y + 4, w: high.x - low.x - 8, h: low.y - high.y - 8 }
        : null;
  }

  toPx({ x, y }: Vec): Vec {
    const { metresPerPx } = this.frame.view;
    return { x: x / metresPerPx, y: -y / metresPerPx };
  }

  addBox(box: Box): void {
    this.visit(box, (key) => this.cellAt(key).boxes.push(box));
  }

  /** A square of `size` px round a place. */
  boxAt(at: Vec, size: number): Box {
    const { x, y } = this.toPx(at);
    return { x: x - size / 2, y: y - size / 2, w: size, h: size };
  }

  addSpot(at: Vec, reach: number): void {
    this.addBox(this.boxAt(at, reach * 2));
  }

  /** Words turned on the sheet, as a row of small boxes. */
  addTurned(centre: Vec, width: number, height: number, turnDeg: number): void {
    for (const box of turnedBoxes(centre, width, height, turnDeg)) this.addBox(box);
  }

  addPath(path: readonly Vec[]): void {
    for (let i = 1; i < path.length; i++) {
      const [a, b] = [this.toPx(path[i - 1]!), this.toPx(path[i]!)];
      const steps = Math.min(400, Math.ceil(Math.hypot(b.x - a.x, b.y - a.y) / DOT_EVERY_PX));
      for (let step = 0; step < steps; step++) {
        const x = a.x + ((b.x - a.x) * step) / steps;
        const y = a.y + ((b.y - a.y) * step) / steps;
        const key = cellKey(Math.floor(x / CELL_PX), Math.floor(y / CELL_PX));
        this.cellAt(key).dots.push(x, y);
      }
    }
  }

  cost(box: Box): number {
    const { seen } = this;
    const off =
      seen &&
      (box.x < seen.x ||
        box.y < seen.y ||
        box.x + box.w > seen.x + seen.w ||
        box.y + box.h > seen.y + seen.h);
    let cost = off ? OFF_SHEET_COST : 0;
    this.visit(box, (key, x, y) => {
      const cell = this.cells.get(key);
      if (cell) cost += costInCell(cell, box, x, y);
    });
    return cost;
  }

  private cellAt(key: number): Cell {
    let cell = this.cells.get(key);
    if (!cell) this.cells.set(key, (cell = { boxes: [], dots: [] }));
    return cell;
  }

  private visit({ x, y, w, h }: Box, use: (key: number, x: number, y: number) => void): void {
    const [left, right] = [Math.floor(x / CELL_PX), Math.floor((x + w) / CELL_PX)];
    const [top, foot] = [Math.floor(y / CELL_PX), Math.floor((y + h) / CELL_PX)];
    for (let cx = left; cx <= right; cx++) {
      for (let cy = top; cy <= foot; cy++) use(cellKey(cx, cy), cx * CELL_PX, cy * CELL_PX);
    }
  }
}

/** Only what lies in this cell is counted, so that a box in several cells counts once in all. */
function costInCell({ boxes, dots }: Cell, box: Box, x: number, y: number): number {
  const [left, right] = [Math.max(box.x, x), Math.min(box.x + box.w, x + CELL_PX)];
  const [top, foot] = [Math.max(box.y, y), Math.min(box.y + box.h, y + CELL_PX)];
  let area = 0;
  for (const other of boxes) {
    const w = Math.min(right, other.x + other.w) - Math.max(left, other.x);
    if (w <= 0) continue;
    const h = Math.min(foot, other.y + other.h) - Math.max(top, other.y);
    if (h > 0) area += w * h;
  }
  let found = 0;
  for (let i = 0; i < dots.length; i += 2) {
    const [dx, dy] = [dots[i]!, dots[i + 1]!];
    if (dx >= left && dx <= right && dy >= top && dy <= foot) found++;
  }
  return area * BOX_COST + found * DOT_COST;
}

export function turnedBoxes(centre: Vec, width: number, height: number, turnDeg: number): Box[] {
  const turn = (turnDeg * Math.PI) / 180;
  const count = Math.max(1, Math.ceil(width / height));
  const each = width / count;
  return Array.from({ length: count }, (_, i) => {
    const along = (i + 0.5) * each - width / 2;
    return {
      x: centre.x + Math.cos(turn) * along - height / 2,
      y: centre.y + Math.sin(turn) * along - height / 2,
      w: height,
      h: height,
    };
  });
}

/** Cells within ±2²⁰ of the origin each have a number of their own; farther ones only share. */
const cellKey = (cx: number, cy: number): number => cx * 2_097_152 + cy;
