import { insideArea, nearestOnPath, type Vec } from '../lib/geo';
import { contours, type Contour } from './contours';
import { band, bend, close, hollow, stations, type Station } from './curves';
import { boxOf } from './pen';
import type { Ft, Road, Scene } from './scene';
import { terrain } from './terrain';

/** A scene with everything that is worked out once, whatever the zoom. */
export type Prepared = {
  readonly scene: Scene;
  readonly roads: readonly (Road & { readonly line: readonly Ft[] })[];
  readonly rails: readonly { readonly line: readonly Ft[]; readonly ties: readonly Station[] }[];
  readonly ditches: readonly { readonly line: readonly Ft[]; readonly outline: readonly Ft[] }[];
  readonly contours: readonly Contour[];
  readonly rows: readonly (readonly [Ft, Ft])[];
  readonly stones: readonly Ft[];
  /** True where nothing is built or paved, so that a height may be lettered there. */
  isOpen(at: Ft): boolean;
};

const CONTOUR_CELL_FT = 4;
/** 19½ inches, the usual tie spacing of North American track. */
const TIE_SPACING_FT = 1.625;
const ROW_SPACING_FT = 7.5;

export const roadLine = (road: Road): Ft[] => bend(road.centre);
export const roadBand = (road: Road): Ft[] => band(roadLine(road), road.width_ft);

type Ditch = Scene['ditches'][number];
const ditchLine = (ditch: Ditch): Ft[] => stations(bend(ditch.centre), 3).map(({ at }) => at);
export const ditchOutline = (ditch: Ditch): Ft[] => hollow(ditchLine(ditch), ditch.width_ft);

export function prepare(scene: Scene): Prepared {
  const roads = scene.roads.map((road) => ({ ...road, line: roadLine(road) }));
  const rails = scene.rails.map(({ centre }) => {
    const line = bend(centre);
    return { line, ties: stations(line, TIE_SPACING_FT) };
  });
  return {
    scene,
    roads,
    rails,
    ditches: scene.ditches.map((ditch) => ({
      line: ditchLine(ditch),
      outline: ditchOutline(ditch),
    })),
    contours: contours(terrain(scene.ground), scene.extent, CONTOUR_CELL_FT),
    rows: scene.fields.flatMap((field) => rowsOf(close(field.outline), field.rows_toward_deg)),
    stones: gravelStones(scene, roads),
    isOpen: openGround(scene, roads, rails),
  };
}

const vec = ([x, y]: Ft): Vec => ({ x, y });

function openGround(
  scene: Scene,
  roads: Prepared['roads'],
  rails: Prepared['rails'],
): (at: Ft) => boolean {
  const clear = 7;
  const filled = [...scene.hardstands, ...scene.buildings].map((thing) => [
    close(thing.outline).map(vec),
  ]);
  const bands = [
    ...roads.map((road) => ({ path: road.line.map(vec), half: road.width_ft / 2 })),
    ...rails.map((rail) => ({ path: rail.line.map(vec), half: 7 })),
    ...scene.ditches.map((ditch) => ({ path: ditch.centre.map(vec), half: ditch.width_ft / 2 })),
    ...scene.fences.map((fence) => ({ path: fence.path.map(vec), half: 0 })),
  ];
  return (at) => {
    const p = vec(at);
    return (
      bands.every(({ path, half }) => nearestOnPath(p, path).metres > half + clear) &&
      filled.every((area) => !insideArea(p, area)) &&
      scene.tanks.every((t) => Math.hypot(t.at[0] - p.x, t.at[1] - p.y) > t.diameter_ft / 2 + 4) &&
      scene.fixed.every((f) => Math.hypot(f.at[0] - p.x, f.at[1] - p.y) > 12) &&
      scene.trees.every((t) => Math.hypot(t.at[0] - p.x, t.at[1] - p.y) > t.crown_ft / 2 + 3)
    );
  };
}

/** Plough rows across a field, each cut where it leaves the field. */
function rowsOf(outline: readonly Ft[], towardDeg: number): (readonly [Ft, Ft])[] {
  const turn = (towardDeg * Math.PI) / 180;
  const [ahead, right]: [Ft, Ft] = [
    [Math.sin(turn), Math.cos(turn)],
    [Math.cos(turn), -Math.sin(turn)],
  ];
  const turned = outline.map(([e, n]): Ft => [
    e * right[0] + n * right[1],
    e * ahead[0] + n * ahead[1],
  ]);
  const { west, east } = boxOf(turned);
  const back = (across: number, along: number): Ft => [
    across * right[0] + along * ahead[0],
    across * right[1] + along * ahead[1],
  ];
  const rows: (readonly [Ft, Ft])[] = [];
  for (let across = west + ROW_SPACING_FT / 2; across < east; across += ROW_SPACING_FT) {
    const cuts: number[] = [];
    for (let i = 1; i < turned.length; i++) {
      const [a, b] = [turned[i - 1]!, turned[i]!];
      if (a[0] <= across === b[0] <= across) continue;
      cuts.push(a[1] + ((across - a[0]) / (b[0] - a[0])) * (b[1] - a[1]));
    }
    cuts.sort((a, b) => a - b);
    for (let k = 0; k + 1 < cuts.length; k += 2) {
      rows.push([back(across, cuts[k]!), back(across, cuts[k + 1]!)]);
    }
  }
  return rows;
}

/** Stones scattered over gravel; the same every time, so that tiles keep their hashes. */
function gravelStones(scene: Scene, roads: Prepared['roads']): Ft[] {
  const outlines = [
    ...scene.hardstands.filter((h) => h.surface === 'gravel').map((h) => close(h.outline)),
    ...roads.filter((r) => r.surface === 'gravel').map((r) => band(r.line, r.width_ft)),
  ];
  const random = seeded(scene.pack);
  return outlines.flatMap((outline) => {
    const area = [outline.map(vec)];
    const { west, south, east, north } = boxOf(outline);
    const stones: Ft[] = [];
    const count = ((east - west) * (north - south)) / 9;
    for (let i = 0; i < count; i++) {
      const at: Ft = [west + random() * (east - west), south + random() * (north - south)];
      if (insideArea(vec(at), area)) stones.push(at);
    }
    return stones;
  });
}

/** Numbers 0 … 1 that follow from the words (FNV-1a, then mulberry32). */
function seeded(words: string): () => number {
  let state = 0x811c9dc5;
  for (const letter of words) state = Math.imul(state ^ letter.charCodeAt(0), 0x01000193);
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}
