import { feetToMetres, localPlane, type LonLat } from '../lib/geo';
import { fromSquare, TILE_PX, toSquare, type Square } from './mercator';
import type { Extent, Ft } from './scene';

export type Stroke = {
  readonly stroke: string;
  readonly width: number;
  readonly dash?: readonly number[];
  readonly fill?: string;
  readonly cap?: 'butt' | 'round' | 'square';
};

/** From feet of one scene to the Mercator square and back, remembering what it has projected. */
export type Projection = {
  square(at: Ft): Square;
  feet(square: Square): Ft;
};

export function projection(origin: LonLat): Projection {
  const plane = localPlane(origin);
  const done = new WeakMap<Ft, Square>();
  return {
    square(at) {
      const known = done.get(at);
      if (known) return known;
      const square = toSquare(
        plane.toLonLat({ x: feetToMetres(at[0]), y: feetToMetres(at[1]) }) as LonLat,
      );
      done.set(at, square);
      return square;
    },
    feet(square) {
      const { x, y } = plane.toPlane(fromSquare(square));
      return [x / feetToMetres(1), y / feetToMetres(1)];
    },
  };
}

/** Draws ground feet as SVG marks on one sheet of tiles. */
export type Pen = {
  readonly zoom: number;
  readonly pxPerFt: number;
  /** Ground inside the sheet, with a margin for what reaches in from outside. */
  readonly seen: Extent;
  point(at: Ft): readonly [x: number, y: number];
  shows(points: readonly Ft[]): boolean;
  /** Pixels for a ground length, never thinner than `leastPx`. */
  wide(feet: number, leastPx?: number): number;
  line(path: readonly Ft[], stroke: Stroke): string;
  area(outline: readonly Ft[], fill: string, edge?: { stroke: string; width: number }): string;
  disc(at: Ft, radiusPx: number, fill: string, edge?: { stroke: string; width: number }): string;
};

export type Sheet = { readonly zoom: number; readonly left: number; readonly top: number };

/** Lettering and symbols reach at most this far beyond the point they stand at. */
const MARGIN_PX = 220;

export function penFor(project: Projection, sheet: Sheet, tiles: [number, number]): Pen {
  const worldPx = TILE_PX * 2 ** sheet.zoom;
  const point = (at: Ft): readonly [number, number] => {
    const [x, y] = project.square(at);
    return [x * worldPx - sheet.left * TILE_PX, y * worldPx - sheet.top * TILE_PX];
  };
  const ground = (x: number, y: number): Ft =>
    project.feet([(sheet.left * TILE_PX + x) / worldPx, (sheet.top * TILE_PX + y) / worldPx]);
  const [right, bottom] = [tiles[0] * TILE_PX, tiles[1] * TILE_PX];
  const corners = [
    ground(-MARGIN_PX, -MARGIN_PX),
    ground(right + MARGIN_PX, -MARGIN_PX),
    ground(right + MARGIN_PX, bottom + MARGIN_PX),
    ground(-MARGIN_PX, bottom + MARGIN_PX),
  ];
  const seen = boxOf(corners);
  const middle = ground(right / 2, bottom / 2);
  const beside: Ft = [middle[0] + 1, middle[1]];
  const [m, b] = [point(middle), point(beside)];
  const pxPerFt = Math.hypot(b[0] - m[0], b[1] - m[1]);

  const wide = (feet: number, leastPx = 0): number => Math.max(feet * pxPerFt, leastPx);
  const trace = (path: readonly Ft[]): string =>
    path.map((at) => point(at).map(tidy).join(' ')).join('L');
  const edged = (edge?: { stroke: string; width: number }): string =>
    edge ? ` stroke="${edge.stroke}" stroke-width="${tidy(edge.width)}"` : '';

  return {
    zoom: sheet.zoom,
    pxPerFt,
    seen,
    point,
    wide,
    shows: (points) => overlap(boxFor(points), seen),
    line(path, { stroke, width, dash, fill = 'none', cap = 'butt' }) {
      const dashed = dash ? ` stroke-dasharray="${dash.map(tidy).join(' ')}"` : '';
      return `<path d="M${trace(path)}" fill="${fill}" stroke="${stroke}" stroke-width="${tidy(width)}" stroke-linejoin="round" stroke-linecap="${cap}"${dashed}/>`;
    },
    area: (outline, fill, edge) =>
      `<path d="M${trace(outline)}Z" fill="${fill}" stroke-linejoin="round"${edged(edge)}/>`,
    disc(at, radiusPx, fill, edge) {
      const [x, y] = point(at);
      return `<circle cx="${tidy(x)}" cy="${tidy(y)}" r="${tidy(radiusPx)}" fill="${fill}"${edged(edge)}/>`;
    },
  };
}

/** Hundredths of a pixel are finer than anything the rasteriser shows. */
export const tidy = (px: number): string => String(Math.round(px * 100) / 100);

const boxes = new WeakMap<readonly Ft[], Extent>();

function boxFor(points: readonly Ft[]): Extent {
  const known = boxes.get(points);
  if (known) return known;
  const box = boxOf(points);
  boxes.set(points, box);
  return box;
}

export function boxOf(points: readonly Ft[]): Extent {
  const box = { west: Infinity, south: Infinity, east: -Infinity, north: -Infinity };
  for (const [east, north] of points) {
    box.west = Math.min(box.west, east);
    box.east = Math.max(box.east, east);
    box.south = Math.min(box.south, north);
    box.north = Math.max(box.north, north);
  }
  return box;
}

const overlap = (a: Extent, b: Extent): boolean =>
  a.west <= b.east && a.east >= b.west && a.south <= b.north && a.north >= b.south;
