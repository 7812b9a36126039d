import { sheetName, type LengthUnit } from '@/lib/draw';
import {
  distance,
  feetToMetres,
  metresToFeet,
  threeDigits,
  type LonLat,
  type Vec,
} from '@/lib/geo';
import {
  isUnit,
  piecesOf,
  placeOf,
  planeOf,
  rodDrivenFt,
  rodLengthFt,
  servedBy,
  unitSizeFt,
  type LayoutPiece,
  type Sheet,
} from '@/lib/layout';

/** One thing that a crew has to find on the ground. */
export type PositionRow = {
  readonly id: string;
  readonly name: string;
  readonly what: string;
  /** True bearing and distance from the casualty vehicle's centre; null for itself. */
  readonly bearing: string | null;
  readonly reach: string | null;
  readonly eastNorth: string;
  /** Distances by tape, one for each of `from`. */
  readonly taped: readonly string[];
};

export type Positions = {
  /** Names of the fixed points that tapes start from. */
  readonly from: readonly string[];
  /** What bearings and coordinates are counted from. */
  readonly zero: string;
  readonly rows: readonly PositionRow[];
};

const MOST_FIXED_POINTS = 3;

type Spot = Exclude<Extract<LayoutPiece, { at: LonLat }>, { kind: 'note' }>;
const isSpot = (piece: LayoutPiece): piece is Spot => 'at' in piece && piece.kind !== 'note';

export function positionsOf(sheet: Sheet, units: LengthUnit): Positions {
  const { layout, site } = sheet;
  const plane = planeOf(layout);
  const casualty = piecesOf(layout.pieces, 'casualty-vehicle')[0];
  const zero: Vec = casualty ? placeOf(plane, casualty) : { x: 0, y: 0 };
  const spots = layout.pieces.filter(isSpot);
  const fixed = nearestFixedPoints(sheet, spots);
  const length = (metres: number): string =>
    (units === 'ft' ? metresToFeet(metres) : metres).toFixed(1);
  const rowOf = (piece: Spot): PositionRow => {
    const at = placeOf(plane, piece);
    const self = piece.id === casualty?.id;
    return {
      id: piece.id,
      name: sheetName(piece, layout, site) ?? piece.id,
      what: whatWords(sheet, piece, units),
      bearing: self ? null : `${threeDigits(plane.bearing(zero, at))}°`,
      reach: self ? null : length(distance(zero, at)),
      eastNorth: self ? '0, 0' : sidesOf(at, zero, length),
      taped: fixed.map(({ at: from }) => length(distance(from, at))),
    };
  };
  return {
    from: fixed.map(({ name }) => name),
    zero: casualty ? 'casualty vehicle, centre' : 'origin of the sheet',
    rows: [...spots].sort((a, b) => orderOf(a) - orderOf(b)).map(rowOf),
  };
}

const ORDER: readonly Spot['kind'][] = [
  'rod',
  'z-probe',
  'y-probe',
  'tester',
  'casualty-vehicle',
  'receiving-vehicle',
  'pump',
  'release-point',
  'vent',
];
const SYSTEM_ORDER = 'CRP';

/** What has to be driven first, by system; then probes, units and sources. */
function orderOf(piece: Spot): number {
  const within = piece.kind === 'rod' ? SYSTEM_ORDER.indexOf(piece.system) : 0;
  return ORDER.indexOf(piece.kind) * 10 + within;
}

function sidesOf(at: Vec, zero: Vec, length: (metres: number) => string): string {
  const side = (metres: number, plus: string, minus: string): string => {
    const written = length(Math.abs(metres));
    return Number(written) === 0 ? '0' : `${written} ${metres > 0 ? plus : minus}`;
  };
  return `${side(at.x - zero.x, 'E', 'W')}, ${side(at.y - zero.y, 'N', 'S')}`;
}

function whatWords(sheet: Sheet, piece: Spot, units: LengthUnit): string {
  const size = (feet: number): string =>
    units === 'ft' ? `${trim(feet)} ft` : `${feetToMetres(feet).toFixed(1)} m`;
  if (piece.kind === 'rod') {
    return `rod ${size(rodLengthFt(piece))}, driven ${size(rodDrivenFt(piece))}`;
  }
  if (piece.kind === 'z-probe' || piece.kind === 'y-probe') {
    const which = piece.kind === 'z-probe' ? 'outer' : 'inner';
    return `${which} probe for ${servedBy(sheet.layout, piece).join(', ')}`;
  }
  if (isUnit(piece)) {
    const { length, width } = unitSizeFt(piece);
    return `${size(length)} × ${size(width)}, heading ${threeDigits(piece.heading_deg ?? 0)}°`;
  }
  return piece.kind === 'release-point' ? 'release point' : piece.kind;
}

const trim = (value: number): string => String(Number(value.toFixed(2)));

/** The fixed points that lie nearest to what has to be found, each with its name on the plan. */
function nearestFixedPoints({ layout, site }: Sheet, spots: readonly Spot[]) {
  const plane = planeOf(layout);
  const places = spots.map((spot) => placeOf(plane, spot));
  return piecesOf(site.features, 'fixed-point')
    .map((point) => {
      const at = placeOf(plane, point);
      const nearest = Math.min(...places.map((place) => distance(place, at)));
      return { at, nearest, name: sheetName(point, layout, site) ?? point.id };
    })
    .sort((a, b) => a.nearest - b.nearest)
    .slice(0, MOST_FIXED_POINTS);
}
