import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { handoutChoice } from '@/components/handout/handout-choice';
import { linesNeeded } from '@/components/handout/lines-needed';
import { pageGeometry } from '@/components/handout/page-geometry';
import { paginate } from '@/components/handout/paginate';
import { paperBar } from '@/components/handout/paper-scale-bar';
import { CELL_PAD_MM, HEAD_MM, LINE_MM, TEXT_PX, TITLE_MM } from '@/components/handout/paper-table';
import { PAPERS, SCALES, scaleThatFits } from '@/lib/draw';
import { feetToMetres } from '@/lib/geo';

describe('how to print, as the address says it', () => {
  test.each([
    [{}, 'letter', 'ft', null],
    [{ paper: 'a4' }, 'a4', 'ft', null],
    [{ paper: 'a4', units: 'm' }, 'a4', 'm', null],
    [{ scale: '20' }, 'letter', 'ft', '20'],
    [{ scale: '1:200', units: 'ft' }, 'letter', 'm', '1:200'],
    [{ paper: 'toString', units: 'furlong', scale: '17' }, 'letter', 'ft', null],
    [{ paper: ['a4', 'letter'] }, 'letter', 'ft', null],
  ])('%j', (asked, paper, units, scale) => {
    const choice = handoutChoice(asked);
    expect([choice.paper, choice.units, choice.scale?.id ?? null]).toEqual([paper, units, scale]);
  });
});

describe('the scale', () => {
  const ground = (width: number, height: number) => ({
    min: { x: 0, y: 0 },
    max: { x: feetToMetres(width), y: feetToMetres(height) },
  });
  const { plan } = pageGeometry('letter');

  test.each([
    [60, 60, '10'],
    [125, 100, '20'],
    [160, 150, '30'],
    [900, 200, '200'],
  ])('%d by %d ft is drawn as large as it fits: %s', (width, height, id) => {
    expect(scaleThatFits(ground(width, height), plan, SCALES.ft, 14).id).toBe(id);
  });

  test('ground too wide for any gets the smallest', () => {
    expect(scaleThatFits(ground(9000, 10), plan, SCALES.ft, 14)).toBe(SCALES.ft.at(-1));
  });

  test('bar and ratio agree: the bar covers its feet on the ground', () => {
    for (const units of ['ft', 'm'] as const) {
      for (const scale of SCALES[units]) {
        const { length, mm } = paperBar(scale, units, 50);
        const ground = units === 'ft' ? feetToMetres(length) : length;
        expect((mm / 1000) * scale.ratio).toBeCloseTo(ground, 9);
        expect(mm).toBeLessThanOrEqual(50 + 1e-6);
        expect(mm).toBeGreaterThan(15);
      }
    }
  });
});

describe('pages', () => {
  const row = (n: number, withNext = false) => ({ n, withNext });
  const high = (heightMm: number, item: { n: number; withNext: boolean }) => ({ heightMm, item });
  const numbers = (pages: { n: number }[][]) => pages.map((page) => page.map(({ n }) => n));

  test('blocks fill a page and go on over the next', () => {
    const blocks = [1, 2, 3, 4, 5].map((n) => high(40, row(n)));
    expect(numbers(paginate(blocks, 100))).toEqual([[1, 2], [3, 4], [5]]);
  });

  test('a heading never ends a page', () => {
    const blocks = [high(80, row(1)), high(15, row(2, true)), high(10, row(3))];
    expect(numbers(paginate(blocks, 100))).toEqual([[1], [2, 3]]);
  });

  test('heads repeated at the top of a page take their room there', () => {
    const blocks = [1, 2, 3].map((n) => ({ ...high(45, row(n)), leadMm: 20 }));
    expect(numbers(paginate(blocks, 100))).toEqual([[1, 2], [3]]);
    const four = [1, 2, 3, 4].map((n) => ({ ...high(45, row(n)), leadMm: 20 }));
    expect(numbers(paginate(four, 100))).toEqual([[1, 2], [3], [4]]);
  });

  test('what is higher than a page has one to itself, and nothing is lost', () => {
    const blocks = [high(10, row(1)), high(300, row(2)), high(10, row(3))];
    expect(numbers(paginate(blocks, 100))).toEqual([[1], [2], [3]]);
    expect(paginate([], 100)).toEqual([]);
  });

  test('a line is counted as a browser breaks it', () => {
    expect(linesNeeded('short', 100, 13)).toBe(1);
    expect(linesNeeded('two words that do not fit', 80, 13)).toBeGreaterThan(1);
    expect(linesNeeded('unbreakable'.repeat(20), 100, 13)).toBeGreaterThan(10);
  });
});

test('the style sheet prints the sizes that pages are counted with', () => {
  const css = readFileSync('components/handout/handout.css', 'utf8');
  const rule = (selector: string): string => {
    const start = css.indexOf(`\n${selector} {`);
    return css.slice(start, css.indexOf('}', start));
  };
  expect(rule('.handout')).toContain(`font-size: ${TEXT_PX}px`);
  expect(rule('.handout')).toContain(`line-height: ${LINE_MM}mm`);
  expect(css).toContain(`padding: ${CELL_PAD_MM.y}mm ${CELL_PAD_MM.x}mm`);
  expect(rule('.handout .table-page h3')).toContain(`height: ${TITLE_MM}mm`);
  expect(rule('.handout th')).toContain(`height: ${HEAD_MM}mm`);
});

test('papers have their standard sizes, the long side across', () => {
  expect(PAPERS.letter).toMatchObject({ widthMm: 11 * 25.4, heightMm: 215.9 });
  expect(PAPERS.a4).toMatchObject({ widthMm: 297, heightMm: 210 });
});
