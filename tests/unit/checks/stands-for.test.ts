import { expect, test } from 'vitest';
import { firstToFail, standsFor, within } from '@/lib/checks';
import { feetToMetres, localPlane, quantise, type LonLat } from '@/lib/geo';
import { emptyLayout, EMPTY_GROUND, type Layout, type LayoutPiece } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';

const ORIGIN: LonLat = [-98.3, 41.2];
const plane = localPlane(ORIGIN);

/** Rods fifty feet from a leak at the origin, in these directions. */
function rodsToward(directions: readonly number[], wind: Layout['conditions']['wind']): Layout {
  const place = (deg: number, feet: number): LonLat =>
    quantise(plane.toLonLat(plane.offset({ x: 0, y: 0 }, deg, feetToMetres(feet))));
  const pieces: LayoutPiece[] = [
    { id: 'rp', kind: 'release-point', at: ORIGIN },
    ...directions.map((deg, i): LayoutPiece => ({
      id: `C${i}`,
      kind: 'rod',
      system: 'C',
      at: place(deg, 50),
    })),
  ];
  return { ...emptyLayout(ORIGIN), pieces, conditions: { wind } };
}

const WIND = { from_deg: 0, speed_mph: 8, swing_deg: 20, observed_at: '2031-05-04T13:50:00Z' };

test('one rod straight upwind stands for 70° to either side', () => {
  const arc = standsFor({ layout: rodsToward([0], WIND), limits: limitsFrom() })!;
  expect(arc.from_deg).toBeCloseTo(290, 3);
  expect(arc.to_deg).toBeCloseTo(70, 3);
  expect([290.1, 0, 69.9].every((deg) => within(arc, deg))).toBe(true);
  expect([289.9, 180, 70.1].some((deg) => within(arc, deg))).toBe(false);
});

test('rods on opposite sides stand for nothing', () => {
  expect(standsFor({ layout: rodsToward([0, 180], WIND), limits: limitsFrom() })).toBeNull();
});

test('where a wide limit leaves two arcs, the one it blows from now is told, else the wider', () => {
  const limits = limitsFrom({ upwind_max_deg: 150 });
  // ±130° about 0° and about 180° overlap from 50° to 130° and from 230° to 310°.
  const arcFor = (from_deg: number) =>
    standsFor({ layout: rodsToward([0, 180], { ...WIND, from_deg }), limits })!;
  expect(arcFor(270).from_deg).toBeCloseTo(230, 3);
  expect(arcFor(270).to_deg).toBeCloseTo(310, 3);
  expect(arcFor(90).from_deg).toBeCloseTo(50, 3);
});

test.each([
  ['calm', { ...WIND, speed_mph: 2 }],
  ['no swing', { ...WIND, swing_deg: null }],
  ['no wind', null],
])('%s: nothing can be said', (_name, wind) => {
  expect(standsFor({ layout: rodsToward([0], wind), limits: limitsFrom() })).toBeNull();
});

test('what fails already is told before what will', () => {
  const layout = rodsToward([0], { ...WIND, from_deg: 180 });
  const { coming } = firstToFail({
    layout,
    site: {
      ...EMPTY_GROUND,
      locates: [
        { ticket: 'T-1', valid_until: '2031-05-04T13:00:00Z' },
        { ticket: 'T-2', valid_until: '2031-05-06T00:00:00Z' },
      ],
    },
    limits: limitsFrom(),
    asOf: '2031-05-04T14:00:00Z',
  });
  expect(coming.map(({ kind }) => kind)).toEqual(['does-not-stand', 'wind-too-old', 'ticket-ends']);
  expect(coming.at(-1)!.words).toContain('T-2');
});
