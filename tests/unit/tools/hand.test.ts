import { describe, expect, test } from 'vitest';
import { guideOf } from '@/lib/client/tools';
import { piecesOf, type Kind } from '@/lib/layout';
import { feetBetween, ft, Hands, on } from './hands';

const kinds = (hands: Hands): Kind[] => hands.pieces.slice(6).map((piece) => piece.kind);
const areaOf = (hands: Hands, kind: 'pool' | 'warm-zone') =>
  piecesOf(hands.pieces, kind)[0]!.rings[0]!;

describe('points', () => {
  test('each click puts one down with what it brings, one entry each, and it stays in hand', () => {
    const hands = new Hands().take('rod', { system: 'C' });
    hands.click(ft(9, 41)).click(ft(13, 41));
    expect(kinds(hands)).toEqual(['rod', 'jumper', 'rod', 'jumper']);
    expect([hands.entries, hands.lastEntry]).toEqual([2, 'Place rod C4']);
    expect(hands.inHand?.kind).toBe('rod');
    expect(hands.said.at(-1)).toBe('Place rod C4, with 1 more that belong to it');
  });

  test('a drag pans the map and puts nothing down', () => {
    const hands = new Hands().take('tester').down(ft(50, 50));
    expect(hands.taken).toBe(false);
    hands.move(ft(60, 50)).up(ft(60, 50));
    expect(hands.entries).toBe(0);
  });

  test('a unit leaves the hand, since there is only one', () => {
    const hands = new Hands().take('pump').click(ft(50, 50));
    expect([hands.inHand, kinds(hands)[0]]).toEqual([null, 'pump']);
  });

  test('a second finger while pressing puts nothing down', () => {
    const hands = new Hands().take('tester');
    hands.down(ft(50, 50), { pointer: 'touch', id: 1 });
    hands.down(ft(60, 50), { pointer: 'touch', id: 2 });
    hands.up(ft(50, 50), { pointer: 'touch', id: 1 }).up(ft(60, 50), { pointer: 'touch', id: 2 });
    expect(hands.entries).toBe(0);
  });

  test('Escape puts down what is in hand', () => {
    expect(new Hands().take('tester').key('Escape').inHand).toBeNull();
  });

  test('who may not draw is told so', () => {
    const hands = new Hands().take('tester');
    hands.canDraw = false;
    hands.click(ft(50, 50));
    expect(hands.said).toEqual(['You may look at this drawing but not change it.']);
  });
});

describe('lines and areas', () => {
  test('a line: click its corners, Enter ends it', () => {
    const hands = new Hands().take('buried-line', { utility: 'sewer' });
    hands.click(ft(50, 0)).click(ft(60, 10)).click(ft(70, 0)).key('Enter');
    const lines = piecesOf(hands.history.present.site.features, 'buried-line');
    expect(lines[0]).toMatchObject({ utility: 'sewer' });
    expect(lines[0]!.paths[0]).toHaveLength(3);
    expect([hands.entries, hands.state.outline]).toEqual([1, null]);
  });

  test('a double click ends it without a corner of its own', () => {
    const hands = new Hands().take('metal-line', { what: 'rail' });
    hands.click(ft(50, 0)).click(ft(60, 10)).click(ft(60, 10), { clicks: 2 });
    expect(piecesOf(hands.history.present.site.features, 'metal-line')[1]!.path).toHaveLength(2);
  });

  test('an area: a press on its first corner closes it', () => {
    const hands = new Hands().take('pool');
    hands.click(ft(50, 0)).click(ft(60, 0)).click(ft(60, 10)).click(ft(50.3, 0.3));
    expect(areaOf(hands, 'pool')).toHaveLength(4);
  });

  test('an area dragged out is a circle as wide as the drag, held from the map', () => {
    const hands = new Hands().take('warm-zone').down(ft(0, 0));
    expect(hands.taken).toBe(true);
    hands.move(ft(60, 0));
    expect(guideOf(hands.state, hands.scene())?.radiusFt).toBe(60);
    hands.up(ft(60, 0));
    for (const corner of areaOf(hands, 'warm-zone')) {
      expect(feetBetween(corner, ft(0, 0))).toBeCloseTo(60, 1);
    }
  });

  test('two taps on one place are a circle of the size that the kind is drawn', () => {
    const hands = new Hands().take('pool').click(ft(50, 0)).click(ft(50, 0), { pointer: 'touch' });
    expect(feetBetween(areaOf(hands, 'pool')[0]!, ft(50, 0))).toBeCloseTo(8, 1);
  });

  test('Backspace takes corners back one by one; Escape begins again, then puts down', () => {
    const hands = new Hands().take('pool').click(ft(50, 0)).click(ft(60, 0)).key('Backspace');
    expect(hands.state.outline?.corners).toHaveLength(1);
    hands.key('Backspace');
    expect(hands.state.outline).toBeNull();
    hands.click(ft(50, 0)).key('Escape');
    expect([hands.state.outline, hands.inHand?.kind]).toEqual([null, 'pool']);
    expect(hands.key('Escape').inHand).toBeNull();
    expect(hands.entries).toBe(0);
  });

  test('too few corners are said and kept', () => {
    const hands = new Hands().take('pool').click(ft(50, 0)).click(ft(60, 0)).key('Enter');
    expect(hands.said.at(-1)).toBe('An area needs three corners.');
    expect(hands.state.outline?.corners).toHaveLength(2);
  });

  test('the line to the pointer is a guide, not a piece', () => {
    const hands = new Hands().take('pool').click(ft(50, 0)).click(ft(60, 0)).move(ft(60, 9));
    expect(guideOf(hands.state, hands.scene())).toMatchObject({
      line: [ft(50, 0), ft(60, 0), ft(60, 9)],
      closed: true,
    });
    expect(hands.pieces).toHaveLength(6);
  });
});

describe('runs', () => {
  test('press one piece, bends, then the other, in either order', () => {
    const hands = new Hands().take('ground-cable');
    hands
      .click(ft(5, 40), { on: on('c2') })
      .click(ft(20, 20))
      .click(ft(20, 3), { on: on('cv') });
    const cable = hands.pieces.at(-1)!;
    expect(cable).toMatchObject({ kind: 'ground-cable', from: 'cv', to: 'c2' });
    expect('path' in cable && cable.path).toHaveLength(3);
    expect(hands.lastEntry).toBe('Place ground cable');
  });

  test('or lead it from one to the other in one drag', () => {
    const hands = new Hands().take('jumper').drag(ft(0, 40), ft(5, 40), { on: on('c1') });
    expect(hands.pieces.at(-1)).toMatchObject({ kind: 'jumper', from: 'c1', to: 'c2' });
  });

  test('a start where nothing fits says where it may start', () => {
    const hands = new Hands().take('test-lead').click(ft(60, 60));
    expect(hands.said).toEqual(['A test lead starts on a tester, Z probe, Y probe or rod.']);
    expect(hands.state.outline).toBeNull();
  });

  test('a rod beside a vehicle wins over it', () => {
    const hands = new Hands();
    hands.take('rod', { system: 'C' }).click(ft(0, 5.5)).take('ground-cable');
    hands.click(ft(0, 5), {}).click(ft(-20, 0));
    expect(hands.pieces.at(-1)).toMatchObject({ from: 'cv', to: 'new-1' });
  });
});
