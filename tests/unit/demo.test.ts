import { readFileSync } from 'node:fs';
import { format, resolveConfig } from 'prettier';
import { describe, expect, test } from 'vitest';
import { DEMO_LAYOUTS, DEMO_PEOPLE, DEMO_SITES } from '@/demo/demo';
import { demoFiles } from '@/demo/demo-files';
import { asIfAt, DEMO_MOMENT } from '@/demo/shift-times';
import { runChecks, type Finding, type Status } from '@/lib/checks';
import { EMPTY_GROUND } from '@/lib/layout';
import { parseExchange, writeExchange } from '@/lib/layout/exchange';
import { ROLES } from '@/lib/access';

function open(file: string) {
  const parsed = parseExchange(JSON.parse(readFileSync(file, 'utf8')));
  if (!parsed.ok) throw new Error(`${file}: ${JSON.stringify(parsed.faults)}`);
  return parsed;
}

function findingsOf(file: string): Finding[] {
  const { sheet, limits } = open(file);
  return runChecks({ ...sheet, limits, asOf: sheet.layout.planned_at });
}

const rulesWith = (findings: readonly Finding[], ...statuses: readonly Status[]): string[] => [
  ...new Set(findings.filter((f) => statuses.includes(f.status)).map((f) => f.rule)),
];

const files = Object.fromEntries(DEMO_LAYOUTS.map(({ name, file }) => [name, file]));

test('where everything is right, nothing answers but meets or does not apply', () => {
  const findings = findingsOf(files['Ramp, plan A']!);
  expect(rulesWith(findings, 'caution', 'not-met', 'not-known')).toEqual([]);
  expect(findings.length).toBeGreaterThan(100);
});

test('the hurried plan fails in the ways it was drawn to', () => {
  const findings = findingsOf(files['Team track, plan B']!);
  expect(rulesWith(findings, 'not-met')).toEqual([
    'cables-reach',
    'clear-of-buried-lines',
    'leads-clear',
    'outside-hot-zone',
    'rods-apart',
    'y-in-line',
  ]);
  expect(rulesWith(findings, 'not-known')).toEqual(['buried-lines-known']);
  expect(rulesWith(findings, 'caution')).toEqual(['low-ground', 'wind-fresh', 'y-ratio']);
});

test('with the wind up the slope everything stands upwind and the slope only warns', () => {
  const findings = findingsOf(files['Loading rack, wind up the slope']!);
  expect(rulesWith(findings, 'not-met', 'not-known')).toEqual([]);
  expect(rulesWith(findings, 'caution')).toEqual(['uphill', 'wind-and-slope-agree']);
});

test('the standing plan waits for the day’s wind and for a new ticket', () => {
  const findings = findingsOf(files['Standing plan, rack to north apron']!);
  expect(rulesWith(findings, 'not-met')).toEqual(['locates-current']);
  expect(rulesWith(findings, 'not-known')).toEqual([
    'upwind',
    'wind-and-slope-agree',
    'wind-fresh',
  ]);
  expect(rulesWith(findings, 'caution')).toEqual([]);
});

test('the first look is nearly empty and says what is missing', () => {
  const { sheet } = open(files['Team track, first look']!);
  expect(sheet.layout.pieces).toHaveLength(2);
  const missing = rulesWith(findingsOf(files['Team track, first look']!), 'not-met', 'not-known');
  expect(missing).toEqual(expect.arrayContaining(['system-complete', 'units-grounded', 'upwind']));
});

describe('the files', () => {
  test('stand as the feet they were written from', async () => {
    const style = await resolveConfig('demo/files/any.json');
    for (const { path, content } of demoFiles()) {
      const wanted = await format(JSON.stringify(content), { ...style, parser: 'json' });
      expect(readFileSync(path, 'utf8') === wanted, `${path} is out of date`).toBe(true);
    }
  }, 30_000);

  test('come back from reading as they were', () => {
    for (const { path, content } of demoFiles()) {
      const { sheet, limits } = open(path);
      const order = [...sheet.layout.pieces, ...sheet.site.features].map((piece) => piece.id);
      expect(JSON.parse(JSON.stringify(writeExchange({ sheet, limits, order })))).toEqual(
        JSON.parse(JSON.stringify(content)),
      );
    }
  });

  test('carry their site’s ground whole', () => {
    for (const { site, file } of DEMO_LAYOUTS) {
      const home = DEMO_SITES.find(({ key }) => key === site)!;
      const ground = open(home.ground).sheet;
      expect(open(file).sheet.site).toEqual(ground.site);
      expect(ground.layout.pieces).toEqual([]);
      expect(ground.site).not.toEqual(EMPTY_GROUND);
    }
  });
});

test('every site has the kinds of ground that the checks ask about', () => {
  for (const { ground, scene } of DEMO_SITES) {
    const { features, answers, locates } = open(ground).sheet.site;
    const kinds = new Set(features.map((feature) => feature.kind));
    expect([...kinds].sort()).toEqual([
      'buried-line',
      'fixed-point',
      'low-ground',
      'metal-line',
      'no-drive',
      'overhead-line',
    ]);
    expect(Object.keys(answers)).toHaveLength(7);
    expect(locates.length).toBeGreaterThan(0);
    expect(features.filter((f) => f.kind === 'no-drive')).toHaveLength(
      scene.roads.length + scene.hardstands.length,
    );
  }
});

test('the slope entered in a layout is the slope of its site’s contours', () => {
  for (const { site, file } of DEMO_LAYOUTS) {
    const { ground } = DEMO_SITES.find(({ key }) => key === site)!.scene;
    const { down_deg, grade_pct } = open(file).sheet.layout.conditions.slope ?? {};
    expect([down_deg, grade_pct]).toEqual([ground.down_deg, ground.grade_pct]);
  }
});

test('one person for every role, at addresses that lead nowhere', () => {
  expect(DEMO_PEOPLE.map((person) => person.role).sort()).toEqual([...ROLES].sort());
  expect(DEMO_PEOPLE.every((person) => person.email.endsWith('.example'))).toBe(true);
});

describe('laid in at another moment', () => {
  const now = new Date('2027-11-02T08:13:45.678Z');

  test('every layout answers as it did, and its times lie around that minute', () => {
    for (const { file } of DEMO_LAYOUTS) {
      const { sheet, limits } = open(file);
      const then = asIfAt(now, sheet);
      const statuses = (one: typeof sheet): string[] =>
        runChecks({ ...one, limits, asOf: one.layout.planned_at }).map((f) => f.id + f.status);
      expect(statuses(then)).toEqual(statuses(sheet));
    }
    const { layout } = asIfAt(now, open(files['Ramp, plan A']!).sheet);
    expect(layout.planned_at).toBe('2027-11-02T08:13:00Z');
    expect(layout.conditions.wind?.observed_at).toBe('2027-11-02T08:03:00Z');
  });

  test('no wind is observed after the moment it is opened', () => {
    for (const { file } of DEMO_LAYOUTS) {
      const observed = open(file).sheet.layout.conditions.wind?.observed_at;
      if (observed) expect(Date.parse(observed)).toBeLessThan(Date.parse(DEMO_MOMENT));
    }
  });
});
