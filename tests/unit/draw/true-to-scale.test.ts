import { describe, expect, test } from 'vitest';
import {
  drawSheet,
  groundSeen,
  pxPerMetreAt,
  PX_PER_MM,
  SCALES,
  svgNodes,
  THEMES,
  windowProjector,
  type SvgNode,
} from '@/lib/draw';
import { distance, localPlane, quantise, type LonLat, type Vec } from '@/lib/geo';
import { emptyLayout, EMPTY_GROUND, placeOf, planeOf, piecesOf, type Sheet } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';
import { FULL_SHEET } from './full-sheet';

/** Where a glyph of that piece was put, px. */
function placeInSvg(nodes: readonly SvgNode[], id: string): Vec {
  const group = nodes.find(
    ({ attributes }) => attributes['data-piece'] === id && attributes['data-layer'] === 'piece',
  );
  const glyph = (group?.children as readonly SvgNode[]).find(({ tag }) => tag === 'g');
  const [, x, y] = /translate\((\S+) (\S+)\)/.exec(String(glyph?.attributes.transform)) ?? [];
  return { x: Number(x), y: Number(y) };
}

/** Every pair of rods, as far apart on the paper as the scale says, within 0.1 mm or 0.05 %. */
function expectTrue(sheet: Sheet, ratio: number): void {
  const scale = { id: '', ratio, words: '' };
  const seen = groundSeen({ x: 0, y: 0 }, { widthMm: 200, heightMm: 180 }, scale);
  const nodes = svgNodes(drawSheet({ sheet, limits: limitsFrom(), inkOnly: true }), {
    projector: windowProjector(seen, pxPerMetreAt(scale)),
    theme: THEMES.print,
  });
  const plane = planeOf(sheet.layout);
  const rods = piecesOf(sheet.layout.pieces, 'rod');
  for (const [i, a] of rods.entries()) {
    for (const b of rods.slice(i + 1)) {
      const paperMm = distance(placeInSvg(nodes, a.id), placeInSvg(nodes, b.id)) / PX_PER_MM;
      const wanted = (distance(placeOf(plane, a), placeOf(plane, b)) * 1000) / ratio;
      expect(Math.abs(paperMm - wanted)).toBeLessThan(Math.min(0.1, wanted * 0.0005));
    }
  }
}

describe('what is drawn lies true to scale', () => {
  test.each([...SCALES.ft.slice(0, 6), ...SCALES.m.slice(0, 6)])('$words', ({ ratio }) => {
    expectTrue(FULL_SHEET, ratio);
  });

  test.each([0, 35.2, 46.6, 70])('at latitude %d, where a map projection would stretch', (lat) => {
    const origin: LonLat = [12.5, lat];
    const plane = localPlane(origin);
    const rod = (id: string, x: number, y: number) =>
      ({ id, kind: 'rod', system: 'C', at: quantise(plane.toLonLat({ x, y })) }) as const;
    const layout = {
      ...emptyLayout(origin),
      pieces: [rod('a', -20, -15), rod('b', 22, 18), rod('c', 0, 24)],
    };
    expectTrue({ layout, site: EMPTY_GROUND }, 240);
  });

  test('an inch is 20 feet where it says so', () => {
    const scale = SCALES.ft.find(({ id }) => id === '20')!;
    expect(scale.ratio).toBe(240);
    expect(pxPerMetreAt(scale) * 0.3048 * 20).toBeCloseTo(96, 9);
  });
});
