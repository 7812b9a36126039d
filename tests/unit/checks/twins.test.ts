import { readdirSync, readFileSync } from 'node:fs';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { CHECKS, runChecks, standsFor, type Finding, type Status } from '@/lib/checks';
import { parseExchange } from '@/lib/layout/exchange';
import { oddCase } from '../../odd-sheet';
import { cases, randomCase, type RandomCase } from '../../random-sheet';
import { compareArcs, compareFindings, twinFindings, twinStandsFor } from '../../twins';

/** The twins write out every rule again, slowly, from its own text; see tests/twins. */

const input = ({ sheet, limits, asOf }: RandomCase) => ({ ...sheet, limits, asOf });

/**
 * A limit set more than a right angle beyond the swing may leave several arcs standing, where the
 * rule speaks of one and does not say which.
 */
const severalArcs = ({ layout, limits: { values } }: ReturnType<typeof input>): boolean => {
  const swing = Math.max(layout.conditions.wind?.swing_deg ?? 0, values.swing_floor_deg);
  return values.upwind_max_deg - swing > 90;
};

test('the checks answer as their slow twins do', { timeout: 1_800_000 }, () => {
  const answered = new Set<string>();
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 1_000_000 }), fc.boolean(), (seed, odd) => {
      const asked = input(odd ? oddCase(seed) : randomCase(seed));
      const ours = runChecks(asked);
      for (const { rule, status } of ours) answered.add(`${rule} ${status}`);
      const faults = [
        ...compareFindings(ours, twinFindings(asked)),
        ...(severalArcs(asked) ? [] : compareArcs(standsFor(asked), twinStandsFor(asked))),
      ];
      expect(faults, `seed ${seed}, ${odd ? 'odd' : 'plain'}`).toEqual([]);
    }),
    // A smaller seed is no simpler case, so there is nothing to shrink to.
    { numRuns: cases(10_000), seed: 5, endOnFailure: true },
  );
  // A rule that never failed over all these cases was never put to the test.
  for (const { id } of CHECKS) {
    const seen = (status: Status): boolean => answered.has(`${id} ${status}`);
    expect(seen('not-met') || seen('caution') || seen('not-known'), id).toBe(true);
    expect(seen('meets'), id).toBe(true);
  }
});

const FOLDER = new URL('../../fixtures/exchange/', import.meta.url);
const files = readdirSync(FOLDER).filter((name) => name.endsWith('.geojson'));
const read = (name: string) => JSON.parse(readFileSync(new URL(name, FOLDER), 'utf8'));

/** The twins are held to the same outside answers as the checks are, lest both be wrong alike. */
test.each(files)('the twins give the answers beside %s', (name) => {
  const file = parseExchange(read(name));
  if (!file.ok) throw new Error(`${name} does not parse`);
  const { sheet, limits } = file;
  const twins = new Map(
    twinFindings({ ...sheet, limits, asOf: sheet.layout.planned_at }).map((twin) => [
      twin.id,
      twin,
    ]),
  );
  for (const [id, expected] of Object.entries<{ status: Status; value?: number }>(
    read(name.replace('.geojson', '.expected.json')),
  )) {
    const twin = twins.get(id);
    expect(twin?.status, id).toBe(expected.status);
    if (expected.value === undefined) continue;
    expect(Math.abs(twin!.value! - expected.value), id).toBeLessThan(
      twin!.unit === 'ratio' ? 0.001 : 0.03,
    );
  }
});

const spoil: readonly [string, (finding: Finding) => Finding][] = [
  ['status', (f) => ({ ...f, status: f.status === 'meets' ? 'caution' : 'meets' })],
  ['gate', (f) => ({ ...f, gate: f.gate === 'stop' ? 'ack' : 'stop' })],
  [
    'value',
    (f) => ({ ...f, measured: f.measured && { ...f.measured, value: f.measured.value * 1.1 + 1 } }),
  ],
  ['subject', (f) => ({ ...f, id: `${f.id}?` })],
];

test.each(spoil)('a wrong %s in any one finding is noticed', (what, change) => {
  const asked = input(randomCase(5));
  const ours = runChecks(asked);
  const twins = twinFindings(asked);
  const untold = new Set(twins.filter(({ tie, maybe }) => tie || maybe).map(({ id }) => id));
  expect(compareFindings(ours, twins)).toEqual([]);
  const rules = new Set<string>();
  for (const finding of ours) {
    if (untold.has(finding.id) || (what === 'value' && !finding.measured)) continue;
    const spoilt = ours.map((one) => (one === finding ? change(one) : one));
    expect(compareFindings(spoilt, twins), finding.id).not.toEqual([]);
    rules.add(finding.rule);
  }
  expect(rules.size).toBeGreaterThan(what === 'value' ? 15 : CHECKS.length - 1);
});

test('a finding left out and an arc moved are noticed', () => {
  const asked = input(randomCase(5));
  const ours = runChecks(asked);
  expect(compareFindings(ours.slice(1), twinFindings(asked))).toHaveLength(1);
  const arc = { from_deg: 350, to_deg: 20 };
  expect(compareArcs(arc, arc)).toEqual([]);
  expect(compareArcs(arc, { from_deg: 350, to_deg: 20.1 })).toHaveLength(1);
  expect(compareArcs(arc, null)).toHaveLength(1);
});
