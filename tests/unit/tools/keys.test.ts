import { describe, expect, test } from 'vitest';
import { undo } from '@/lib/edits';
import { piecesOf } from '@/lib/layout';
import { feetBetween, ft, Hands, on } from './hands';

describe('what is selected', () => {
  test.each([
    ['ArrowUp', {}, ft(0, 41)],
    ['ArrowRight', {}, ft(1, 40)],
    ['ArrowDown', { fine: true }, ft(0, 39.9)],
    ['ArrowLeft', { fine: true }, ft(-0.1, 40)],
  ])('%s moves it (%o)', (key, more, to) => {
    const hands = new Hands().click(ft(0, 40), { on: on('c1') }).key(key, more);
    expect(feetBetween(hands.at('c1'), to)).toBeLessThan(0.01);
  });

  test('a key held down is one entry, each press its own', () => {
    const hands = new Hands().click(ft(0, 40), { on: on('c1') });
    const { present } = hands.history;
    hands.key('ArrowUp');
    for (let i = 0; i < 30; i++) hands.key('ArrowUp', { repeat: true });
    expect(hands.entries).toBe(1);
    expect(undo(hands.history).present).toBe(present);
    expect(hands.key('ArrowUp').entries).toBe(2);
  });

  test.each([
    [']', false, 95],
    ['[', false, 85],
    ['}', true, 91],
    ['{', true, 89],
  ])('%s turns a unit (finer: %s)', (key, fine, heading) => {
    const hands = new Hands().click(ft(0, 0), { on: on('cv') }).key(key, { fine });
    expect(hands.get('cv')).toMatchObject({ heading_deg: heading });
  });

  test('Delete takes it away with its runs and deselects', () => {
    const hands = new Hands().click(ft(0, 40), { on: on('c1') }).key('Delete');
    expect(hands.pieces.map((piece) => piece.id)).toEqual(['cv', 'c2', 'zone']);
    expect([hands.selection, hands.lastEntry]).toEqual([null, 'Remove C1']);
  });

  test('Escape deselects', () => {
    expect(new Hands().click(ft(0, 40), { on: on('c1') }).key('Escape').selection).toBeNull();
  });

  test('during a drag no key moves anything', () => {
    const hands = new Hands().down(ft(0, 40), { on: on('c1') }).move(ft(9, 40));
    hands.key('ArrowUp').key('Delete');
    expect(hands.entries).toBe(0);
  });
});

describe('handles with the focus', () => {
  const corner = { type: 'vertex', id: 'zone', part: 0, vertex: 1 } as const;

  test('arrows move a corner, Delete takes it out', () => {
    const hands = new Hands().key('ArrowRight', { on: corner });
    const zone = hands.get('zone');
    if (zone.kind !== 'hot-zone') throw new Error('not a zone');
    expect(feetBetween(zone.rings[0]![1]!, ft(31, -30))).toBeLessThan(0.01);
    hands.key('Delete', { on: corner });
    expect(hands.lastEntry).toBe('Take a corner out of hot zone');
  });

  test('Enter between two corners puts one there', () => {
    const hands = new Hands().key('Enter', { on: { ...corner, type: 'middle' } });
    const zone = hands.get('zone');
    if (zone.kind !== 'hot-zone') throw new Error('not a zone');
    expect(feetBetween(zone.rings[0]![1]!, ft(0, -30))).toBeLessThan(0.01);
  });

  test('arrows turn the turn handle and slide a clamp', () => {
    const hands = new Hands().key('ArrowLeft', { on: { type: 'turn', id: 'cv' }, fine: true });
    expect(hands.get('cv')).toMatchObject({ heading_deg: 89 });
    const other = new Hands().key('ArrowRight', { on: { type: 'end', id: 'g', end: 'from' } });
    const cable = other.get('g');
    if (cable.kind !== 'ground-cable') throw new Error('not a cable');
    expect(feetBetween(cable.path[0]!, ft(1, 4.25))).toBeLessThan(0.01);
  });
});

describe('the crosshair', () => {
  test('starts in the middle of the view, goes by arrows, and Enter puts down', () => {
    const hands = new Hands().take('tester').key('Enter');
    expect(hands.entries).toBe(0);
    hands.key('ArrowUp', { far: true }).key('ArrowRight').key('ArrowRight', { fine: true });
    hands.key('Enter');
    expect(feetBetween(piecesOf(hands.pieces, 'tester')[0]!.at, ft(1.1, 10))).toBeLessThan(0.01);
  });

  test('Enter again without moving puts down nothing twice', () => {
    const hands = new Hands()
      .take('tester')
      .key('ArrowUp', { far: true })
      .key('Enter')
      .key('Enter');
    expect(piecesOf(hands.pieces, 'tester')).toHaveLength(1);
    expect(hands.said.at(-1)).toBe('Move the crosshair first.');
  });

  test('Enter drops corners, and once more on the last one ends the area', () => {
    const hands = new Hands().take('pool').key('Enter').key('Enter');
    hands.key('ArrowUp', { far: true }).key('Enter').key('ArrowRight', { far: true }).key('Enter');
    hands.key('Enter');
    expect(piecesOf(hands.pieces, 'pool')[0]!.rings[0]).toHaveLength(4);
  });

  test('with a run in hand Enter on two pieces joins them', () => {
    const hands = new Hands().take('jumper').key('Enter', { on: on('c2') });
    hands.key('Enter', { on: on('c1') });
    expect(hands.pieces.at(-1)).toMatchObject({ kind: 'jumper', from: 'c2', to: 'c1' });
  });
});
