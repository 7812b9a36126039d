import * as z from 'zod/mini';
import { LIMIT_KEYS, type LimitKey } from '../../limits';
import {
  ANSWER_CLASSES,
  conditions,
  kit,
  liquid,
  locate,
  ownersAnswer,
  PUMP_PLACES,
} from '../schema';
import { above, between, instant, lonLat, words } from '../values';

/** The `stillground` member of an exchange file. Everything but the version may be left out. */

const limitValues = z.nullish(
  z.looseObject(
    Object.fromEntries(LIMIT_KEYS.map((key) => [key, z.nullish(between(key, 0, 1e6))])) as Record<
      LimitKey,
      z.ZodMiniOptional<z.ZodMiniNullable<z.ZodMiniNumber>>
    >,
  ),
);

const acceptance = z.looseObject({
  max_ohm: z.nullish(above('max_ohm', 0, 1e9)),
  authority: z.nullish(words('authority')),
});

export const header = z.looseObject(
  {
    version: z.literal(1, { error: 'version must be 1, the only one there is' }),
    name: z.nullish(words('name', 200)),
    origin: z.nullish(lonLat),
    planned_at: z.nullish(instant),
    pump: z.nullish(
      z.enum(PUMP_PLACES, { error: `pump must be one of ${PUMP_PLACES.join(', ')}` }),
    ),
    conditions: z.nullish(conditions),
    liquid: z.nullish(liquid),
    acceptance: z.nullish(acceptance),
    buried_lines: z.nullish(
      z.looseObject({
        answers: z.nullish(
          z.looseObject(
            Object.fromEntries(ANSWER_CLASSES.map((name) => [name, z.nullish(ownersAnswer)])),
          ),
        ),
      }),
    ),
    overhead_lines: z.nullish(z.looseObject({ none_known_as_of: z.nullish(instant) })),
    locates: z.nullish(z.array(locate, { error: 'locates must be a list of tickets' })),
    limits: z.nullish(z.looseObject({ name: z.nullish(words('name')), values: limitValues })),
    kit: z.nullish(kit),
  },
  { error: 'the file has no "stillground" member, so it is not a layout' },
);

export type Header = z.output<typeof header>;
export const HEADER_KEYS: readonly string[] = Object.keys(header.shape);
