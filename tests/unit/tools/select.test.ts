import { describe, expect, test } from 'vitest';
import { feetBetween, ft, Hands, on } from './hands';

describe('a click', () => {
  test('selects what it is on and makes no entry', () => {
    const hands = new Hands().click(ft(0, 40), { on: on('c1') });
    expect([hands.selection, hands.entries]).toEqual(['c1', 0]);
  });

  test('that wanders less than the threshold is still a click', () => {
    const hands = new Hands().drag(ft(0, 40), ft(0.2, 40), { on: on('c1') });
    expect([hands.selection, hands.entries]).toEqual(['c1', 0]);
    // 5 px: too far for a mouse, nothing for a finger.
    hands.drag(ft(0, 40), ft(0.5, 40), { on: on('c1'), pointer: 'touch' });
    expect(hands.entries).toBe(0);
  });

  test('on empty ground deselects; a drag there pans the map and does not', () => {
    const hands = new Hands().click(ft(0, 40), { on: on('c1') });
    hands.down(ft(60, 60));
    expect(hands.taken).toBe(false);
    hands.move(ft(50, 60)).up(ft(50, 60));
    expect(hands.selection).toBe('c1');
    expect(hands.click(ft(60, 60)).selection).toBeNull();
  });
});

describe('a drag', () => {
  test('moves the piece, whole gesture one entry, shown live, with the runs joined to it', () => {
    const hands = new Hands().down(ft(0, 40), { on: on('c1') });
    expect(hands.taken).toBe(true);
    for (let feet = 1; feet <= 20; feet++) hands.move(ft(-feet, 40), { on: on('c1') });
    expect(hands.entries).toBe(0);
    expect(hands.previewed).not.toBeNull();
    hands.up(ft(-20, 40));
    expect([hands.entries, hands.lastEntry, hands.selection]).toEqual([1, 'Move C1', 'c1']);
    expect(feetBetween(hands.at('c1'), ft(-20, 40))).toBeLessThan(0.01);
    expect(hands.get('j')).toMatchObject({ path: [hands.at('c1'), hands.at('c2')] });
    expect(hands.said.at(-1)).toBe('C1 moved 20.0 ft west');
  });

  test('keeps the spot where the piece was taken under the pointer', () => {
    const hands = new Hands().drag(ft(20, 2), ft(30, 12), { on: on('cv') });
    expect(feetBetween(hands.at('cv'), ft(10, 10))).toBeLessThan(0.01);
  });

  test('Escape calls it off; what the pointer does until it is lifted counts for nothing', () => {
    const hands = new Hands();
    const before = hands.history.present;
    hands
      .down(ft(0, 40), { on: on('c1') })
      .move(ft(9, 50))
      .key('Escape');
    expect(hands.previewed).toBeNull();
    hands.move(ft(12, 50)).up(ft(12, 50));
    expect([hands.history.present, hands.entries]).toEqual([before, 0]);
    hands.drag(ft(0, 40), ft(9, 40), { on: on('c1') });
    expect(hands.entries).toBe(1);
  });

  test.each(['cancel', 'lost-capture'] as const)('%s calls it off', (type) => {
    const hands = new Hands()
      .down(ft(0, 40), { on: on('c1') })
      .move(ft(9, 50))
      .lose(type);
    expect([hands.previewed, hands.entries, hands.state.pointers]).toEqual([null, 0, []]);
    hands.up(ft(9, 50));
    expect(hands.entries).toBe(0);
  });

  test('the capture lost after every lift changes nothing', () => {
    const hands = new Hands().drag(ft(0, 40), ft(9, 40), { on: on('c1') });
    const { state } = hands;
    expect(hands.lose('lost-capture').state).toBe(state);
    expect(hands.entries).toBe(1);
  });

  test('a second finger calls it off and the map has both until the last is lifted', () => {
    const one = { on: on('c1'), pointer: 'touch', id: 1 } as const;
    const two = { pointer: 'touch', id: 2 } as const;
    const hands = new Hands().down(ft(0, 40), one).move(ft(9, 50), one).down(ft(30, 30), two);
    expect([hands.previewed, hands.taken]).toEqual([null, false]);
    hands.move(ft(5, 60), one).move(ft(40, 20), two).up(ft(40, 20), two).move(ft(5, 70), one);
    expect([hands.previewed, hands.taken]).toEqual([null, false]);
    hands.up(ft(5, 70), one);
    expect([hands.entries, hands.state.pinching]).toEqual([0, false]);
    expect(hands.drag(ft(0, 40), ft(9, 40), one).entries).toBe(1);
  });

  test('lines and areas move only when selected before; runs never do', () => {
    const hands = new Hands().drag(ft(30, 0), ft(40, 0), { on: on('zone') });
    expect([hands.entries, hands.selection]).toEqual([0, null]);
    hands.click(ft(30, 0), { on: on('zone') }).drag(ft(30, 0), ft(40, 0), { on: on('zone') });
    expect(hands.lastEntry).toBe('Move hot zone');
    hands.click(ft(2, 40), { on: on('j') }).drag(ft(2, 40), ft(9, 40), { on: on('j') });
    expect(hands.entries).toBe(1);
  });

  test('who may not draw may select but not move; the site has its own permission', () => {
    const reader = new Hands();
    reader.canDraw = false;
    reader.drag(ft(0, 40), ft(9, 40), { on: on('c1') });
    expect([reader.entries, reader.taken]).toEqual([0, false]);
    expect(reader.click(ft(0, 40), { on: on('c1') }).selection).toBe('c1');

    const drawer = new Hands();
    drawer.canChangeSite = false;
    drawer.click(ft(0, 90), { on: on('fence') }).drag(ft(0, 90), ft(9, 99), { on: on('fence') });
    expect(drawer.entries).toBe(0);
  });
});

describe('handles', () => {
  const corner = { type: 'vertex', id: 'zone', part: 0, vertex: 1 } as const;
  const middle = { type: 'middle', id: 'zone', part: 0, vertex: 1 } as const;
  const ring = (hands: Hands) => {
    const zone = hands.get('zone');
    if (zone.kind !== 'hot-zone') throw new Error('not a zone');
    return zone.rings[0]!;
  };

  test('the turn handle turns the front to the pointer, to whole degrees, or tenths with Shift', () => {
    const turn = { type: 'turn', id: 'cv' } as const;
    const hands = new Hands().drag(ft(40, 0), ft(30, 30.3), { on: turn });
    expect(hands.get('cv')).toMatchObject({ heading_deg: 45 });
    expect(hands.lastEntry).toBe('Turn casualty vehicle');
    hands.drag(ft(30, 20), ft(30, 30.3), { on: turn, fine: true });
    expect(hands.get('cv')).toMatchObject({ heading_deg: 44.7 });
  });

  test('a corner is dragged, and the ring stays closed', () => {
    const hands = new Hands().drag(ft(30, -30), ft(50, -30), { on: corner });
    expect(feetBetween(ring(hands)[1]!, ft(50, -30))).toBeLessThan(0.01);
    const first = { ...corner, vertex: 0 };
    hands.drag(ft(-30, -30), ft(-50, -30), { on: first });
    expect(ring(hands)[4]).toEqual(ring(hands)[0]);
    expect(hands.entries).toBe(2);
  });

  test('a click or drag between corners puts one there', () => {
    const hands = new Hands().click(ft(0, -30), { on: middle });
    expect(ring(hands)).toHaveLength(6);
    hands.drag(ft(15, -30), ft(15, -50), { on: { ...middle, vertex: 2 } });
    expect(feetBetween(ring(hands)[2]!, ft(15, -50))).toBeLessThan(0.01);
    expect(hands.lastEntry).toBe('Add a corner to hot zone');
  });

  test('a double click on one corner takes it out, one that begins between corners does not', () => {
    const hands = new Hands()
      .click(ft(30, -30), { on: corner })
      .click(ft(30, -30), { on: corner, clicks: 2 });
    expect(ring(hands)).toHaveLength(4);
    const other = new Hands()
      .click(ft(0, -30), { on: middle })
      .click(ft(0, -30), { on: corner, clicks: 2 });
    expect(ring(other)).toHaveLength(6);
  });

  test('the end of a run is led to another piece', () => {
    const hands = new Hands().drag(ft(0, 40), ft(5.5, 41), {
      on: { type: 'end', id: 'g', end: 'to' },
    });
    expect(hands.get('g')).toMatchObject({ from: 'cv', to: 'c2' });
    expect(hands.lastEntry).toBe('Join ground cable to C2');
  });

  test('dropped where nothing fits it stays, and says so', () => {
    const hands = new Hands().drag(ft(0, 40), ft(60, 60), {
      on: { type: 'end', id: 'g', end: 'to' },
    });
    expect([hands.entries, hands.previewed]).toEqual([0, null]);
    expect(hands.said.at(-1)).toBe(
      'Nothing there that a ground cable can be led to. It stays where it was.',
    );
  });

  test('a clamp slides along its unit and never leaves it', () => {
    const hands = new Hands().drag(ft(0, 4.25), ft(20, 5), {
      on: { type: 'end', id: 'g', end: 'from' },
    });
    const cable = hands.get('g');
    if (cable.kind !== 'ground-cable') throw new Error('not a cable');
    expect(feetBetween(cable.path[0]!, ft(20, 4.25))).toBeLessThan(0.01);
  });
});
