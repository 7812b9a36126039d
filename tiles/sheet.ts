import { stretch } from './curves';
import { INKS } from './inks';
import { penFor, type Projection, type Sheet } from './pen';
import type { Prepared } from './prepare';
import type { Ft, Scene } from './scene';
import { TILE_PX } from './mercator';
import { buildings, culverts, fences, overhead, tanks, walls } from './symbols/built';
import { contourHeights, contourLines } from './symbols/heights';
import { ditches, fields, trees } from './symbols/land';
import { fixedThings, names } from './symbols/names';
import { tracks } from './symbols/tracks';
import { ways } from './symbols/ways';

/** Ground first, then what is built on it, words last. */
const LAYERS = [
  fields,
  contourLines,
  ditches,
  culverts,
  ways,
  tracks,
  walls,
  tanks,
  buildings,
  fences,
  overhead,
  trees,
  contourHeights,
  fixedThings,
  names,
] as const;

const EDGE_STEP_FT = 100;

/** The map's edge on the ground. Its long sides are cut up, for a straight one bends a little. */
export function edgeOf({ extent }: Scene): Ft[] {
  const { west, south, east, north } = extent;
  const corners: Ft[] = [
    [west, south],
    [west, north],
    [east, north],
    [east, south],
    [west, south],
  ];
  return corners.slice(1).flatMap((to, i) => {
    const side = [corners[i]!, to];
    const length = Math.hypot(to[0] - side[0]![0], to[1] - side[0]![1]);
    const steps = Math.ceil(length / EDGE_STEP_FT);
    return Array.from({ length: steps }, (_, k) => stretch(side, 0, (length * k) / steps).at(-1)!);
  });
}

/** A sheet of tiles as one SVG; beyond the map's edge it is left clear. */
export function drawSheet(
  prepared: Prepared,
  project: Projection,
  sheet: Sheet,
  tiles: [number, number],
): string {
  const pen = penFor(project, sheet, tiles);
  const [width, height] = [tiles[0] * TILE_PX, tiles[1] * TILE_PX];
  const edge = edgeOf(prepared.scene);
  const marks = LAYERS.flatMap((layer) => layer(prepared, pen));
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}">`,
    `<defs><clipPath id="map">${pen.area(edge, '#000')}</clipPath></defs>`,
    '<g clip-path="url(#map)">',
    pen.area(edge, INKS.paper),
    ...marks,
    '</g>',
    pen.area(edge, 'none', { stroke: INKS.neatline, width: 1.4 }),
    '</svg>',
  ].join('');
}
