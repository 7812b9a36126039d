import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { checkReport } from '@/lib/checks';
import { parseExchange, writeExchange } from '@/lib/layout/exchange';

const FOLDER = new URL('../fixtures/exchange/', import.meta.url);
const read = (name: string) => JSON.parse(readFileSync(new URL(name, FOLDER), 'utf8'));
const names = readdirSync(FOLDER)
  .filter((name) => name.endsWith('.geojson'))
  .map((name) => name.replace('.geojson', ''));

type Expected = Record<string, { status: string; value?: number; unit?: string }>;

/** The values beside each layout were computed with GeographicLib, away from ties. */
describe.each(names)('%s', (name) => {
  const raw = read(`${name}.geojson`);
  const parsed = parseExchange(raw);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.faults));
  const report = checkReport(parsed.sheet, parsed.limits);
  const answers = new Map(report.findings.map((f) => [`${f.rule}|${f.subjects.join(',')}`, f]));

  test.each(Object.entries(read(`${name}.expected.json`) as Expected))('%s', (id, expected) => {
    const finding = answers.get(id);
    expect(finding?.status).toBe(expected.status);
    if (expected.value !== undefined) {
      expect(finding?.measured?.unit).toBe(expected.unit);
      const within = expected.unit === 'ratio' ? 0.001 : 0.03;
      expect(Math.abs(finding!.measured!.value - expected.value)).toBeLessThanOrEqual(within);
    }
  });

  test('every finding has its own id', () => {
    expect(answers.size).toBe(report.findings.length);
  });

  test('reading what was written gives the same layout', () => {
    const again = parseExchange(JSON.parse(JSON.stringify(writeExchange(parsed))));
    expect(again).toEqual(parsed);
  });
});

test('on "everything met" nothing answers other than meets or does not apply', () => {
  const parsed = parseExchange(read('everything-met.geojson'));
  if (!parsed.ok) throw new Error('the fixture does not parse');
  const { summary } = checkReport(parsed.sheet, parsed.limits);
  expect(summary).toMatchObject({ caution: 0, not_met: 0, not_known: 0 });
  expect(summary.meets).toBeGreaterThan(100);
});
