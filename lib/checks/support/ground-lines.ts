import {
  feetToMetres,
  inchesToMetres,
  metresToFeet,
  metresToSegment,
  segmentIndex,
  type LocalPlane,
  type SegmentIndex,
  type Vec,
} from '../../geo';
import { UNKNOWN_DIAMETER_IN, type LimitValues } from '../../limits';
import { piecesOf, placesOf, type BuriedLine, type PieceOf, type SiteGround } from '../../layout';

/** The site's buried lines, indexed by place; made once for a site and plane. */
export type BuriedLines = {
  readonly lines: readonly BuriedLine[];
  readonly index: SegmentIndex;
  /** Half of each line's diameter, metres. */
  readonly halves: Float64Array;
  readonly widestHalf: number;
};

const buried = new WeakMap<SiteGround['features'], WeakMap<LocalPlane, BuriedLines>>();

export function buriedLines(plane: LocalPlane, site: SiteGround): BuriedLines {
  return remembered(buried, site.features, plane, () => {
    const lines = piecesOf(site.features, 'buried-line');
    const halves = Float64Array.from(
      lines.map((line) => inchesToMetres(line.diameter_in ?? UNKNOWN_DIAMETER_IN.value) / 2),
    );
    return {
      lines,
      halves,
      index: segmentIndex(lines.map((line) => placesOf(plane, line))),
      widestHalf: halves.reduce((most, half) => Math.max(most, half), 0),
    };
  });
}

/** A line and how far its side is from a place: horizontal, less half its diameter; metres. */
export type NearLine = { readonly line: BuriedLine; readonly metres: number };

/** Every line nearer than `within` metres; if there is none, the nearest, however far. */
export function linesNear(ground: BuriedLines, at: Vec, within: number): NearLine[] {
  const { index, halves, widestHalf, lines } = ground;
  const best = new Map<number, number>();
  let least = Infinity;
  // Look as far as `within`, and while nothing is that near, as far as the nearest found yet.
  const reach = (): number => Math.max(within, least) + widestHalf;
  index.visitAround(at, reach, (segment) => {
    const line = index.lineOf[segment]!;
    const metres = metresToSegment(index, segment, at) - halves[line]!;
    if (metres < (best.get(line) ?? Infinity)) best.set(line, metres);
    if (metres < least) least = metres;
  });
  const found = [...best].map(([line, metres]) => ({ line: lines[line]!, metres }));
  const near = found.filter(({ metres }) => metres < within);
  if (near.length > 0) return near;
  const nearest = found.reduce<NearLine | null>(
    (one, other) => (one && one.metres <= other.metres ? one : other),
    null,
  );
  return nearest ? [nearest] : [];
}

/** A line nobody has vouched for is taken at the roughest level. */
export const qualityOf = (line: BuriedLine): 'A' | 'B' | 'C' | 'D' => line.quality ?? 'D';

/** How far the line may be from where it is drawn, by its quality level; feet. */
export function doubtFt(line: BuriedLine, limits: LimitValues): number {
  const byLevel = {
    A: limits.doubt_a_ft,
    B: limits.doubt_b_ft,
    C: limits.doubt_c_ft,
    D: limits.doubt_d_ft,
  };
  return byLevel[qualityOf(line)];
}

/** True where every line is farther than the tolerance and its own doubt. */
export function clearOfLines(
  plane: LocalPlane,
  site: SiteGround,
  limits: LimitValues,
  at: Vec,
): boolean {
  const widest = Math.max(
    limits.doubt_a_ft,
    limits.doubt_b_ft,
    limits.doubt_c_ft,
    limits.doubt_d_ft,
  );
  // As far as the widest doubt reaches, so that a farther but vaguer line is seen too.
  const reach = feetToMetres(limits.buried_tolerance_ft + widest);
  return linesNear(buriedLines(plane, site), at, reach).every(
    ({ line, metres }) =>
      metresToFeet(metres) >= limits.buried_tolerance_ft + doubtFt(line, limits),
  );
}

/** Everything long and metal along which a test current could run. */
export type MetalLines = {
  readonly lines: readonly PieceOf<'buried-line' | 'metal-line'>[];
  readonly index: SegmentIndex;
};

const metal = new WeakMap<SiteGround['features'], WeakMap<LocalPlane, MetalLines>>();

/** Buried lines of metal or of unknown material, rails, guardrails, fences and culverts. */
export function metalLines(plane: LocalPlane, site: SiteGround): MetalLines {
  return remembered(metal, site.features, plane, () => {
    const lines = piecesOf(site.features, 'buried-line', 'metal-line').filter(
      (line) => line.kind === 'metal-line' || line.material !== 'nonmetal',
    );
    return { lines, index: segmentIndex(lines.map((line) => placesOf(plane, line))) };
  });
}

function remembered<T>(
  store: WeakMap<SiteGround['features'], WeakMap<LocalPlane, T>>,
  features: SiteGround['features'],
  plane: LocalPlane,
  make: () => T,
): T {
  let byPlane = store.get(features);
  if (!byPlane) store.set(features, (byPlane = new WeakMap()));
  let known = byPlane.get(plane);
  if (!known) byPlane.set(plane, (known = make()));
  return known;
}
