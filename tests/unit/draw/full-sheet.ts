import { feetToMetres, localPlane, quantise, type LonLat } from '@/lib/geo';
import type { LayoutPiece, Sheet, SiteFeature } from '@/lib/layout';
import { emptyLayout } from '@/lib/layout';

/** An invented ramp with every kind of piece on it; places in feet east and north of the origin. */

export const ORIGIN: LonLat = [-96.5, 41.3];
const plane = localPlane(ORIGIN);

export const ft = (east: number, north: number): LonLat =>
  quantise(plane.toLonLat({ x: feetToMetres(east), y: feetToMetres(north) }));

const ring = (radius: number, count = 72): LonLat[] => {
  const places = Array.from({ length: count }, (_, i) => {
    const turn = (i * 2 * Math.PI) / count;
    return ft(Math.sin(turn) * radius, Math.cos(turn) * radius);
  });
  return [...places, places[0]!];
};
const closed = (...corners: (readonly [number, number])[]): LonLat[] => {
  const places = corners.map(([x, y]) => ft(x, y));
  return [...places, places[0]!];
};

const pieces: LayoutPiece[] = [
  { id: 'hot', kind: 'hot-zone', rings: [ring(45)] },
  { id: 'warm', kind: 'warm-zone', rings: [ring(72)] },
  { id: 'cv', kind: 'casualty-vehicle', at: ft(0, 0), heading_deg: 60 },
  { id: 'rv', kind: 'receiving-vehicle', at: ft(25, 96), heading_deg: 60 },
  { id: 'pu', kind: 'pump', at: ft(23, 64), heading_deg: 80 },
  { id: 'leak', kind: 'release-point', at: ft(10, 3) },
  { id: 'pool', kind: 'pool', rings: [closed([8, -4], [16, -6], [20, -12], [12, -16], [6, -11])] },
  { id: 'vent', kind: 'vent', at: ft(30, 99), of: 'rv' },
  {
    id: 'rod-c1',
    kind: 'rod',
    system: 'C',
    label: 'C1',
    at: ft(-39.6, 40.6),
    length_ft: 6,
    driven_ft: 5.5,
  },
  {
    id: 'rod-c2',
    kind: 'rod',
    system: 'C',
    label: 'C2',
    at: ft(-42, 44.9),
    length_ft: 6,
    driven_ft: 5.5,
  },
  {
    id: 'rod-p1',
    kind: 'rod',
    system: 'P',
    label: 'P1',
    at: ft(-27.4, 47.6),
    length_ft: 6,
    driven_ft: 5.5,
  },
  {
    id: 'rod-r1',
    kind: 'rod',
    system: 'R',
    label: 'R1',
    at: ft(-15.3, 54.6),
    length_ft: 6,
    driven_ft: 5.5,
  },
  {
    id: 'rod-r2',
    kind: 'rod',
    system: 'R',
    label: 'R2',
    at: ft(-17, 61.8),
    length_ft: 6,
    driven_ft: 5.5,
  },
  {
    id: 'j-c',
    kind: 'jumper',
    from: 'rod-c1',
    to: 'rod-c2',
    path: [ft(-39.6, 40.6), ft(-42, 44.9)],
  },
  {
    id: 'j-r',
    kind: 'jumper',
    from: 'rod-r1',
    to: 'rod-r2',
    path: [ft(-15.3, 54.6), ft(-17, 61.8)],
  },
  {
    id: 'g-c',
    kind: 'ground-cable',
    from: 'cv',
    to: 'rod-c1',
    path: [ft(-19, -6), ft(-39.6, 40.6)],
  },
  { id: 'g-r', kind: 'ground-cable', from: 'rv', to: 'rod-r1', path: [ft(3, 80), ft(-15.3, 54.6)] },
  {
    id: 'g-p',
    kind: 'ground-cable',
    from: 'pu',
    to: 'rod-p1',
    path: [ft(23, 64), ft(-27.4, 47.6)],
  },
  { id: 'b-cr', kind: 'bond-cable', from: 'cv', to: 'rv', path: [ft(7, 9), ft(14, 86)] },
  { id: 'b-cp', kind: 'bond-cable', from: 'cv', to: 'pu', path: [ft(12, 12), ft(23, 64)] },
  {
    id: 'h-cp',
    kind: 'hose',
    from: 'cv',
    to: 'pu',
    diameter_in: 4,
    path: [ft(17, 15), ft(23, 64)],
  },
  {
    id: 'h-pr',
    kind: 'hose',
    from: 'pu',
    to: 'rv',
    diameter_in: 4,
    path: [ft(23, 64), ft(23, 91)],
  },
  { id: 'z', kind: 'z-probe', at: ft(-59, 102) },
  { id: 'y-c', kind: 'y-probe', serves: ['C'], at: ft(-52, 79.5) },
  { id: 'y-p', kind: 'y-probe', serves: ['P'], at: ft(-47, 81.4) },
  { id: 'y-r', kind: 'y-probe', serves: ['R'], at: ft(-42.5, 85.3) },
  { id: 'tester', kind: 'tester', at: ft(-32, 41.5) },
  {
    id: 'l-c',
    kind: 'test-lead',
    from: 'tester',
    to: 'rod-c1',
    path: [ft(-32, 41.5), ft(-39.6, 40.6)],
  },
  { id: 'l-z', kind: 'test-lead', from: 'tester', to: 'z', path: [ft(-32, 41.5), ft(-59, 102)] },
  { id: 'n', kind: 'note', at: ft(52, 30), text: 'Charged line here' },
];

const features: SiteFeature[] = [
  {
    id: 'gas',
    kind: 'buried-line',
    utility: 'gas-oil-steam',
    diameter_in: 2,
    quality: 'B',
    paths: [[ft(-125, 95), ft(-90, 20), ft(-55, -60)]],
  },
  {
    id: 'water',
    kind: 'buried-line',
    utility: 'potable-water',
    diameter_in: 6,
    quality: 'C',
    paths: [[ft(-130, 85), ft(-70, 122)]],
  },
  {
    id: 'elec',
    kind: 'buried-line',
    utility: 'electric',
    quality: 'D',
    paths: [[ft(70, -60), ft(80, 40), ft(120, 110)]],
  },
  {
    id: 'rail',
    kind: 'metal-line',
    what: 'guardrail',
    path: [ft(-70, -55), ft(40, -20), ft(100, 8)],
  },
  { id: 'over', kind: 'overhead-line', volts: 12470, path: [ft(-120, -20), ft(-20, -70)] },
  {
    id: 'pave',
    kind: 'no-drive',
    surface: 'pavement',
    rings: [closed([-70, -60], [40, -26], [110, 0], [110, -30], [40, -56], [-40, -80])],
  },
  { id: 'ditch', kind: 'low-ground', rings: [closed([60, 60], [90, 75], [95, 66], [66, 50])] },
  { id: 'f1', kind: 'fixed-point', name: 'hydrant', at: ft(-62, -17) },
  { id: 'f2', kind: 'fixed-point', name: 'sign post', at: ft(-16, 88) },
];

export const FULL_SHEET: Sheet = {
  layout: {
    ...emptyLayout(ORIGIN, 'Ramp 4, plan B'),
    planned_at: '2031-05-04T14:00:00Z',
    pump: 'separate',
    conditions: {
      wind: { from_deg: 330, speed_mph: 8, swing_deg: 20, observed_at: '2031-05-04T13:53:00Z' },
      slope: { down_deg: 150, grade_pct: 3 },
    },
    liquid: { name: 'n-Hexane', un: '1208', flash_point_c: -23, boiling_point_c: 69 },
    pieces,
  },
  site: {
    features,
    answers: { 'gas-oil-steam': { answer: 'marked' }, 'potable-water': { answer: 'marked' } },
    overhead_none_known_as_of: null,
    locates: [],
  },
};
