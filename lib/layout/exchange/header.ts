import * as z from 'zod';
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

const limitValues = z
  .looseObject(
    Object.fromEntries(LIMIT_KEYS.map((key) => [key, between(key, 0, 1e6).nullish()])) as Record<
      LimitKey,
      z.ZodOptional<z.ZodNullable<z.ZodNumber>>
    >,
  )
  .nullish();

const acceptance = z.looseObject({
  max_ohm: above('max_ohm', 0, 1e9).nullish(),
  authority: words('authority').nullish(),
});

export const header = z.looseObject(
  {
    version: z.literal(1, { error: 'version must be 1, the only one there is' }),
    name: words('name', 200).nullish(),
    origin: lonLat.nullish(),
    planned_at: instant.nullish(),
    pump: z.enum(PUMP_PLACES, { error: `pump must be one of ${PUMP_PLACES.join(', ')}` }).nullish(),
    conditions: conditions.nullish(),
    liquid: liquid.nullish(),
    acceptance: acceptance.nullish(),
    buried_lines: z
      .looseObject({
        answers: z
          .looseObject(
            Object.fromEntries(ANSWER_CLASSES.map((name) => [name, ownersAnswer.nullish()])),
          )
          .nullish(),
      })
      .nullish(),
    overhead_lines: z.looseObject({ none_known_as_of: instant.nullish() }).nullish(),
    locates: z.array(locate, { error: 'locates must be a list of tickets' }).nullish(),
    limits: z.looseObject({ name: words('name').nullish(), values: limitValues }).nullish(),
    kit: kit.nullish(),
  },
  { error: 'the file has no "stillground" member, so it is not a layout' },
);

export type Header = z.output<typeof header>;
export const HEADER_KEYS: readonly string[] = Object.keys(header.shape);
