import { readFile } from 'node:fs/promises';
import { parseExchange } from '../../lib/layout/exchange';
import type { DemoPlace } from './places';

const FILE = 'tests/fixtures/exchange/everything-met.geojson';

export async function demoPlaces(): Promise<DemoPlace[]> {
  const parsed = parseExchange(JSON.parse(await readFile(FILE, 'utf8')));
  if (!parsed.ok) throw new Error(`${FILE}: ${JSON.stringify(parsed.faults)}`);
  const { layout, site } = parsed.sheet;
  return [
    {
      name: 'Dunmarrow siding',
      where: 'Team track east of the elevator road',
      notes: 'Invented place.',
      at: layout.origin,
      ground: site,
      layouts: [layout, { ...layout, name: 'Nearly empty', pieces: layout.pieces.slice(0, 2) }],
    },
  ];
}
