// The small face of zod: this goes to the browser, where the large one would double the schema's weight.
import * as z from 'zod/mini';
import type { LonLat } from '../geo';

/** The small values that layouts, sites and requests are made of, each with a plain complaint. */

export const lonLat = z.pipe(
  z.array(z.number({ error: 'a coordinate must be a number' })).check(
    z.minLength(2, { error: 'a position needs longitude and latitude' }),
    z.refine((p) => p[0] === undefined || (p[0] >= -180 && p[0] <= 180), {
      error: 'longitude must lie between -180 and 180',
    }),
    z.refine((p) => p[1] === undefined || (p[1] >= -90 && p[1] <= 90), {
      error: 'latitude must lie between -90 and 90',
    }),
  ),
  z.transform((p) => p as unknown as LonLat),
);

export const path = z
  .array(lonLat)
  .check(z.minLength(2, { error: 'a line needs at least two positions' }));

const ring = z.array(lonLat).check(
  z.minLength(4, {
    error: 'a ring needs at least four positions, the last repeating the first',
  }),
  z.refine((r) => r.length < 4 || (r[0]![0] === r.at(-1)![0] && r[0]![1] === r.at(-1)![1]), {
    error: 'the ring is not closed: its last position must repeat its first',
  }),
);

export const rings = z.array(ring).check(z.minLength(1, { error: 'an area needs an outer ring' }));

/** A number with both ends allowed; `what` names it in the complaint. */
export const between = (what: string, least: number, most: number) =>
  z
    .number({ error: `${what} must be a number` })
    .check(
      z.gte(least, { error: `${what} must be ${least} or more` }),
      z.lte(most, { error: `${what} must be ${most} or less` }),
    );

export const above = (what: string, floor: number, most: number) =>
  z
    .number({ error: `${what} must be a number` })
    .check(
      z.gt(floor, { error: `${what} must be more than ${floor}` }),
      z.lte(most, { error: `${what} must be ${most} or less` }),
    );

/** Directions may be entered as 360, which is north. */
export const direction = (what: string) => between(what, 0, 360);

export const instant = z.iso.datetime({
  offset: true,
  error: 'a time must be written like 2031-05-04T14:00:00Z',
});

export const words = (what: string, most = 500) =>
  z
    .string({ error: `${what} must be text` })
    .check(z.maxLength(most, { error: `${what} must be ${most} characters or fewer` }));

export const SYSTEMS = ['C', 'R', 'P'] as const;
export const system = z.enum(SYSTEMS, { error: 'a system is C, R or P' });
export type System = (typeof SYSTEMS)[number];
