import { describe, expect, it } from 'vitest';
import { groundItems } from '@/components/kit/ground-items';
import { alongItems, shelfItems } from '@/components/kit/shelf-items';
import { emptyLayout, type Kit, type Layout } from '@/lib/layout';
import { finding } from './finding';

const at = [-100, 40] as const;
const kit: Kit = {
  name: 'Truck 4',
  items: [
    { kind: 'rod', length_ft: 8, diameter_in: 0.625, count: 2 },
    { kind: 'ground-cable', length_ft: 50, count: 1 },
    { kind: 'ground-cable', length_ft: 75, count: 2 },
    { kind: 'probe', count: 2 },
    { kind: 'tester', count: 1 },
    { kind: 'clamp', count: 12 },
    { kind: 'driver', count: 1 },
  ],
};
const rod = (id: string, length_ft?: number) =>
  ({ id, kind: 'rod', system: 'C', at, ...(length_ft && { length_ft }) }) as const;
const layoutWith = (members: Partial<Layout>): Layout => ({ ...emptyLayout(at), ...members });
const leftOf = (layout: Layout, findings = [] as Parameters<typeof shelfItems>[1]) =>
  Object.fromEntries(shelfItems(layout, findings).map((item) => [item.words, item.left]));

describe('the kit shelf', () => {
  it('is without end while no kit is chosen', () => {
    const items = shelfItems(layoutWith({}), []);
    expect(items.length).toBeGreaterThan(5);
    expect(items.every((item) => item.left === null)).toBe(true);
  });

  it('takes from the item that the piece is', () => {
    expect(leftOf(layoutWith({ kit, pieces: [rod('a')] }))['Rod 8 ft']).toBe(1);
    expect(leftOf(layoutWith({ kit, pieces: [rod('a', 6)] }))['Rod 8 ft']).toBe(2);
  });

  it('says how many are short', () => {
    const pieces = [rod('a'), rod('b'), rod('c')];
    expect(leftOf(layoutWith({ kit, pieces }))['Rod 8 ft']).toBe(-1);
  });

  it('counts cables as the check handed them out', () => {
    const cable = { id: 'g', kind: 'ground-cable', from: 'x', to: 'a', path: [at, at] } as const;
    const reached = finding({
      rule: 'cables-reach',
      subjects: ['g'],
      measured: { value: 60, unit: 'ft' },
      allowed: { min: null, max: 75, unit: 'ft' },
    });
    const left = leftOf(layoutWith({ kit, pieces: [{ ...cable, path: [[...at], [...at]] }] }), [
      reached,
    ]);
    expect(left['Ground 50']).toBe(1);
    expect(left['Ground 75']).toBe(1);
  });

  it('counts probes by what one system needs', () => {
    const covers = finding({
      rule: 'kit-covers',
      subjects: ['probe'],
      measured: { value: 2, unit: 'count' },
    });
    const left = leftOf(layoutWith({ kit }), [covers]);
    expect([left['Z probe'], left['Y probe']]).toEqual([0, 0]);
    expect(left.Tester).toBe(1);
  });

  it('gives what it knows of the item into the hand', () => {
    const [first] = shelfItems(layoutWith({ kit }), []);
    expect(first!.inHand).toEqual({
      kind: 'rod',
      words: 'Rod 8 ft',
      members: { length_ft: 8, diameter_in: 0.625 },
    });
  });

  it('lists what is counted but never drawn', () => {
    expect(alongItems(layoutWith({ kit }))).toEqual([
      { words: 'clamps', count: 12 },
      { words: 'driver', count: 1 },
    ]);
  });
});

describe('what comes from no kit', () => {
  it('has one of each unit', () => {
    const items = groundItems(
      layoutWith({ pieces: [{ id: 'c', kind: 'casualty-vehicle', at }] }),
      true,
    );
    expect(items.filter((item) => item.drawn).map((item) => item.key)).toEqual([
      'casualty-vehicle',
    ]);
  });

  it('leaves the site out for who may not change it', () => {
    const kinds = groundItems(layoutWith({}), false).map((item) => item.key);
    expect(kinds).toContain('hot-zone');
    expect(kinds).not.toContain('buried-line');
  });
});
