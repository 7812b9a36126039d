import { createHash } from 'node:crypto';
import sharp from 'sharp';
import { fromSquare, TILE_PX, type Square, type TileNumber } from './mercator';
import { projection, type Projection } from './pen';
import { prepare } from './prepare';
import type { Extent, Ft, Scene } from './scene';
import { drawSheet, edgeOf } from './sheet';

export const TILE_TYPE = 'image/webp';
export const LEAST_ZOOM = 14;
/** The whole map is drawn down to here, only its close-up one step further. */
export const WHOLE_MAP_ZOOM = 21;
export const CLOSEST_ZOOM = 22;

/** Raised whenever the drawing itself changes, so that browsers fetch the new tiles. */
const DRAWING_EDITION = 2;

/** Tiles a side of one sheet: large enough to be worth a rasteriser's start, small in memory. */
const SHEET_TILES = 8;

export type DrawnTile = TileNumber & { readonly hash: string; readonly bytes: Buffer };

/** The address of everything drawn from this scene: a changed scene is another version. */
export const versionOf = (scene: Scene): string =>
  createHash('sha256')
    .update(JSON.stringify([DRAWING_EDITION, scene]))
    .digest('hex')
    .slice(0, 12);

/** West, south, east, north in degrees, as map clients ask for it. */
export function boundsOf(scene: Scene): [number, number, number, number] {
  const project = projection(scene.origin);
  const places = edgeOf(scene).map((at) => fromSquare(project.square(at)));
  const lons = places.map(([lon]) => lon);
  const lats = places.map(([, lat]) => lat);
  return [Math.min(...lons), Math.min(...lats), Math.max(...lons), Math.max(...lats)];
}

type Block = { readonly zoom: number; readonly left: number; readonly top: number } & {
  readonly across: number;
  readonly down: number;
};

/**
 * Draws every tile of the scene, a sheet of tiles at a time. Needs the shipped font to be in use
 * (map-font.ts). `onProgress` is told the part done, 0 … 1.
 */
export async function* drawBaseMap(
  scene: Scene,
  onProgress: (part: number) => void = () => {},
): AsyncGenerator<DrawnTile[]> {
  const prepared = prepare(scene);
  const project = projection(scene.origin);
  const blocks = blocksOf(scene, project);
  const all = blocks.reduce((sum, block) => sum + block.across * block.down, 0);
  let done = 0;
  const raster = (block: Block): Promise<Buffer> =>
    sharp(Buffer.from(drawSheet(prepared, project, block, [block.across, block.down])))
      .ensureAlpha()
      .raw()
      .toBuffer();
  // The next sheet is rasterised while this one is cut: the two use different cores.
  let next = blocks[0] ? raster(blocks[0]) : null;
  for (const [i, block] of blocks.entries()) {
    const pixels = await next!;
    const following = blocks[i + 1];
    next = following ? raster(following) : null;
    yield await cut(pixels, block);
    done += block.across * block.down;
    onProgress(done / all);
  }
}

function blocksOf(scene: Scene, project: Projection): Block[] {
  const blocks: Block[] = [];
  for (let zoom = LEAST_ZOOM; zoom <= CLOSEST_ZOOM; zoom++) {
    const extent = zoom > WHOLE_MAP_ZOOM ? scene.close_up : scene.extent;
    const range = tileRange(extent, project, zoom);
    for (let top = range.top; top <= range.bottom; top += SHEET_TILES) {
      for (let left = range.left; left <= range.right; left += SHEET_TILES) {
        const across = Math.min(SHEET_TILES, range.right - left + 1);
        const down = Math.min(SHEET_TILES, range.bottom - top + 1);
        blocks.push({ zoom, left, top, across, down });
      }
    }
  }
  return blocks;
}

function tileRange({ west, south, east, north }: Extent, project: Projection, zoom: number) {
  const tiles = 2 ** zoom;
  const corners: Ft[] = [
    [west, south],
    [west, north],
    [east, north],
    [east, south],
  ];
  const squares: Square[] = corners.map((at) => project.square(at));
  const [xs, ys] = [squares.map(([x]) => x * tiles), squares.map(([, y]) => y * tiles)];
  return {
    left: Math.floor(Math.min(...xs)),
    right: Math.floor(Math.max(...xs)),
    top: Math.floor(Math.min(...ys)),
    bottom: Math.floor(Math.max(...ys)),
  };
}

async function cut(pixels: Buffer, block: Block): Promise<DrawnTile[]> {
  const places = Array.from({ length: block.across * block.down }, (_, i) => ({
    column: i % block.across,
    row: Math.floor(i / block.across),
  }));
  const drawn = await Promise.all(
    places.map(async ({ column, row }) => {
      const one = pixelsOf(pixels, block, column, row);
      if (isClear(one)) return [];
      const bytes = await sharp(one, { raw: { width: TILE_PX, height: TILE_PX, channels: 4 } })
        .webp({ lossless: true, effort: 0 })
        .toBuffer();
      const hash = createHash('sha256').update(bytes).digest('hex');
      return [{ z: block.zoom, x: block.left + column, y: block.top + row, hash, bytes }];
    }),
  );
  return drawn.flat();
}

const BYTES_A_PIXEL = 4;

function pixelsOf(pixels: Buffer, block: Block, column: number, row: number): Buffer {
  const line = block.across * TILE_PX * BYTES_A_PIXEL;
  const width = TILE_PX * BYTES_A_PIXEL;
  const one = Buffer.alloc(TILE_PX * width);
  for (let y = 0; y < TILE_PX; y++) {
    const start = (row * TILE_PX + y) * line + column * width;
    pixels.copy(one, y * width, start, start + width);
  }
  return one;
}

/** Nothing drawn: wholly outside the map. */
function isClear(pixels: Buffer): boolean {
  const words = new Uint32Array(pixels.buffer, pixels.byteOffset, pixels.length / BYTES_A_PIXEL);
  return words.every((word) => word === 0);
}
