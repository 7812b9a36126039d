import {
  boundsOf,
  CLOSEST_ZOOM,
  drawBaseMap,
  LEAST_ZOOM,
  TILE_TYPE,
  versionOf,
} from './draw-base-map';
import { readyMapFont } from './map-font';
import type { Scene } from './scene';
import { importPack } from '../lib/server/tiles/import-pack';

/**
 * Draws the scene's base map into the agency's database unless this very drawing is there, and
 * answers with the base map's id. `onProgress` is told the part done, 0 … 1.
 */
export async function importScene(
  agencyId: string,
  scene: Scene,
  onProgress: (part: number) => void = () => {},
): Promise<string> {
  await readyMapFont();
  const pack = {
    pack: scene.pack,
    version: versionOf(scene),
    min_zoom: LEAST_ZOOM,
    max_zoom: CLOSEST_ZOOM,
    bounds: boundsOf(scene),
    attribution: scene.attribution,
    type: TILE_TYPE,
  };
  return importPack(agencyId, pack, () => drawBaseMap(scene, onProgress));
}
