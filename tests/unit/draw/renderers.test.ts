import { describe, expect, test } from 'vitest';
import {
  drawSheet,
  flatProjector,
  paint,
  svgDocument,
  svgNodes,
  svgText,
  THEMES,
  type Surface,
} from '@/lib/draw';
import { EMPTY_GROUND, emptyLayout, type Sheet } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';
import { FULL_SHEET, ORIGIN } from './full-sheet';

const projector = flatProjector({ x: 400, y: 400 }, 15);
const list = drawSheet({ sheet: FULL_SHEET, limits: limitsFrom(), view: { metresPerPx: 1 / 15 } });

/** A surface that only keeps what was asked of it. */
function recorder() {
  const calls = {
    words: [] as string[],
    strokes: 0,
    fills: 0,
    depth: 0,
    alphas: new Set<number>(),
  };
  const surface: Surface = {
    save: () => void calls.depth++,
    restore: () => void calls.depth--,
    translate() {},
    rotate() {},
    beginPath() {},
    closePath() {},
    moveTo() {},
    lineTo() {},
    arc() {},
    stroke: () => void calls.strokes++,
    fill: () => void calls.fills++,
    setLineDash() {},
    fillText: (text) => void calls.words.push(text),
    strokeText() {},
    fillStyle: '',
    strokeStyle: '',
    get globalAlpha() {
      return 1;
    },
    set globalAlpha(alpha) {
      calls.alphas.add(alpha);
    },
    lineWidth: 1,
    lineCap: 'butt',
    lineJoin: 'round',
    font: '',
    textAlign: 'start',
    textBaseline: 'alphabetic',
  };
  return { calls, surface };
}

describe('canvas and SVG paint the same list', () => {
  test('every stroke, fill and word of one is in the other', () => {
    const { calls, surface } = recorder();
    paint(surface, list, { projector, theme: THEMES.paper, fontFamily: 'x' });
    const svg = svgText(svgNodes(list, { projector, theme: THEMES.paper }));
    expect(calls.depth).toBe(0);
    const shapes = svg.match(/<(path|circle) [^>]*stroke="#/g) ?? [];
    expect(calls.strokes).toBe(shapes.length);
    const painted = calls.words.join('').replaceAll(/\s/g, '');
    const written = [...svg.matchAll(/<text[^>]*>([^<]*)</g)].map(([, text]) => text).join('');
    expect([...painted].sort()).toEqual([...written.replaceAll(/\s/g, '')].sort());
  });

  test('only the layers asked for are painted', () => {
    const { calls, surface } = recorder();
    paint(surface, list, { projector, theme: THEMES.paper, fontFamily: 'x', layers: ['zone'] });
    expect(calls.words).toEqual([]);
    expect(calls.strokes).toBeGreaterThan(0);
  });

  test('what is far outside the surface is left out', () => {
    const { calls, surface } = recorder();
    const away = flatProjector({ x: 90_000, y: 90_000 }, 15);
    const clip = { width: 800, height: 600 };
    paint(surface, list, { projector: away, theme: THEMES.paper, fontFamily: 'x', clip });
    expect(calls.words).toEqual([]);
  });
});

test('words in a drawing stay words: nothing that was written into it runs', () => {
  const sheet: Sheet = {
    layout: {
      ...emptyLayout(ORIGIN),
      pieces: [{ id: '"><script>', kind: 'note', at: ORIGIN, text: '<script>alert(1)</script>&"' }],
    },
    site: EMPTY_GROUND,
  };
  const svg = svgDocument(drawSheet({ sheet, limits: limitsFrom() }), {
    projector,
    theme: THEMES.paper,
    width: 100,
    height: 100,
    fontFamily: '"><script>',
  });
  expect(svg).not.toContain('<script');
  expect(svg).toContain('&#60;script&#62;alert(1)');
});

test('a curve of letters is one text, so that it can be found and read', () => {
  const svg = svgText(svgNodes(list, { projector, theme: THEMES.paper }));
  expect(svg).toMatch(
    /<text x="[\d. -]+" y="[\d. -]+" rotate="[\d. -]+"[^>]*>HOT ZONE, 45 FT<\/text>/,
  );
});
