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

/** What already lies on the sheet, asked what a word would cover. */
export class Clutter {
  private readonly boxes: Box[] = [];
  private readonly dots = new Map<number, number[]>();

  constructor(private readonly frame: Frame) {}

  toPx({ x, y }: Vec): Vec {
    const { metresPerPx } = this.frame.view;
    return { x: x / metresPerPx, y: -y / metresPerPx };
  }

  addBox(box: Box): void {
    this.boxes.push(box);
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
        const t = step / steps;
        this.addDot(a.x + (b.x - a.x) * t, a.y + (b.y - a.y) * t);
      }
    }
  }

  private addDot(x: number, y: number): void {
    const key = cellKey(Math.floor(x / CELL_PX), Math.floor(y / CELL_PX));
    const cell = this.dots.get(key);
    if (cell) cell.push(x, y);
    else this.dots.set(key, [x, y]);
  }

  cost(box: Box): number {
    return this.coverCost(box) + this.lineCost(box) + this.offSheetCost(box);
  }

  private coverCost(box: Box): number {
    let area = 0;
    for (const other of this.boxes) {
      const w = Math.min(box.x + box.w, other.x + other.w) - Math.max(box.x, other.x);
      if (w <= 0) continue;
      const h = Math.min(box.y + box.h, other.y + other.h) - Math.max(box.y, other.y);
      if (h > 0) area += w * h;
    }
    return area * BOX_COST;
  }

  private lineCost(box: Box): number {
    let found = 0;
    const [left, right] = [Math.floor(box.x / CELL_PX), Math.floor((box.x + box.w) / CELL_PX)];
    const [top, foot] = [Math.floor(box.y / CELL_PX), Math.floor((box.y + box.h) / CELL_PX)];
    for (let cx = left; cx <= right; cx++) {
      for (let cy = top; cy <= foot; cy++) {
        const cell = this.dots.get(cellKey(cx, cy));
        if (!cell) continue;
        for (let i = 0; i < cell.length; i += 2) {
          const [x, y] = [cell[i]!, cell[i + 1]!];
          if (x >= box.x && x <= box.x + box.w && y >= box.y && y <= box.y + box.h) found++;
        }
      }
    }
    return found * DOT_COST;
  }

  private offSheetCost(box: Box): number {
    const { bounds } = this.frame.view;
    if (!bounds) return 0;
    const [low, high] = [this.toPx(bounds.min), this.toPx(bounds.max)];
    const inside =
      box.x >= low.x + 4 &&
      box.x + box.w <= high.x - 4 &&
      box.y >= high.y + 4 &&
      box.y + box.h <= low.y - 4;
    return inside ? 0 : OFF_SHEET_COST;
  }
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
