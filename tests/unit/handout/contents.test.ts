import { describe, expect, test } from 'vitest';
import { blanksOf } from '@/components/handout/blanks';
import { checkParts } from '@/components/handout/check-rows';
import { planExtent, piecesBeyond } from '@/components/handout/plan-extent';
import { positionsOf } from '@/components/handout/positions';
import { runChecks } from '@/lib/checks';
import { groundSeen, SCALES } from '@/lib/draw';
import { planeOf, type Sheet } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';
import { FULL_SHEET } from '../draw/full-sheet';

const limits = limitsFrom();
const checked = (sheet: Sheet) =>
  runChecks({ layout: sheet.layout, site: sheet.site, limits, asOf: sheet.layout.planned_at });

describe('where each piece stands', () => {
  const { from, rows } = positionsOf(FULL_SHEET, 'ft');
  const row = (name: string) => rows.find((one) => one.name === name)!;

  test('by bearing and distance, by coordinates and by tape', () => {
    expect(row('R1')).toMatchObject({
      what: 'rod 6 ft, driven 5.5 ft',
      bearing: '344°',
      reach: '56.7',
      eastNorth: '15.3 W, 54.6 N',
    });
    expect(from).toEqual(['F2 sign post', 'F1 hydrant']);
    // R1 (−15.3, 54.6) from F2 (−16, 88): √(0.7² + 33.4²).
    expect(row('R1').taped[0]).toBe('33.4');
  });

  test('the casualty is the zero, and has no bearing from itself', () => {
    expect(row('Casualty vehicle')).toMatchObject({ bearing: null, eastNorth: '0, 0' });
  });

  test('in metres where metres are asked for', () => {
    const metres = positionsOf(FULL_SHEET, 'm').rows.find(({ name }) => name === 'R1');
    expect(metres).toMatchObject({ reach: '17.3', what: 'rod 1.8 m, driven 1.7 m' });
  });

  test('rods come first, in the order in which systems are driven', () => {
    expect(rows.slice(0, 6).map(({ name }) => name)).toEqual(['C1', 'C2', 'R1', 'R2', 'P1', 'Z']);
  });
});

describe('blanks', () => {
  const bare: Sheet = {
    ...FULL_SHEET,
    layout: { ...FULL_SHEET.layout, conditions: {}, kit: null },
  };

  test('everything not known waits for a numbered blank, once', () => {
    const findings = checked(bare);
    const blanks = blanksOf(bare, findings);
    const waiting = findings.filter(({ status }) => status === 'not-known');
    expect(waiting.length).toBeGreaterThan(10);
    for (const { id } of waiting) {
      expect([id, blanks.some((blank) => blank.findings.includes(id))]).toEqual([id, true]);
    }
    expect(blanks.map(({ number }) => number)).toEqual(blanks.map((_, i) => i + 1));
    expect(blanks.filter(({ form }) => form.startsWith('Wind from'))).toHaveLength(1);
    expect(blanks.every(({ form }) => form.includes('_'))).toBe(true);
  });

  test('each class of buried line has its own', () => {
    const forms = blanksOf(bare, checked(bare)).map(({ form }) => form);
    expect(forms).toContain('Electric answered at _ [] marked [] clear, by _');
    expect(forms).toContain('Sewer answered at _ [] marked [] clear, by _');
    expect(forms.some((form) => form.startsWith('Gas'))).toBe(false);
  });
});

describe('checks on paper', () => {
  const findings = checked(FULL_SHEET);
  const lines = checkParts(FULL_SHEET, findings, blanksOf(FULL_SHEET, findings)).flatMap(
    (part) => part.lines,
  );

  test('what is not met stands alone with measure, limit and what it takes', () => {
    const line = lines.find(({ status, words }) => status === 'not-met' && words.includes('R1'));
    expect(line).toMatchObject({
      measured: '7.4 ft',
      allowed: '3 to 6 ft',
      asks: 'needs a deviation',
    });
  });

  test('a line that speaks for several limits names none', () => {
    const reach = lines.find(({ words }) => words.startsWith('Clear of buried lines'));
    if (reach && /\d rods/.test(reach.words)) expect(reach.allowed).toBe('');
    for (const { status, asks } of lines) {
      if (status === 'not-known') expect(asks).toMatch(/^blank \d/);
      if (status === 'meets') expect(asks).toBe('');
    }
  });
});

test('a scale chosen too large says which pieces it leaves out', () => {
  const plane = planeOf(FULL_SHEET.layout);
  const extent = planExtent(FULL_SHEET, plane);
  const centre = { x: 0, y: 0 };
  const window = { widthMm: 188, heightMm: 185 };
  const at = (id: string) =>
    groundSeen(
      centre,
      window,
      SCALES.ft.find((scale) => scale.id === id)!,
    );
  expect(piecesBeyond(FULL_SHEET, plane, at('10')).map(({ id }) => id)).toContain('z');
  expect(piecesBeyond(FULL_SHEET, plane, at('60'))).toEqual([]);
  expect(extent.max.y).toBeGreaterThan(30);
});
