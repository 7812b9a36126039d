import { describe, expect, test } from 'vitest';
import { runChecks } from '@/lib/checks';
import { feetToMetres, localPlane, quantise, type LonLat } from '@/lib/geo';
import { emptyLayout, EMPTY_GROUND, type LayoutPiece, type SiteFeature } from '@/lib/layout';
import { limitsFrom, overheadClearanceFeet } from '@/lib/limits';

const ORIGIN: LonLat = [-98.3, 41.2];
const plane = localPlane(ORIGIN);
const at = (eastFt: number, northFt: number): LonLat =>
  quantise(plane.toLonLat({ x: feetToMetres(eastFt), y: feetToMetres(northFt) }));

const rod = (id: string, system: 'C' | 'R' | 'P', east: number, north: number): LayoutPiece => ({
  id,
  kind: 'rod',
  system,
  at: at(east, north),
});

function findings(pieces: LayoutPiece[], features: SiteFeature[] = []) {
  const layout = { ...emptyLayout(ORIGIN), pieces };
  const list = runChecks({
    layout,
    site: { ...EMPTY_GROUND, features },
    limits: limitsFrom(),
    asOf: null,
  });
  return (id: string) => list.find((finding) => finding.id === id)!;
}

/** Worked by hand from plane geometry: three systems 10 ft apart, Z 60 ft out, Y at 62 %. */
describe('three systems in a row, one Z', () => {
  const find = findings([
    rod('X1', 'C', -10, 0),
    rod('X2', 'R', 0, 0),
    rod('X3', 'P', 10, 0),
    { id: 'Z', kind: 'z-probe', at: at(0, 60) },
    { id: 'YC', kind: 'y-probe', serves: ['C'], at: at(-3.8, 37.2) },
    { id: 'YR', kind: 'y-probe', serves: ['R'], at: at(0, 37.2) },
  ]);
  test.each([
    ['z-distance|C', 60.83],
    ['z-distance|R', 60],
    ['z-distance|P', 60.83],
    ['y-distance|C', 37.71],
    ['y-distance|R', 37.2],
    ['z-central|', 0.83],
  ])('%s reads %f ft and meets', (id, feet) => {
    expect(find(id).measured!.value).toBeCloseTo(feet, 1);
    expect(find(id).status).toBe('meets');
  });
  test('ten feet drawn is ten feet', () => {
    expect(find('systems-apart|C,R').status).toBe('meets');
    expect(find('systems-apart|C,R').measured!.value).toBeCloseTo(10, 2);
  });
});

/** Source: 29 CFR 1926.1408, Table A, minimum clearance distances. */
describe('overhead clearance at the edges of the table', () => {
  test.each([
    [0, 10],
    [50_000, 10],
    [50_001, 15],
    [200_000, 15],
    [200_001, 20],
    [350_000, 20],
    [350_001, 25],
    [500_000, 25],
    [500_001, 35],
    [750_000, 35],
    [750_001, 45],
    [1_000_000, 45],
  ])('%i V takes %i ft', (volts, feet) => {
    expect(overheadClearanceFeet(volts)).toBe(feet);
  });
  test('above the table only the owner can say', () => {
    expect(overheadClearanceFeet(1_000_001)).toBeNull();
  });
});

/**
 * Source: Common Ground Alliance best practice 5.19, tolerance zone: half the line's width plus
 * 18 in each side, so a 2-in pipe has a strip of 38 in, 19 in from its centreline.
 */
describe('tolerance zone of a 2-in gas line', () => {
  const pipe: SiteFeature = {
    id: 'G',
    kind: 'buried-line',
    utility: 'gas-oil-steam',
    diameter_in: 2,
    quality: 'A',
    paths: [[at(0, -200), at(0, 200)]],
  };
  test.each([
    [18.9, 'not-met', 'stop'],
    [19.1, 'caution', 'deviation'],
    [20.3, 'meets', 'deviation'],
  ] as const)('a rod %f in from the centreline: %s', (inches, status, gate) => {
    const finding = findings(
      [rod('C1', 'C', inches / 12, 0)],
      [pipe],
    )('clear-of-buried-lines|C1,G');
    expect(finding).toMatchObject({ status, gate });
    expect(finding.measured!.value).toBeCloseTo((inches - 1) / 12, 2);
  });
});
