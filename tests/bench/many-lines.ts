import { readFileSync } from 'node:fs';
import {
  UTILITIES,
  type BuriedLine,
  type Layout,
  type Rod,
  type SiteGround,
} from '../../lib/layout';
import { parseExchange } from '../../lib/layout/exchange';
import { feetToMetres, localPlane, type LocalPlane, type Vec } from '../../lib/geo';
import type { Limits } from '../../lib/limits';
import { seededRandom } from '../seeded-random';

const SEGMENTS_A_LINE = 20;
const SEGMENT_METRES = 10;
/** A built-up street grid with six utilities a street: 200 km of lines on a square kilometre. */
const METRES_A_SQUARE_METRE = 0.2;
const PIECES = 60;
const SYSTEMS = ['C', 'R', 'P'] as const;
const ROD_STEP_FT = 4;

export type Scene = {
  readonly layout: Layout;
  readonly site: SiteGround;
  readonly limits: Limits;
  readonly plane: LocalPlane;
};

/**
 * The layout where everything is met, grown to sixty pieces, over many buried lines. More lines
 * cover more ground, as a larger site's file does; they do not crowd the same ground.
 */
export function manyLines(segments: number, seed: number): Scene {
  const file = new URL('../fixtures/exchange/everything-met.geojson', import.meta.url);
  const parsed = parseExchange(JSON.parse(readFileSync(file, 'utf8')));
  if (!parsed.ok) throw new Error('The fixture can’t be read.');
  const { sheet, limits } = parsed;
  const plane = localPlane(sheet.layout.origin);
  const layout = grown(sheet.layout, plane);
  const others = sheet.site.features.filter(({ kind }) => kind !== 'buried-line');
  const features = [...others, ...buriedLines(segments, seed, plane)];
  return { layout, limits, plane, site: { ...sheet.site, features } };
}

/** Each system grows in turn by a rod upwind of its last one, joined to it, until there are enough. */
function grown(layout: Layout, plane: LocalPlane): Layout {
  const pieces = [...layout.pieces];
  const upwind = layout.conditions.wind?.from_deg ?? 0;
  for (let i = 0; pieces.length < PIECES; i += 1) {
    const system = SYSTEMS[i % SYSTEMS.length];
    const last = pieces.findLast(
      (piece): piece is Rod => piece.kind === 'rod' && piece.system === system,
    );
    if (!last) throw new Error(`The fixture has no rod of system ${system}.`);
    const id = `more-${i}`;
    const at = plane.toLonLat(
      plane.offset(plane.toPlane(last.at), upwind, feetToMetres(ROD_STEP_FT)),
    );
    const ends = { path: [last.at, at], from: last.id, to: id };
    pieces.push({ ...last, id, at }, { id: `${id}-jumper`, kind: 'jumper', ...ends });
  }
  return { ...layout, pieces };
}

function buriedLines(segments: number, seed: number, plane: LocalPlane): BuriedLine[] {
  const random = seededRandom(seed);
  const side = Math.sqrt((segments * SEGMENT_METRES) / METRES_A_SQUARE_METRE);
  return Array.from({ length: Math.ceil(segments / SEGMENTS_A_LINE) }, (_, i) => {
    let at: Vec = { x: (random() - 0.5) * side, y: (random() - 0.5) * side };
    let heading = Math.floor(random() * 4) * (Math.PI / 2);
    const path = [plane.toLonLat(at)];
    for (let n = 0; n < SEGMENTS_A_LINE; n += 1) {
      heading += (random() - 0.5) * 0.2;
      at = {
        x: at.x + SEGMENT_METRES * Math.cos(heading),
        y: at.y + SEGMENT_METRES * Math.sin(heading),
      };
      path.push(plane.toLonLat(at));
    }
    return {
      id: `line-${i}`,
      kind: 'buried-line',
      paths: [path],
      utility: UTILITIES[i % UTILITIES.length]!,
      quality: (['A', 'B', 'C', 'D'] as const)[i % 4]!,
      material: i % 3 === 0 ? 'metal' : 'nonmetal',
      diameter_in: 6,
    };
  });
}

/** The same layout with its first rod moved a hair: nothing remembered of it helps. */
export function nudged({ layout, plane }: Scene, millimetres: number): Layout {
  const at = layout.pieces.findIndex(({ kind }) => kind === 'rod');
  const rod = layout.pieces[at] as Rod;
  const place = plane.toPlane(rod.at);
  const moved = { ...rod, at: plane.toLonLat({ x: place.x + millimetres / 1000, y: place.y }) };
  return { ...layout, pieces: layout.pieces.with(at, moved) };
}
