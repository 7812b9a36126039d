import type { Kind } from '../layout';

/**
 * What was picked from the kit shelf and is placed by the next press on the plan. It stays picked
 * until put down. `members` go into the piece placed: a rod's length, a line's utility.
 */
export type InHand = {
  readonly kind: Kind;
  /** As the shelf calls it: "Rod 8 ft". */
  readonly words: string;
  readonly members: Readonly<Record<string, unknown>>;
};
