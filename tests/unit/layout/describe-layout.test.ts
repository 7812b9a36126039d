import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { EMPTY_GROUND, emptyLayout } from '@/lib/layout';
import { describeLayout } from '@/lib/layout/describe';
import { parseExchange } from '@/lib/layout/exchange';

const parsed = parseExchange(
  JSON.parse(readFileSync('tests/fixtures/exchange/everything-met.geojson', 'utf8')),
);

describe('the layout in sentences', () => {
  it('says of an empty sheet what is missing, not nothing', () => {
    const told = describeLayout({ layout: emptyLayout([-100, 40]), site: EMPTY_GROUND });
    expect(told).toEqual([
      'Distances and bearings are from the sheet’s origin.',
      'The casualty vehicle is not drawn.',
      'The receiving vehicle is not drawn.',
      'The pump is not drawn.',
      'Where vapour comes from is not drawn.',
      'No hot zone is drawn.',
      'System C has no rods.',
      'System R has no rods.',
      'System P has no rods.',
      'No probes are drawn.',
      'The wind is not known.',
      'The slope is not known.',
    ]);
  });

  it('goes from units over sources and systems to conditions, in whole sentences', () => {
    if (!parsed.ok) throw new Error('the fixture is at fault');
    const told = describeLayout(parsed.sheet);
    const place = (start: string) => told.findIndex((sentence) => sentence.startsWith(start));
    const order = [
      'The casualty vehicle',
      'The receiving vehicle',
      'The pump',
      'Vapour comes',
      'The edge of the hot zone',
      'System C:',
      'System R:',
      'System P:',
      'Z probe for',
      'Jumpers join',
      'Wind from',
      'Downhill',
    ].map(place);
    expect(order).not.toContain(-1);
    expect(order).toEqual([...order].sort((a, b) => a - b));
    expect(told.every((sentence) => sentence.endsWith('.'))).toBe(true);
  });

  it('places every rod by distance and bearing', () => {
    if (!parsed.ok) throw new Error('the fixture is at fault');
    const system = describeLayout(parsed.sheet).find((sentence) => sentence.startsWith('System C'));
    expect(system).toMatch(/^System C: \S+ \d+\.\d ft at \d{3}°/);
  });
});
