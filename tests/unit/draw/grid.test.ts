import { expect, test } from 'vitest';
import { borderTicks, drawGrid, roundStep } from '@/lib/draw';
import { feetToMetres } from '@/lib/geo';

const feet = (n: number): number => feetToMetres(n);
const bounds = {
  min: { x: feet(-110), y: feet(-50) },
  max: { x: feet(90), y: feet(110) },
};

test('ticks stand at round distances from the zero, with their side', () => {
  const view = { bounds, metresPerPx: feet(1) / 4.8 };
  const ticks = borderTicks(view, 'ft');
  expect(ticks.filter(({ edge }) => edge === 'top').map(({ label }) => label)).toEqual([
    '100 W',
    '80 W',
    '60 W',
    '40 W',
    '20 W',
    '0',
    '20 E',
    '40 E',
    '60 E',
    '80 E',
  ]);
  expect(ticks.filter(({ edge }) => edge === 'left').map(({ label }) => label)).toEqual([
    '40 S',
    '20 S',
    '0',
    '20 N',
    '40 N',
    '60 N',
    '80 N',
    '100 N',
  ]);
  expect(ticks.find(({ label }) => label === '60 W')?.at).toBeCloseTo(feet(-60), 9);
});

test('ticks are counted from the casualty vehicle wherever it stands', () => {
  const view = { bounds, metresPerPx: feet(1) / 4.8 };
  const zero = { x: feet(7), y: feet(3) };
  const tick = borderTicks(view, 'ft', zero).find(({ label }) => label === '20 E');
  expect(tick?.at).toBeCloseTo(feet(27), 9);
});

test.each([
  [1, 'ft', 76, 500],
  [0.05, 'ft', 60, 10],
  [0.0635, 'ft', 76, 20],
  [0.02, 'm', 60, 2],
] as const)('at %d m a px the step in %s is at least %d px', (metresPerPx, units, px, step) => {
  expect(roundStep(metresPerPx, units, px)).toBe(step);
});

test('the plain grid never floods the sheet', () => {
  const list = drawGrid({ bounds, metresPerPx: 0.05 }, 'ft');
  const lines = list.groups[0]!.marks.flatMap((m) => (m.type === 'path' ? m.lines : []));
  expect(lines.length).toBeGreaterThan(10);
  expect(lines.length).toBeLessThan(120);
});
