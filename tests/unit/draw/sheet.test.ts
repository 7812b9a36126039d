import { describe, expect, test } from 'vitest';
import { runChecks } from '@/lib/checks';
import {
  drawLayout,
  drawSheet,
  drawSite,
  LAYERS,
  type DisplayList,
  type TextMark,
} from '@/lib/draw';
import { limitsFrom } from '@/lib/limits';
import { FULL_SHEET } from './full-sheet';

const limits = limitsFrom();
const view = { metresPerPx: 0.05 };
const input = { sheet: FULL_SHEET, limits, view };

const findings = runChecks({
  layout: FULL_SHEET.layout,
  site: FULL_SHEET.site,
  limits,
  asOf: FULL_SHEET.layout.planned_at,
});

const wordsOf = (list: DisplayList): string[] =>
  list.groups
    .flatMap(({ marks }) => marks)
    .flatMap((mark) => (mark.type === 'text' || mark.type === 'letters' ? [mark.text] : []));

describe('the sheet as a display list', () => {
  test('every piece has a group of its own, and layers follow one another', () => {
    const { groups } = drawSheet(input);
    const ids = new Set(groups.map(({ id }) => id));
    for (const { id } of [...FULL_SHEET.layout.pieces, ...FULL_SHEET.site.features]) {
      expect(ids).toContain(id);
    }
    const order = groups.map(({ layer }) => LAYERS.indexOf(layer));
    expect(order).toEqual([...order].sort((a, b) => a - b));
  });

  test('every piece can be found by a pointer', () => {
    const found = new Set(drawSheet(input).groups.flatMap(({ id, hit }) => (hit ? [id] : [])));
    for (const { id } of [...FULL_SHEET.layout.pieces, ...FULL_SHEET.site.features]) {
      expect(found).toContain(id);
    }
  });

  test('the same sheet draws the same list', () => {
    expect(drawSheet({ ...input, findings })).toEqual(drawSheet({ ...input, findings }));
  });

  test('the ground can be drawn apart from the layout', () => {
    const pieces = new Set(FULL_SHEET.layout.pieces.map(({ id }) => id));
    expect(drawSite(input).groups.some(({ id }) => pieces.has(id))).toBe(false);
    const features = new Set(FULL_SHEET.site.features.map(({ id }) => id));
    const labelled = drawLayout(input).groups.filter(({ id }) => features.has(id));
    expect(labelled.every(({ layer }) => layer === 'label')).toBe(true);
  });

  test('lines carry their words, never a single letter', () => {
    const words = wordsOf(drawSheet(input));
    expect(words).toEqual(expect.arrayContaining(['GAS', 'WATER', 'ELEC', 'GUARDRAIL']));
    const lineWords = wordsOf(drawSite(input));
    expect(lineWords.every((word) => word.length > 1)).toBe(true);
  });

  test('zones say their radius where they are round, in the reader’s measure', () => {
    expect(wordsOf(drawSheet(input))).toContain('HOT ZONE, 45 FT');
    expect(wordsOf(drawSheet({ ...input, units: 'm' }))).toContain('HOT ZONE, 14 M');
  });

  test('pieces are named as the trade names them', () => {
    const words = wordsOf(drawSheet(input));
    expect(words).toEqual(
      expect.arrayContaining(['C1', 'R2', 'Z', 'Y–P', 'Pump', 'Leak', 'F1 hydrant', 'Tester']),
    );
    expect(words).toContain('Casualty vehicle');
  });

  test('labels of rods do not lie on each other', () => {
    const labels = drawSheet(input).groups.flatMap(({ layer, marks }) =>
      layer === 'label' ? marks.filter((m): m is TextMark => m.type === 'text') : [],
    );
    const boxes = labels.map(({ at, offset, text, size }) => ({
      text,
      x: at.x / view.metresPerPx + offset.x,
      y: -at.y / view.metresPerPx + offset.y,
      w: text.length * size * 0.5,
      h: size,
    }));
    const overlapping = boxes.flatMap((a, i) =>
      boxes
        .slice(i + 1)
        .filter(
          (b) =>
            Math.abs(a.x - b.x) < (a.w + b.w) / 2 - 4 && Math.abs(a.y - b.y) < (a.h + b.h) / 2 - 4,
        )
        .map((b) => `${a.text} on ${b.text}`),
    );
    expect(overlapping).toEqual([]);
  });
});

describe('what fails is dimensioned', () => {
  const list = drawSheet({ ...input, findings });
  const group = (id: string) => list.groups.find((g) => g.id === id);

  test('a limit not met is a thick line with its value large, in the alarm ink', () => {
    const marks = group('~rods-apart|rod-r1,rod-r2')?.marks ?? [];
    const value = marks.find((mark): mark is TextMark => mark.type === 'text');
    expect(value).toMatchObject({ text: '7.4 ft', token: 'alarm' });
    expect(value?.size).toBeGreaterThanOrEqual(18);
    expect(marks.some((m) => m.type === 'path' && (m.stroke?.width ?? 0) >= 3)).toBe(true);
  });

  test('the piece that has to move carries the square, not its neighbour', () => {
    const squares = list.groups.filter(
      ({ layer, id }) => layer === 'dimension' && id.startsWith('rod-'),
    );
    expect(squares.map(({ id }) => id)).toEqual(['rod-r2']);
  });

  test('without findings nothing is alarming but the sources and the zone', () => {
    const calm = drawSheet(input).groups.filter(({ layer }) => layer === 'dimension');
    expect(JSON.stringify(calm)).not.toContain('alarm');
  });

  test('the piece in hand shows where its remedy would put it', () => {
    const chosen = drawSheet({ ...input, findings, selection: 'rod-r2' });
    expect(chosen.groups.some(({ id }) => id.startsWith('~remedy-rods-apart'))).toBe(true);
    expect(chosen.groups.some(({ id }) => id === '~focus-rod-r2')).toBe(true);
  });
});
