import { LIMIT_KEYS, limitsFrom, type LimitOverrides, type Limits } from '../../limits';
import { isSiteKind, type LayoutPiece, type SiteFeature } from '../pieces';
import type { Layout, Sheet, SiteGround } from '../schema';
import { faultsOf, type Fault } from './faults';
import { isPlain, parseFeature } from './feature';
import { header, HEADER_KEYS, type Header } from './header';
import { countFaults, idFaults, placeFaults, referenceFaults, type Placed } from './references';

export type Parsed =
  | {
      readonly ok: true;
      readonly sheet: Sheet;
      readonly limits: Limits;
      /** Ids in the order of the file, so that it can be written back as it came. */
      readonly order: readonly string[];
    }
  | { readonly ok: false; readonly faults: readonly Fault[] };

const COLLECTION_KEYS = ['type', 'stillground', 'features'];

/**
 * Reads an exchange file that JSON.parse has opened. Answers with the sheet and the limits in it,
 * or with every fault at once; it never guesses, and drops nothing that it doesn't know.
 */
export function parseExchange(value: unknown): Parsed {
  if (!isPlain(value)) return refuse([{ path: '', message: 'the file is not a GeoJSON object' }]);
  const faults: Fault[] = [];
  if (value.type !== 'FeatureCollection') {
    faults.push({ path: 'type', message: 'type must be "FeatureCollection"' });
  }
  const head = header.safeParse(value.stillground);
  if (!head.success) faults.push(...faultsOf(head.error, (steps) => ['stillground', ...steps]));
  if (!Array.isArray(value.features)) {
    faults.push({ path: 'features', message: 'features must be a list' });
    return refuse(faults);
  }
  const placed: Placed[] = [];
  value.features.forEach((feature: unknown, index) => {
    const piece = parseFeature(feature, index);
    if (Array.isArray(piece)) faults.push(...piece);
    else placed.push({ piece, index });
  });
  const ids = new Set(
    value.features.map((feature) => (isPlain(feature) ? String(feature.id) : '')),
  );
  faults.push(...idFaults(value.features), ...countFaults(placed), ...referenceFaults(placed, ids));

  const casualty = placed.find(({ piece }) => piece.kind === 'casualty-vehicle')?.piece;
  const origin =
    (head.success ? head.data.origin : null) ?? (casualty && 'at' in casualty ? casualty.at : null);
  if (origin) faults.push(...placeFaults(placed, origin));
  else if (head.success) {
    faults.push({
      path: 'stillground.origin',
      message: 'there is neither an origin nor a casualty vehicle to take for it',
    });
  }
  if (faults.length > 0 || !head.success || !origin) return refuse(faults);

  const pieces = placed.map(({ piece }) => piece);
  return {
    ok: true,
    sheet: {
      layout: layoutFrom(
        head.data,
        origin,
        value,
        pieces.filter((p) => !isSiteKind(p.kind)) as LayoutPiece[],
      ),
      site: groundFrom(head.data, pieces.filter((p) => isSiteKind(p.kind)) as SiteFeature[]),
    },
    limits: limitsOf(head.data),
    order: pieces.map((piece) => piece.id),
  };
}

const refuse = (faults: Fault[]): Parsed => ({ ok: false, faults });

function layoutFrom(
  head: Header,
  origin: Layout['origin'],
  collection: Record<string, unknown>,
  pieces: LayoutPiece[],
): Layout {
  const more = strip({
    collection: without(collection, COLLECTION_KEYS),
    header: without(head, HEADER_KEYS),
    buried_lines: without(head.buried_lines, ['answers']),
    overhead_lines: without(head.overhead_lines, ['none_known_as_of']),
    limits: without(head.limits, ['name', 'values']),
    limit_values: without(head.limits?.values, LIMIT_KEYS),
    acceptance: head.acceptance && !hasOhm(head.acceptance) ? head.acceptance : {},
  });
  return {
    version: 1,
    name: head.name ?? null,
    origin,
    planned_at: head.planned_at ?? null,
    pump: head.pump ?? null,
    conditions: head.conditions ?? {},
    liquid: head.liquid ?? null,
    kit: head.kit ?? null,
    pieces,
    ...(more && { more }),
  };
}

function groundFrom(head: Header, features: SiteFeature[]): SiteGround {
  return {
    features,
    answers: (head.buried_lines?.answers ?? {}) as SiteGround['answers'],
    overhead_none_known_as_of: head.overhead_lines?.none_known_as_of ?? null,
    locates: head.locates ?? [],
  };
}

function limitsOf(head: Header): Limits {
  const values = head.limits?.values ?? {};
  const entered = LIMIT_KEYS.filter((key) => typeof values[key] === 'number').map((key) => [
    key,
    values[key],
  ]);
  return limitsFrom(
    Object.fromEntries(entered) as LimitOverrides,
    head.acceptance && hasOhm(head.acceptance) ? head.acceptance : null,
    head.limits?.name ?? null,
  );
}

/** An acceptance with an authority but no figure is not set; what was entered is kept. */
const hasOhm = <A extends { max_ohm?: number | null }>(
  entry: A,
): entry is A & { max_ohm: number } => typeof entry.max_ohm === 'number';

function without(
  value: Record<string, unknown> | null | undefined,
  known: readonly string[],
): Record<string, unknown> {
  return Object.fromEntries(Object.entries(value ?? {}).filter(([name]) => !known.includes(name)));
}

/** The members that hold anything; undefined when none does. */
function strip(groups: Record<string, Record<string, unknown>>) {
  const kept = Object.entries(groups).filter(([, group]) => Object.keys(group).length > 0);
  return kept.length > 0 ? Object.fromEntries(kept) : undefined;
}
