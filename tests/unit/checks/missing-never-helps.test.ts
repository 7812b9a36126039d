import fc from 'fast-check';
import { expect, test } from 'vitest';
import { runChecks, type Finding } from '@/lib/checks';
import { applyEdit } from '@/lib/edits';
import type { Kind, Sheet } from '@/lib/layout';
import { anyCase } from '../../odd-sheet';
import { cases, randomCase } from '../../random-sheet';

/** Entries a planner may not have: taking one away must leave every answer at most as good. */
const ENTRIES: readonly [string, (sheet: Sheet) => Sheet][] = [
  ['wind', (s) => conditions(s, { wind: null })],
  ['swing', (s) => conditions(s, { wind: { ...s.layout.conditions.wind, swing_deg: null } })],
  ['speed', (s) => conditions(s, { wind: { ...s.layout.conditions.wind, speed_mph: null } })],
  ['slope', (s) => conditions(s, { slope: null })],
  ['observed', (s) => conditions(s, { wind: { ...s.layout.conditions.wind, observed_at: null } })],
  ['kit', (s) => ({ ...s, layout: { ...s.layout, kit: null } })],
  ['liquid', (s) => ({ ...s, layout: { ...s.layout, liquid: null } })],
  ['answers', (s) => ({ ...s, site: { ...s.site, answers: {} } })],
  ['tickets', (s) => ({ ...s, site: { ...s.site, locates: [] } })],
  ['none known', (s) => ({ ...s, site: { ...s.site, overhead_none_known_as_of: null } })],
];

const conditions = (sheet: Sheet, changed: Sheet['layout']['conditions']): Sheet => ({
  ...sheet,
  layout: { ...sheet.layout, conditions: { ...sheet.layout.conditions, ...changed } },
});

test('an entry taken away never turns anything to meets', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 1_000_000 }), (seed) => {
      const { sheet, limits, asOf } = anyCase(seed);
      const before = answers(runChecks({ ...sheet, limits, asOf }));
      for (const [name, take] of ENTRIES) {
        const after = runChecks({ ...take(sheet), limits, asOf });
        for (const { id, status } of after) {
          if (status === 'meets')
            expect(before.get(id), `seed ${seed}: ${id} without ${name}`).toBe('meets');
        }
      }
      const without = runChecks({ ...sheet, limits: { ...limits, acceptance: null }, asOf });
      expect(without.find(({ rule }) => rule === 'acceptance-set')?.status).toBe('not-known');
    }),
    { numRuns: cases(1000), seed: 2 },
  );
});

/**
 * A piece taken away is judged by what is left: two rods too near are one rod that is not. What
 * must not happen is that a rule which needs the piece meets for want of it.
 */
const NEEDS: Record<string, readonly string[]> = {
  rp: ['ignition-clear', 'upwind', 'uphill', 'sources-known'],
  hz: ['outside-hot-zone', 'leads-clear', 'sources-known'],
  vt: ['vent-clear', 'sources-known'],
  z: [
    'z-distance',
    'y-in-line',
    'y-ratio',
    'z-far-enough',
    'test-line-clear-of-metal',
    'test-complete',
    'z-central',
  ],
  te: ['test-complete'],
  cv: ['units-grounded', 'units-bonded'],
  rv: ['units-grounded', 'units-bonded', 'upwind', 'uphill', 'ignition-clear', 'outside-hot-zone'],
  C1: ['units-grounded', 'system-complete'],
};

const STANDS_IN: Partial<Record<Kind, Kind>> = { pool: 'release-point' };

test('a piece taken away never turns what needs it to meets', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 1_000_000 }), (seed) => {
      const { sheet, limits, asOf } = anyCase(seed);
      const before = answers(runChecks({ ...sheet, limits, asOf }));
      for (const [id, rules] of Object.entries(NEEDS)) {
        const taken = sheet.layout.pieces.find((piece) => piece.id === id);
        if (!taken) continue;
        // With a pool left there is still a source, with a zone left still a zone: judged by those.
        const left = sheet.layout.pieces.some(
          (piece) => piece !== taken && (STANDS_IN[piece.kind] ?? piece.kind) === taken.kind,
        );
        if (left && taken.kind !== 'rod') continue;
        const after = runChecks({
          ...applyEdit(sheet, { type: 'remove', ids: [id] }),
          limits,
          asOf,
        });
        for (const finding of after) {
          if (!rules.includes(finding.rule) || finding.status !== 'meets') continue;
          const was = before.get(finding.id);
          expect(was, `seed ${seed}: ${finding.id} without ${id}`).toBe('meets');
        }
      }
    }),
    { numRuns: cases(1000), seed: 3 },
  );
});

test('an empty layout meets nothing but what no piece is needed for', () => {
  const { sheet, limits } = randomCase(1);
  const bare = { ...sheet, layout: { ...sheet.layout, pieces: [], conditions: {}, liquid: null } };
  const met = runChecks({
    ...bare,
    site: { ...bare.site, answers: {}, locates: [] },
    limits,
    asOf: null,
  })
    .filter(({ status }) => status === 'meets')
    .map(({ rule }) => rule);
  expect(met).toEqual(['acceptance-set']);
});

const answers = (findings: readonly Finding[]) =>
  new Map(findings.map(({ id, status }) => [id, status]));
