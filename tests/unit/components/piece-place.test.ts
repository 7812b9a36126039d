import { describe, expect, it } from 'vitest';
import { applyEdit } from '@/lib/edits';
import { EMPTY_GROUND, emptyLayout, findPiece, type Sheet } from '@/lib/layout';
import {
  anchorFor,
  middleOf,
  placeByPolar,
  polarFrom,
  referenceOf,
} from '@/components/pieces/piece-place';
import { placingOf, wantedFrom, type NewPiece } from '@/components/pieces/wanted-from-form';

const origin = [-100, 40] as const;
const layout = emptyLayout(origin);
const sheet: Sheet = {
  layout: {
    ...layout,
    pieces: [
      { id: 'c', kind: 'casualty-vehicle', at: origin },
      {
        id: 'z',
        kind: 'hot-zone',
        rings: [
          [
            [-100.0001, 39.9999],
            [-99.9999, 39.9999],
            [-99.9999, 40.0001],
            [-100.0001, 40.0001],
            [-100.0001, 39.9999],
          ],
        ],
      },
    ],
  },
  site: EMPTY_GROUND,
};

describe('places by bearing and distance', () => {
  it('reads back what was put', () => {
    const from = referenceOf(sheet.layout).at;
    const place = placeByPolar(sheet.layout, from, { bearingDeg: 137, feet: 62.1 });
    const rod = { id: 'r', kind: 'rod', system: 'C', at: place } as const;
    const polar = polarFrom(sheet.layout, from, middleOf(sheet.layout, rod));
    expect(polar.bearingDeg).toBeCloseTo(137, 2);
    expect(polar.feet).toBeCloseTo(62.1, 2);
  });

  it('moves an area by its middle', () => {
    const zone = findPiece(sheet, 'z')!;
    const to = placeByPolar(sheet.layout, referenceOf(sheet.layout).at, {
      bearingDeg: 90,
      feet: 30,
    });
    const moved = applyEdit(sheet, {
      type: 'move',
      moves: [{ id: 'z', to: anchorFor(sheet.layout, zone, to) }],
    });
    const polar = polarFrom(
      moved.layout,
      referenceOf(moved.layout).at,
      middleOf(moved.layout, findPiece(moved, 'z')!),
    );
    expect(polar.feet).toBeCloseTo(30, 1);
    expect(polar.bearingDeg).toBeCloseTo(90, 1);
  });
});

describe('a new piece from the form', () => {
  const form: NewPiece = {
    kind: 'rod',
    system: 'R',
    utility: 'gas-oil-steam',
    place: { from: '', bearing: '90', feet: '10' },
    end: { from: '', bearing: '180', feet: '20' },
    from: '',
    to: '',
    radiusFt: '',
  };

  it('knows how each kind is placed', () => {
    expect(
      (['rod', 'jumper', 'hot-zone', 'buried-line', 'test-lead', 'overhead-line'] as const).map(
        placingOf,
      ),
    ).toEqual(['spot', 'between', 'round', 'line', 'between', 'line']);
  });

  it('gives a rod its system and a line its class and both ends', () => {
    expect(wantedFrom(sheet, form, null)).toMatchObject({
      ok: true,
      wanted: { kind: 'rod', members: { system: 'R' } },
    });
    const line = wantedFrom(sheet, { ...form, kind: 'buried-line' }, null);
    expect(line.ok && line.wanted.places).toHaveLength(2);
    expect(line.ok && line.wanted.members).toEqual({ utility: 'gas-oil-steam' });
  });

  it('asks for the pieces that a cable joins', () => {
    expect(wantedFrom(sheet, { ...form, kind: 'jumper' }, null)).toMatchObject({ ok: false });
    expect(wantedFrom(sheet, { ...form, kind: 'bond-cable', from: 'c', to: 'd' }, null)).toEqual({
      ok: true,
      wanted: expect.objectContaining({ ends: ['c', 'd'] }),
    });
  });
});
