import {
  booleanPointInPolygon,
  distance,
  lineString,
  point,
  pointToLineDistance,
  polygon,
} from '@turf/turf';
import { inchesToMetres } from '../../lib/geo';
import { BURIED_REPORT_WITHIN_FT, UNKNOWN_DIAMETER_IN } from '../../lib/limits';
import type { BuriedLine, Layout, Probe, Rod, SiteGround } from '../../lib/layout';

const FEET = { units: 'feet' } as const;

export type Clearance = { readonly piece: string; readonly line: string; readonly ft: number };

/**
 * The rules that have to look at every buried line, and the distances between pieces, written as
 * anybody would write them with Turf. It does less than the checks do (no remedies, no words, no
 * directions), so the comparison is kind to it. `only` keeps to some of the rods and probes.
 */
export function plainTurf(
  layout: Layout,
  site: SiteGround,
  only: (place: number) => boolean = () => true,
): Clearance[] {
  const placed = rodsAndProbes(layout).filter((_, place) => only(place));
  const lines = site.features.filter((piece): piece is BuriedLine => piece.kind === 'buried-line');
  const zones = layout.pieces.flatMap((piece) => (piece.kind === 'hot-zone' ? [piece.rings] : []));
  for (const piece of placed) {
    const at = point([...piece.at]);
    for (const other of placed) distance(at, point([...other.at]), FEET);
    for (const rings of zones) booleanPointInPolygon(at, polygon(rings.map(mutable)));
  }
  return placed.flatMap((piece) => clearances(piece, lines));
}

export const rodsAndProbes = (layout: Layout): (Rod | Probe)[] =>
  layout.pieces.filter((piece): piece is Rod | Probe =>
    ['rod', 'z-probe', 'y-probe'].includes(piece.kind),
  );

function clearances(piece: Rod | Probe, lines: readonly BuriedLine[]): Clearance[] {
  const at = point([...piece.at]);
  const all = lines.map((line) => ({
    piece: piece.id,
    line: line.id,
    ft:
      Math.min(
        ...line.paths.map((path) => pointToLineDistance(at, lineString(mutable(path)), FEET)),
      ) -
      inchesToMetres(line.diameter_in ?? UNKNOWN_DIAMETER_IN.value) / 2 / 0.3048,
  }));
  const near = all.filter(({ ft }) => ft < BURIED_REPORT_WITHIN_FT.value);
  if (near.length > 0) return near;
  return all.reduce<Clearance[]>(
    (least, one) => (least[0] && least[0].ft <= one.ft ? least : [one]),
    [],
  );
}

const mutable = (path: readonly (readonly number[])[]): number[][] => path.map((at) => [...at]);
