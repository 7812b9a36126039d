import { quantise, type LonLat } from '../../geo';
import { overridesOf, type Limits } from '../../limits';
import { pieceSchema, placeKey, type Piece } from '../pieces';
import type { Sheet } from '../schema';

type Plain = Record<string, unknown>;

export type ToWrite = {
  readonly sheet: Sheet;
  readonly limits: Limits;
  /** Ids in the order wanted; what it doesn't name follows, the layout's pieces first. */
  readonly order?: readonly string[];
};

/** The sheet as an exchange file: GeoJSON with the `stillground` member, members in fixed order. */
export function writeExchange({ sheet, limits, order = [] }: ToWrite): Plain {
  const { layout, site } = sheet;
  const more = (layout.more ?? {}) as Record<string, Plain | undefined>;
  const overrides = overridesOf(limits);
  return {
    type: 'FeatureCollection',
    stillground: {
      version: 1,
      name: layout.name,
      origin: quantise(layout.origin),
      planned_at: layout.planned_at,
      pump: layout.pump,
      conditions: layout.conditions,
      liquid: layout.liquid,
      acceptance: limits.acceptance ?? more.acceptance ?? null,
      buried_lines: { answers: site.answers, ...more.buried_lines },
      overhead_lines: { none_known_as_of: site.overhead_none_known_as_of, ...more.overhead_lines },
      locates: site.locates,
      limits: { name: limits.name, values: { ...overrides, ...more.limit_values }, ...more.limits },
      kit: layout.kit,
      ...more.header,
    },
    features: inOrder([...layout.pieces, ...site.features], order).map(writeFeature),
    ...more.collection,
  };
}

function inOrder(pieces: Piece[], order: readonly string[]): Piece[] {
  const rank = new Map(order.map((id, index) => [id, index]));
  return pieces.sort((a, b) => (rank.get(a.id) ?? Infinity) - (rank.get(b.id) ?? Infinity) || 0);
}

function writeFeature(piece: Piece): Plain {
  const key = placeKey(piece.kind);
  const { more } = piece;
  const properties: Plain = { kind: piece.kind };
  for (const name of Object.keys(pieceSchema(piece.kind).shape)) {
    if (name === 'id' || name === 'kind' || name === 'more' || name === key) continue;
    const value = (piece as Plain)[name];
    if (value !== undefined) properties[name] = value;
  }
  return {
    type: 'Feature',
    id: piece.id,
    properties: { ...properties, ...more?.properties },
    geometry: writeGeometry(piece),
    ...more?.feature,
  };
}

function writeGeometry(piece: Piece): Plain {
  if ('at' in piece) return { type: 'Point', coordinates: position(piece.at) };
  if ('path' in piece) return { type: 'LineString', coordinates: piece.path.map(position) };
  if ('rings' in piece) {
    return { type: 'Polygon', coordinates: piece.rings.map((ring) => ring.map(position)) };
  }
  const [first, ...others] = piece.paths.map((path) => path.map(position));
  return others.length === 0
    ? { type: 'LineString', coordinates: first }
    : { type: 'MultiLineString', coordinates: [first, ...others] };
}

/** Eight decimals; a height that came along goes along. */
const position = (place: LonLat): number[] => [
  ...quantise(place),
  ...(place as readonly number[]).slice(2),
];
