import { angleBetween, threeDigits } from '../geo';
import { standsFor, within } from './stands-for';
import type { CheckInput } from './types';

/** One thing that will stop meeting. `at` is an instant (ISO 8601) where time decides. */
export type ComingFailure = {
  readonly kind: 'wind-too-old' | 'wind-past' | 'ticket-ends' | 'does-not-stand';
  readonly words: string;
  readonly at: string | null;
};

/** What stops meeting first as time and wind go on: one line, and what it was made from. */
export type FirstToFail = {
  readonly words: string;
  readonly coming: readonly ComingFailure[];
};

export function firstToFail(input: CheckInput): FirstToFail {
  // What fails already comes before what will.
  const coming = [...windTooOld(input), ...windPast(input), ...ticketsEnd(input)].sort(
    (a, b) => Number(a.kind !== 'does-not-stand') - Number(b.kind !== 'does-not-stand'),
  );
  return {
    words: coming.length > 0 ? coming.map(({ words }) => words).join(', then ') : NOTHING_KNOWN,
    coming,
  };
}

const NOTHING_KNOWN = 'cannot be said before wind, sources and tickets are entered';
const MS_PER_MINUTE = 60_000;

/** "14:20 UTC on 4 May 2031": the reader's own zone is the screen's business. */
export const clockWords = (instant: string): string => {
  const [day, time] = new Date(instant).toISOString().split('T');
  return `${time!.slice(0, 5)} UTC on ${day}`;
};

function windTooOld({ layout, limits, asOf }: CheckInput): ComingFailure[] {
  const seen = layout.conditions.wind?.observed_at;
  if (!seen) return [];
  const at = new Date(
    Date.parse(seen) + limits.values.wind_fresh_min * MS_PER_MINUTE,
  ).toISOString();
  const past = asOf !== null && Date.parse(asOf) > Date.parse(at);
  return [
    { kind: 'wind-too-old', words: `wind ${past ? 'was ' : ''}too old at ${clockWords(at)}`, at },
  ];
}

function windPast(input: CheckInput): ComingFailure[] {
  const from = input.layout.conditions.wind?.from_deg;
  const arc = standsFor(input);
  if (from == null || !arc) return [];
  if (!within(arc, from)) {
    return [{ kind: 'does-not-stand', words: 'does not stand in this wind now', at: null }];
  }
  const nearer =
    angleBetween(from, arc.from_deg) < angleBetween(from, arc.to_deg) ? arc.from_deg : arc.to_deg;
  return [{ kind: 'wind-past', words: `wind past ${threeDigits(nearer)}°`, at: null }];
}

function ticketsEnd({ layout, site, asOf }: CheckInput): ComingFailure[] {
  const now = Date.parse(layout.planned_at ?? asOf ?? '');
  const ending = site.locates
    .flatMap(({ ticket, valid_until }) => (valid_until ? [{ ticket, at: valid_until }] : []))
    .filter(({ at }) => Number.isNaN(now) || Date.parse(at) >= now)
    .sort((a, b) => Date.parse(a.at) - Date.parse(b.at))[0];
  if (!ending) return [];
  return [
    {
      kind: 'ticket-ends',
      words: `ticket ${ending.ticket} at ${clockWords(ending.at)}`,
      at: ending.at,
    },
  ];
}
