import { describe, expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import { distance, footprintToPoint, localPlane, metresToFeet, type LonLat } from '@/lib/geo';
import { findPiece, footprintOf, planeOf } from '@/lib/layout';
import { everythingMet } from './everything';
import { expectRefused, pieceOf, type Refusal } from './refusals';

const sheet = everythingMet();
const plane = localPlane(sheet.layout.origin);
const move = (...moves: { id: string; to: LonLat }[]): Edit => ({ type: 'move', moves });
const feet = (a: LonLat, b: LonLat): number =>
  metresToFeet(distance(plane.toPlane(a), plane.toPlane(b)));
const to: LonLat = [-98.3002, 41.2001];

describe('a rod', () => {
  const after = applyEdit(sheet, move({ id: 'rod-1', to }));

  test('takes the ends of its jumper and cable along, and nothing else of them', () => {
    expect(pieceOf(after, 'rod-1', 'rod').at).toEqual(to);
    expect(pieceOf(after, 'j1', 'jumper').path).toEqual([
      to,
      pieceOf(sheet, 'j1', 'jumper').path[1],
    ]);
    expect(pieceOf(after, 'g1', 'ground-cable').path).toEqual([
      pieceOf(sheet, 'g1', 'ground-cable').path[0],
      to,
    ]);
  });

  test('leaves the sheet given, the site and every other piece as they are', () => {
    expect(after.site).toBe(sheet.site);
    for (const { id } of sheet.layout.pieces) {
      if (['rod-1', 'j1', 'g1'].includes(id)) continue;
      expect(findPiece(after, id)).toBe(findPiece(sheet, id));
    }
  });

  test('is quantised to eight decimals', () => {
    const fine = applyEdit(sheet, move({ id: 'rod-1', to: [-98.300200004, 41.200100006] }));
    expect(pieceOf(fine, 'rod-1', 'rod').at).toEqual([-98.3002, 41.20010001]);
  });

  test('moved to where it is changes nothing', () => {
    expect(applyEdit(sheet, move({ id: 'rod-1', to: pieceOf(sheet, 'rod-1', 'rod').at }))).toBe(
      sheet,
    );
  });
});

describe('a unit', () => {
  const casualty = pieceOf(sheet, 'cv', 'casualty-vehicle');
  const receiver = pieceOf(sheet, 'rv', 'receiving-vehicle');

  test('carries its clamps in their places on the footprint', () => {
    const after = applyEdit(sheet, move({ id: 'cv', to }));
    for (const id of ['g1', 'b1', 'b2', 'h1']) {
      const [before, now] = [sheet, after].map((s) => {
        const run = findPiece(s, id);
        return run && 'path' in run ? run.path[0]! : to;
      });
      expect(feet(now!, to)).toBeCloseTo(feet(before!, casualty.at), 2);
      const ring = footprintOf(planeOf(after.layout), pieceOf(after, 'cv', 'casualty-vehicle'));
      expect(footprintToPoint(ring, plane.toPlane(now!))).toBeLessThan(0.003);
    }
  });

  test('carries the release point that stands on it; one beside it stays', () => {
    const on = applyEdit(sheet, move({ id: 'rp', to: [-98.29999, 41.20001] }));
    const before = feet(pieceOf(on, 'rp', 'release-point').at, casualty.at);
    const after = applyEdit(on, move({ id: 'cv', to }));
    expect(feet(pieceOf(after, 'rp', 'release-point').at, to)).toBeCloseTo(before, 2);
    // In the file itself the leak drips 3 ft beside the vehicle.
    expect(findPiece(applyEdit(sheet, move({ id: 'cv', to })), 'rp')).toBe(findPiece(sheet, 'rp'));
  });

  test('carries the vent that is its own even where it hangs over the side', () => {
    const aside = applyEdit(sheet, move({ id: 'vt', to: [-98.29985, 41.2003] }));
    const before = feet(pieceOf(aside, 'vt', 'vent').at, receiver.at);
    const after = applyEdit(aside, move({ id: 'rv', to }));
    expect(feet(pieceOf(after, 'vt', 'vent').at, to)).toBeCloseTo(before, 2);
  });

  test('what is moved by the same edit goes where the edit says', () => {
    const vent: LonLat = [-98.3001, 41.2003];
    const after = applyEdit(sheet, move({ id: 'rv', to }, { id: 'vt', to: vent }));
    expect(pieceOf(after, 'vt', 'vent').at).toEqual(vent);
  });

  test('zones and pools are ground and stay', () => {
    const after = applyEdit(sheet, move({ id: 'cv', to }));
    expect(findPiece(after, 'hot')).toBe(findPiece(sheet, 'hot'));
  });
});

test('the bends of a run go along when both its ends move alike, and stay when one does', () => {
  const bent = applyEdit(sheet, {
    type: 'reshape',
    id: 'g1',
    part: 0,
    vertex: 1,
    to: [-98.3001, 41.20005],
    insert: true,
  });
  const [cv, rod] = [pieceOf(bent, 'cv', 'casualty-vehicle').at, pieceOf(bent, 'rod-1', 'rod').at];
  const east = (place: LonLat): LonLat => [place[0] + 0.0001, place[1]];
  const one = applyEdit(bent, move({ id: 'rod-1', to: east(rod) }));
  expect(pieceOf(one, 'g1', 'ground-cable').path[1]).toEqual([-98.3001, 41.20005]);
  const both = applyEdit(bent, move({ id: 'cv', to: east(cv) }, { id: 'rod-1', to: east(rod) }));
  const bend = pieceOf(both, 'g1', 'ground-cable').path[1]!;
  expect(feet(bend, east([-98.3001, 41.20005]))).toBeLessThan(0.02);
});

test('a line moves whole, its first corner to the place; an area stays closed', () => {
  const line = applyEdit(sheet, move({ id: 'W1', to }));
  expect(line.layout).toBe(sheet.layout);
  const [before] = pieceOf(sheet, 'W1', 'buried-line').paths;
  const [now] = pieceOf(line, 'W1', 'buried-line').paths;
  expect(now![0]).toEqual(to);
  expect(feet(now![0]!, now![1]!)).toBeCloseTo(feet(before![0]!, before![1]!), 1);
  const ring = pieceOf(applyEdit(sheet, move({ id: 'hot', to })), 'hot', 'hot-zone').rings[0]!;
  expect([ring[0], ring.at(-1)]).toEqual([to, to]);
});

test.each<Refusal>([
  ['an unknown id', move({ id: 'nobody', to }), 'nobody', /no longer on the drawing/],
  ['a run', move({ id: 'j1', to }), 'j1', /between two pieces/],
  ['a latitude past the pole', move({ id: 'Z', to: [-98.3, 91] }), 'Z', /latitude/],
  ['a longitude past the date line', move({ id: 'Z', to: [181, 41] }), 'Z', /longitude/],
  ['not a number', move({ id: 'Z', to: [Number.NaN, 41.2] }), 'Z', /must be a number/],
  ['ten miles off', move({ id: 'Z', to: [-98.3, 41.35] }), 'Z', /more than 5 miles/],
  ['the far side of the world', move({ id: 'Z', to: [81.7, -41.2] }), 'Z', /more than 5 miles/],
  ['one id twice', move({ id: 'Z', to }, { id: 'Z', to }), 'Z', /two places/],
])('%s is refused by name', (...refusal) => expectRefused(sheet, refusal));
