import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { parseExchange, type Fault } from '@/lib/layout/exchange';

const SOUND = readFileSync(
  new URL('../fixtures/exchange/everything-met.geojson', import.meta.url),
  'utf8',
);

// A file as a planner's editor might leave it: free-form on purpose.
type Json = { [name: string]: Json } & Json[] & { push(...items: unknown[]): number };

function faultsAfter(spoil: (file: Json) => void): readonly Fault[] {
  const file = JSON.parse(SOUND) as Json;
  spoil(file);
  const parsed = parseExchange(file);
  return parsed.ok ? [] : parsed.faults;
}

const set = (value: unknown) => value as Json;
const feature = (file: Json, id: string): Json =>
  (file.features as Json[]).find((f) => (f.id as unknown) === id) as Json;
const indexOf = (id: string): number =>
  (JSON.parse(SOUND).features as { id: string }[]).findIndex((f) => f.id === id);

describe('one fault, told with its path', () => {
  const cases: [string, (file: Json) => void, string, RegExp][] = [
    ['not a collection', (f) => (f.type = set('Feature')), 'type', /FeatureCollection/],
    ['no foreign member', (f) => delete f.stillground, 'stillground', /not a layout/],
    [
      'another version',
      (f) => (f.stillground!.version = set(2)),
      'stillground.version',
      /must be 1/,
    ],
    ['features not a list', (f) => (f.features = set({})), 'features', /list/],
    [
      'a number out of range',
      (f) => (f.stillground!.conditions!.wind!.from_deg = set(400)),
      'stillground.conditions.wind.from_deg',
      /360 or less/,
    ],
    [
      'a time that is none',
      (f) => (f.stillground!.planned_at = set('tomorrow')),
      'stillground.planned_at',
      /written like/,
    ],
    [
      'NaN',
      (f) => (feature(f, 'Z').geometry!.coordinates![0] = set(NaN)),
      `features[${indexOf('Z')}].geometry.coordinates[0]`,
      /number/,
    ],
    [
      'latitude beyond the pole',
      (f) => (feature(f, 'Z').geometry!.coordinates![1] = set(91)),
      `features[${indexOf('Z')}].geometry.coordinates`,
      /latitude/,
    ],
    [
      'wrong geometry',
      (f) => (feature(f, 'Z').geometry!.type = set('LineString')),
      `features[${indexOf('Z')}].geometry.type`,
      /drawn as Point/,
    ],
    [
      'no geometry',
      (f) => (feature(f, 'Z').geometry = set(null)),
      `features[${indexOf('Z')}].geometry`,
      /needs a Point/,
    ],
    [
      'unknown kind',
      (f) => (feature(f, 'Z').properties!.kind = set('spaceship')),
      `features[${indexOf('Z')}].properties.kind`,
      /unknown kind/,
    ],
    [
      'no kind',
      (f) => delete feature(f, 'Z').properties!.kind,
      `features[${indexOf('Z')}].properties.kind`,
      /missing/,
    ],
    ['no id', (f) => delete feature(f, 'Z').id, `features[${indexOf('Z')}].id`, /text id/],
    [
      'an id that is a number',
      (f) => (feature(f, 'Z').id = set(7)),
      `features[${indexOf('Z')}].id`,
      /text id/,
    ],
    [
      'the same id twice',
      (f) => (feature(f, 'Z').id = set('T')),
      `features[${indexOf('T')}].id`,
      /already/,
    ],
    [
      'a reference to nothing',
      (f) => (feature(f, 'j1').properties!.to = set('rod-99')),
      `features[${indexOf('j1')}].properties.to`,
      /no piece "rod-99"/,
    ],
    [
      'a reference to the wrong kind',
      (f) => (feature(f, 'j1').properties!.to = set('Z')),
      `features[${indexOf('j1')}].properties.to`,
      /z-probe, not a rod/,
    ],
    [
      'a missing reference',
      (f) => delete feature(f, 'j1').properties!.from,
      `features[${indexOf('j1')}].properties.from`,
      /must name/,
    ],
    [
      'an unclosed ring',
      (f) => (feature(f, 'hot').geometry!.coordinates![0] as Json).pop(),
      `features[${indexOf('hot')}].geometry.coordinates[0]`,
      /not closed/,
    ],
    [
      'a second pump',
      (f) => (f.features as Json).push({ ...feature(f, 'pu'), id: 'pu2' }),
      'features[26].properties.kind',
      /one pump/,
    ],
    [
      'an end away from its rod',
      (f) => (feature(f, 'j1').geometry!.coordinates![0] = set([-98.3001, 41.2001])),
      `features[${indexOf('j1')}].geometry.coordinates[0]`,
      /ft from C1/,
    ],
    [
      'six miles off',
      (f) => (feature(f, 'Z').geometry!.coordinates![1] = set(41.29)),
      `features[${indexOf('Z')}].geometry.coordinates`,
      /miles from the origin/,
    ],
    [
      'a sign lost in longitude',
      (f) => (feature(f, 'Z').geometry!.coordinates = set([98.3, 41.2])),
      `features[${indexOf('Z')}].geometry.coordinates`,
      /half a world|miles from the origin/,
    ],
    [
      'a system that is none',
      (f) => (feature(f, 'rod-1').properties!.system = set('Q')),
      `features[${indexOf('rod-1')}].properties.system`,
      /C, R or P/,
    ],
    [
      'a kit item that is none',
      (f) => (f.stillground!.kit!.items![0]!.kind = set('ladder')),
      'stillground.kit.items[0].kind',
      /one of/,
    ],
  ];
  test.each(cases)('%s', (_name, spoil, path, message) => {
    const faults = faultsAfter(spoil);
    const told = faults.find((fault) => fault.path === path);
    expect(told, JSON.stringify(faults)).toBeDefined();
    expect(told!.message).toMatch(message);
  });
});

test('every fault at once', () => {
  const faults = faultsAfter((file) => {
    file.stillground!.pump = set('sometimes');
    feature(file, 'Z').properties!.kind = set('zed');
    feature(file, 'rod-1').properties!.length_ft = set(-4);
    delete feature(file, 'b1').properties!.to;
  });
  expect(faults.map((fault) => fault.path).sort()).toEqual(
    [
      'stillground.pump',
      `features[${indexOf('Z')}].properties.kind`,
      `features[${indexOf('rod-1')}].properties.length_ft`,
      `features[${indexOf('b1')}].properties.to`,
    ].sort(),
  );
});

test('more than 2,000 pieces', () => {
  const faults = faultsAfter((file) => {
    for (let i = 0; i < 2000; i++) {
      (file.features as Json).push({ ...feature(file, 'rod-1'), id: `extra-${i}` });
    }
  });
  expect(faults).toEqual([
    { path: 'features', message: expect.stringMatching(/more than the 2000/) },
  ]);
});

test('no origin: the casualty vehicle gives it; neither is a fault', () => {
  expect(faultsAfter((file) => delete file.stillground!.origin)).toEqual([]);
  const faults = faultsAfter((file) => {
    delete file.stillground!.origin;
    file.features = set(
      (file.features as Json[]).filter(
        (f) => !['cv', 'g1', 'b1', 'b2', 'h1'].includes(f.id as never),
      ),
    );
  });
  expect(faults).toEqual([{ path: 'stillground.origin', message: expect.any(String) }]);
});

test.each([[null], [[]], ['text'], [7], [{}]])('%j is refused', (value) => {
  expect(parseExchange(value).ok).toBe(false);
});

test('what this version does not know survives a round trip', async () => {
  const { writeExchange } = await import('@/lib/layout/exchange');
  const file = JSON.parse(SOUND);
  file.bbox = [1, 2, 3, 4];
  file.stillground.mood = 'calm';
  file.stillground.conditions.tide = { height_ft: 2 };
  file.stillground.conditions.wind.gust_mph = 14;
  file.stillground.liquid.colour = 'clear';
  file.stillground.limits.values.moon_min_ft = 3;
  file.features[0].title = 'a foreign member';
  file.features[0].properties.paint = 'white';
  const parsed = parseExchange(file);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.faults));
  const written = JSON.parse(JSON.stringify(writeExchange(parsed)));
  expect(written.bbox).toEqual([1, 2, 3, 4]);
  expect(written.stillground.mood).toBe('calm');
  expect(written.stillground.conditions.tide).toEqual({ height_ft: 2 });
  expect(written.stillground.conditions.wind.gust_mph).toBe(14);
  expect(written.stillground.liquid.colour).toBe('clear');
  expect(written.stillground.limits.values.moon_min_ft).toBe(3);
  expect(written.features[0].title).toBe('a foreign member');
  expect(written.features[0].properties.paint).toBe('white');
  expect(written.features.map((f: { id: string }) => f.id)).toEqual(
    file.features.map((f: { id: string }) => f.id),
  );
});
