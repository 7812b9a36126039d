import { distance, feetToMetres, metresToFeet, type Vec } from '../geo';
import { DRAWN_WITHIN_FT, LIMIT_TABLE, type Limits } from '../limits';
import { nameOf, piecesOf, placeOf, planeOf, type Layout, type Rod } from '../layout';
import { answer, atLeast, between, measured } from './support/answer';
import { moveRemedy, nearestPlace } from './support/move';
import { feet, feetBeside } from './support/words';
import type { Check, Finding } from './types';

const rule = {
  id: 'rods-apart',
  gate: 'deviation',
  backing: LIMIT_TABLE.rods_apart_max_ft,
} as const;

type Pair = { readonly a: Rod; readonly b: Rod; readonly joined: boolean };

export const rodsApart: Check = {
  ...rule,
  question: 'Are they apart?',
  title: 'Joined rods apart',
  check({ layout, limits }) {
    const findings = pairsOf(layout).flatMap((pair) => judge(layout, limits, pair) ?? []);
    return findings.length > 0 ? findings : [answer(rule, [], 'n/a', 'No two rods are joined')];
  },
};

/** Pairs in the order of the rods; joined by a jumper, or of one system. */
function pairsOf(layout: Layout): Pair[] {
  const rods = piecesOf(layout.pieces, 'rod');
  const joined = new Set(
    piecesOf(layout.pieces, 'jumper').flatMap(({ from, to }) => [`${from} ${to}`, `${to} ${from}`]),
  );
  return rods.flatMap((a, i) =>
    rods.slice(i + 1).flatMap((b) => {
      const tied = joined.has(`${a.id} ${b.id}`);
      return tied || a.system === b.system ? [{ a, b, joined: tied }] : [];
    }),
  );
}

function judge(layout: Layout, limits: Limits, { a, b, joined }: Pair): Finding | null {
  const plane = planeOf(layout);
  const { rods_apart_min_ft: least, rods_apart_max_ft: most } = limits.values;
  const [at, other] = [placeOf(plane, a), placeOf(plane, b)];
  const apart = metresToFeet(distance(at, other));
  const near = apart < least - DRAWN_WITHIN_FT.value;
  const far = joined && apart > most + DRAWN_WITHIN_FT.value;
  // Rods of one system that no jumper joins are told only when they crowd each other.
  if (!joined && !near) return null;
  const names = `${nameOf(a)} to ${nameOf(b)}`;
  return answer(
    rule,
    [a.id, b.id],
    near || far ? 'not-met' : 'meets',
    near
      ? `${names} ${feetBeside(least, apart)}, under the ${feet(least)} limit`
      : far
        ? `${names} ${feetBeside(most, apart)}, over the ${feet(most)} limit`
        : `${names} ${feet(apart)}`,
    {
      measured: measured(apart, 'ft'),
      allowed: joined ? between(least, most, 'ft') : atLeast(least, 'ft'),
      remedy:
        near || far
          ? moveRemedy(
              plane,
              { id: b.id, name: nameOf(b) },
              other,
              nearestPlace(
                plane,
                other,
                (to) => within(metresToFeet(distance(at, to)), least, joined ? most : Infinity),
                alongFrom(at, other, feetToMetres(near ? least : most)),
              ),
            )
          : null,
    },
  );
}

const within = (value: number, least: number, most: number): boolean =>
  value >= least - DRAWN_WITHIN_FT.value && value <= most + DRAWN_WITHIN_FT.value;

/** The place `metres` from `from` on the way to `toward`; none where the two are one place. */
function alongFrom(from: Vec, toward: Vec, metres: number): Vec[] {
  const far = distance(from, toward);
  if (far === 0) return [];
  const part = metres / far;
  return [{ x: from.x + (toward.x - from.x) * part, y: from.y + (toward.y - from.y) * part }];
}
