import type { Vec } from '../geo';
import type { Token } from './themes';
import type { Fill, GlyphMark, PathMark, Px, PxShape, Stroke, TextMark } from './types';

/** Short ways to write marks down. */

export const stroke = (token: Token, width: number, more: Partial<Stroke> = {}): Stroke => ({
  token,
  width,
  ...more,
});
export const fill = (token: Token, opacity = 1): Fill => ({ token, opacity });

export const line = (
  lines: readonly (readonly Vec[])[],
  drawn: Stroke,
  closed = false,
  filled: Fill | null = null,
): PathMark => ({ type: 'path', lines, closed, stroke: drawn, fill: filled });

export const glyph = (at: Vec, shapes: readonly PxShape[], turnDeg = 0): GlyphMark => ({
  type: 'glyph',
  at,
  turnDeg,
  shapes,
});

export const pxLine = (
  points: readonly (readonly [number, number])[],
  drawn: Stroke | null,
  closed = false,
  filled: Fill | null = null,
): PxShape => ({
  type: 'line',
  points: points.map(([x, y]): Px => ({ x, y })),
  closed,
  stroke: drawn,
  fill: filled,
});

export const pxDisc = (
  radius: number,
  drawn: Stroke | null,
  filled: Fill | null = null,
  at: Px = { x: 0, y: 0 },
): PxShape => ({ type: 'disc', at, radius, stroke: drawn, fill: filled });

/** The shapes `part` as large, strokes as wide as before. */
export const scaled = (shapes: readonly PxShape[], part: number): readonly PxShape[] =>
  part === 1
    ? shapes
    : shapes.map((shape) =>
        shape.type === 'disc'
          ? { ...shape, radius: shape.radius * part, at: scaledPx(shape.at, part) }
          : { ...shape, points: shape.points.map((point) => scaledPx(point, part)) },
      );

const scaledPx = ({ x, y }: Px, part: number): Px => ({ x: x * part, y: y * part });

export const words = (
  at: Vec,
  text: string,
  size: number,
  more: Partial<Omit<TextMark, 'type' | 'at' | 'text' | 'size'>> = {},
): TextMark => ({
  type: 'text',
  at,
  text,
  size,
  offset: { x: 0, y: 0 },
  weight: 600,
  token: 'ink',
  halo: 'paper',
  turnDeg: 0,
  anchor: 'middle',
  ...more,
});
