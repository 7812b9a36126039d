import { describe as suite, expect, test } from 'vitest';
import { applyEdit, bring, describe, type Wanted } from '@/lib/edits';
import { distance, localPlane, metresToFeet, type LonLat } from '@/lib/geo';
import {
  emptyLayout,
  EMPTY_GROUND,
  piecesOf,
  type Kind,
  type Kit,
  type Piece,
  type Sheet,
} from '@/lib/layout';
import { deepFreeze } from './everything';

const origin: LonLat = [-98.3, 41.2];
const plane = localPlane(origin);
/** Feet east and north of the origin. */
const ft = (east: number, north: number): LonLat =>
  plane.toLonLat({ x: east * 0.3048, y: north * 0.3048 });
const feetBetween = (a: LonLat, b: LonLat): number =>
  metresToFeet(distance(plane.toPlane(a), plane.toPlane(b)));

const empty: Sheet = deepFreeze({ layout: emptyLayout(origin), site: EMPTY_GROUND });

/** Puts pieces down one after another, as a person would from the kit shelf. */
function put(sheet: Sheet, ...wanted: Wanted[]): Sheet {
  let count = sheet.layout.pieces.length;
  const newId = () => `p${++count}`;
  return wanted.reduce((now, piece) => applyEdit(now, bring(now, piece, { newId })), sheet);
}
const at = (kind: Kind, place: LonLat, members?: Wanted['members']): Wanted => ({
  kind,
  places: [place],
  ...(members && { members }),
});
const kinds = (pieces: readonly Piece[]): Kind[] => pieces.map((piece) => piece.kind);
const brought = (sheet: Sheet, wanted: Wanted): readonly Piece[] =>
  bring(sheet, wanted, { newId: () => crypto.randomUUID() }).pieces;

const casualty = at('casualty-vehicle', ft(0, 0), { heading_deg: 90 });
const receiver = at('receiving-vehicle', ft(0, 80), { heading_deg: 90 });
const pumpBetween = at('pump', ft(10, 40));

suite('units', () => {
  test('a casualty vehicle put down first brings nothing', () => {
    expect(kinds(brought(empty, casualty))).toEqual(['casualty-vehicle']);
  });

  test('a receiving vehicle brings its vent and the bond, no hose while the pump is to come', () => {
    const sheet = put(empty, casualty);
    const pieces = brought(sheet, receiver);
    expect(kinds(pieces)).toEqual(['receiving-vehicle', 'vent', 'bond-cable']);
    expect(pieces[1]).toMatchObject({ of: pieces[0]!.id });
  });

  test('a pump brings hoses casualty to pump to receiver, and its bond', () => {
    const pieces = brought(put(empty, casualty, receiver), pumpBetween);
    expect(kinds(pieces)).toEqual(['pump', 'hose', 'hose', 'bond-cable']);
    const [pump, into, out, bond] = pieces;
    expect(into).toMatchObject({ from: 'p1', to: pump!.id });
    expect(out).toMatchObject({ from: pump!.id, to: 'p2' });
    expect(bond).toMatchObject({ from: 'p1', to: pump!.id });
  });

  test('with the pump on the receiving vehicle the hose runs straight to it', () => {
    const sheet = applyEdit(put(empty, casualty), {
      type: 'set-layout',
      members: { pump: 'on-receiving-vehicle' },
    });
    const pieces = brought(sheet, receiver);
    expect(kinds(pieces)).toEqual(['receiving-vehicle', 'vent', 'hose', 'bond-cable']);
  });

  test('the order of placing does not matter', () => {
    const orders = [
      [casualty, receiver, pumpBetween],
      [pumpBetween, receiver, casualty],
      [receiver, pumpBetween, casualty],
    ];
    for (const order of orders) {
      const { pieces } = put(empty, ...order).layout;
      const runs = [piecesOf(pieces, 'hose').length, piecesOf(pieces, 'bond-cable').length];
      expect(runs).toEqual([2, 2]);
    }
  });
});

suite('rods', () => {
  const sheet = put(empty, casualty);

  test('the first of a system brings the ground cable, clamped where the unit is nearest', () => {
    const [rod, cable, ...rest] = brought(sheet, at('rod', ft(20, 40)));
    expect(rod).toMatchObject({ kind: 'rod', system: 'C', label: 'C1' });
    expect(cable).toMatchObject({ kind: 'ground-cable', from: 'p1', to: rod!.id });
    expect(rest).toEqual([]);
    // A 8.5 ft wide vehicle heading east: its edge is 4.25 ft north of its centre.
    const clamp = (cable as Extract<Piece, { kind: 'ground-cable' }>).path[0]!;
    expect(feetBetween(clamp, ft(20, 4.25))).toBeLessThan(0.02);
  });

  test('the next brings a jumper to the nearest joined rod and no second cable', () => {
    const pieces = brought(put(sheet, at('rod', ft(20, 40))), at('rod', ft(24, 43)));
    expect(kinds(pieces)).toEqual(['rod', 'jumper']);
    expect(pieces[0]).toMatchObject({ system: 'C', label: 'C2' });
    expect(pieces[1]).toMatchObject({ from: 'p2', to: pieces[0]!.id });
  });

  test('a rod away from the others goes to the system with the fewest', () => {
    const three = put(sheet, at('rod', ft(20, 40)), at('rod', ft(35, 40)), at('rod', ft(50, 40)));
    expect(piecesOf(three.layout.pieces, 'rod').map((rod) => rod.label)).toEqual([
      'C1',
      'R1',
      'P1',
    ]);
    expect(brought(three, at('rod', ft(80, 80)))[0]).toMatchObject({ system: 'C', label: 'C2' });
  });

  test('the system asked for wins over the nearest', () => {
    const one = put(sheet, at('rod', ft(20, 40)));
    expect(brought(one, at('rod', ft(21, 40), { system: 'R' }))[0]).toMatchObject({ label: 'R1' });
  });

  test('no jumper is longer than the kit has, slack included', () => {
    const kit: Kit = { items: [{ kind: 'jumper', length_ft: 10, count: 3 }] };
    const equipped = applyEdit(put(sheet, at('rod', ft(20, 40))), {
      type: 'set-layout',
      members: { kit },
    });
    const far = (feet: number) => at('rod', ft(20 + feet, 40), { system: 'C' });
    expect(kinds(brought(equipped, far(9)))).toEqual(['rod', 'jumper']);
    expect(kinds(brought(equipped, far(9.2)))).toEqual(['rod']);
  });

  test('rods come out of the case in the lengths it has left', () => {
    const kit: Kit = {
      items: [
        { kind: 'rod', length_ft: 6, diameter_in: 0.75, count: 1 },
        { kind: 'rod', length_ft: 4, diameter_in: 0.5, count: 1 },
      ],
    };
    const equipped = applyEdit(sheet, { type: 'set-layout', members: { kit } });
    const two = put(equipped, at('rod', ft(20, 40)), at('rod', ft(24, 40)));
    expect(
      piecesOf(two.layout.pieces, 'rod').map((rod) => [rod.length_ft, rod.diameter_in]),
    ).toEqual([
      [6, 0.75],
      [4, 0.5],
    ]);
  });
});

suite('the test line', () => {
  const systems = put(
    empty,
    casualty,
    at('rod', ft(0, 40)),
    at('rod', ft(20, 40)),
    at('rod', ft(40, 40)),
    { kind: 'hot-zone', places: [ft(0, 0)], radiusFt: 36 },
  );

  test('Z brings a Y for each system with rods, one tester and the leads of one system', () => {
    const [z, ...rest] = brought(systems, at('z-probe', ft(20, 100)));
    expect(kinds(rest)).toEqual([
      ...['y-probe', 'y-probe', 'y-probe', 'tester'],
      ...['test-lead', 'test-lead', 'test-lead'],
    ]);
    const ys = piecesOf(rest, 'y-probe');
    expect(ys.map((y) => y.serves)).toEqual([['C'], ['R'], ['P']]);
    // R's rod stands 60 ft straight below Z.
    expect(feetBetween(ys[1]!.at, ft(20, 40 + 0.618 * 60))).toBeLessThan(0.02);
    const tester = piecesOf(rest, 'tester')[0]!;
    expect(feetBetween(tester.at, ft(0, 40))).toBeCloseTo(5, 1);
    expect(feetBetween(tester.at, ft(0, 0))).toBeGreaterThan(36 + 5);
    expect(piecesOf(rest, 'test-lead').map((lead) => [lead.from, lead.to])).toEqual([
      [tester.id, systems.layout.pieces[1]!.id],
      [tester.id, ys[0]!.id],
      [tester.id, z!.id],
    ]);
  });

  test('Z before any rod brings nothing; the first rod of each system then brings its Y', () => {
    const z = at('z-probe', ft(20, 100));
    expect(kinds(brought(empty, z))).toEqual(['z-probe']);
    const later = put(empty, z, at('rod', ft(0, 40)), at('rod', ft(20, 40)));
    expect(piecesOf(later.layout.pieces, 'y-probe').map((y) => y.serves)).toEqual([['C'], ['R']]);
    expect(piecesOf(later.layout.pieces, 'tester')).toHaveLength(1);
  });

  test('a Y put down by hand serves the system that lacks one and whose line is nearest', () => {
    const z = put(systems, at('z-probe', ft(20, 100)));
    const y = piecesOf(z.layout.pieces, 'y-probe').filter((probe) => probe.serves?.[0] !== 'C');
    const without = applyEdit(z, { type: 'remove', ids: y.map((probe) => probe.id) });
    expect(brought(without, at('y-probe', ft(28, 77)))[0]).toMatchObject({ serves: ['P'] });
    expect(brought(without, at('y-probe', ft(18, 77)))[0]).toMatchObject({ serves: ['R'] });
  });
});

suite('runs, lines and areas', () => {
  const sheet = put(empty, casualty, receiver, at('rod', ft(20, 40)), at('rod', ft(24, 43)));
  const rod = piecesOf(sheet.layout.pieces, 'rod')[0]!;

  test('a ground cable may be drawn from either end', () => {
    const wanted: Wanted = {
      kind: 'ground-cable',
      places: [rod.at, ft(-10, 20), ft(-20, 0)],
      ends: [rod.id, 'p1'],
    };
    const [cable] = brought(sheet, wanted);
    expect(cable).toMatchObject({ from: 'p1', to: rod.id });
  });

  test('a run between pieces it can not join is refused in words', () => {
    const wanted: Wanted = { kind: 'jumper', places: [], ends: [rod.id, 'p1'] };
    expect(() => brought(sheet, wanted)).toThrow("A jumper can't join C1 to casualty vehicle.");
  });

  test('an area put down with one press is a circle; with corners it is closed', () => {
    const [round] = brought(empty, { kind: 'hot-zone', places: [ft(0, 0)], radiusFt: 45 });
    const ring = (round as Extract<Piece, { kind: 'hot-zone' }>).rings[0]!;
    expect(ring).toHaveLength(37);
    for (const corner of ring) expect(feetBetween(corner, ft(0, 0))).toBeCloseTo(45, 1);
    const [square] = brought(empty, {
      kind: 'no-drive',
      places: [ft(0, 0), ft(9, 0), ft(9, 9), ft(0, 9)],
    });
    const corners = (square as Extract<Piece, { kind: 'no-drive' }>).rings[0]!;
    expect(corners).toHaveLength(5);
    expect(corners[4]).toEqual(corners[0]);
  });

  test('the gesture is called after the piece, not after what it brought', () => {
    const edit = bring(sheet, at('rod', ft(60, 40), { system: 'R' }), { newId: () => 'x' });
    expect(describe(sheet, edit)).toBe('Place rod R1');
  });
});
