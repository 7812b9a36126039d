import { isKind, pieceSchema, placeKey, type Kind, type Piece, type PlaceKey } from '../pieces';
import { faultsOf, type Fault } from './faults';

type Plain = Record<string, unknown>;

/** GeoJSON geometry that a kind may have, by the member that holds its place. */
export const GEOMETRIES: Record<PlaceKey, readonly string[]> = {
  at: ['Point'],
  path: ['LineString'],
  paths: ['LineString', 'MultiLineString'],
  rings: ['Polygon'],
};

const FEATURE_KEYS = ['type', 'id', 'properties', 'geometry'];

export const isPlain = (value: unknown): value is Plain =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** One feature as a piece, or every fault in it. */
export function parseFeature(value: unknown, index: number): Piece | Fault[] {
  const here = `features[${index}]`;
  if (!isPlain(value)) return [{ path: here, message: 'a feature must be an object' }];
  const faults: Fault[] = [];
  if (value.type !== 'Feature') {
    faults.push({ path: `${here}.type`, message: 'type must be "Feature"' });
  }
  const properties = value.properties;
  if (!isPlain(properties)) {
    return [
      ...faults,
      { path: `${here}.properties`, message: 'properties with a kind are missing' },
    ];
  }
  const kind = properties.kind;
  if (typeof kind !== 'string' || !isKind(kind)) {
    const message =
      kind === undefined ? 'kind is missing' : `unknown kind ${JSON.stringify(kind)?.slice(0, 80)}`;
    return [...faults, { path: `${here}.properties.kind`, message }];
  }
  const place = placeFrom(value.geometry, kind, here);
  if (Array.isArray(place)) faults.push(...place);
  const parsed = pieceSchema(kind).safeParse(candidate(value, properties, kind, place));
  if (!parsed.success)
    faults.push(...faultsOf(parsed.error, (steps) => inFile(index, kind, steps)));
  return faults.length > 0 || !parsed.success ? withoutEcho(faults, place) : parsed.data;
}

type Place = { readonly coordinates: unknown };

function placeFrom(geometry: unknown, kind: Kind, here: string): Place | Fault[] {
  const allowed = GEOMETRIES[placeKey(kind)];
  if (!isPlain(geometry)) {
    return [{ path: `${here}.geometry`, message: `a ${kind} needs a ${allowed.join(' or ')}` }];
  }
  if (!allowed.includes(String(geometry.type))) {
    return [
      {
        path: `${here}.geometry.type`,
        message: `a ${kind} is drawn as ${allowed.join(' or ')}, not ${JSON.stringify(geometry.type)?.slice(0, 80)}`,
      },
    ];
  }
  return {
    coordinates:
      geometry.type === 'LineString' && placeKey(kind) === 'paths'
        ? [geometry.coordinates]
        : geometry.coordinates,
  };
}

function candidate(feature: Plain, properties: Plain, kind: Kind, place: Place | Fault[]): Plain {
  const known = Object.keys(pieceSchema(kind).shape);
  const entered: Plain = {};
  const unknown: Plain = {};
  for (const [name, value] of Object.entries(properties)) {
    if (name === 'kind') continue;
    const own = known.includes(name) && !['id', 'more', placeKey(kind)].includes(name);
    if (!own) unknown[name] = value;
    else if (value !== null) entered[name] = value; // null says "not entered", as absence does
  }
  const foreign = Object.fromEntries(
    Object.entries(feature).filter(([name]) => !FEATURE_KEYS.includes(name)),
  );
  const more = {
    ...(Object.keys(unknown).length > 0 && { properties: unknown }),
    ...(Object.keys(foreign).length > 0 && { feature: foreign }),
  };
  return {
    id: feature.id,
    kind,
    ...entered,
    ...(!Array.isArray(place) && { [placeKey(kind)]: place.coordinates }),
    ...(Object.keys(more).length > 0 && { more }),
  };
}

function inFile(index: number, kind: Kind, steps: readonly PropertyKey[]): readonly PropertyKey[] {
  const [member, ...rest] = steps;
  if (member === undefined) return ['features', index];
  if (member === 'id') return ['features', index, 'id'];
  return member === placeKey(kind)
    ? ['features', index, 'geometry', 'coordinates', ...rest]
    : ['features', index, 'properties', ...steps];
}

/** A missing geometry was already told; the schema's complaint of the missing place repeats it. */
const withoutEcho = (faults: Fault[], place: Place | Fault[]): Fault[] =>
  Array.isArray(place)
    ? faults.filter((fault) => !fault.path.includes('.geometry.coordinates'))
    : faults;
