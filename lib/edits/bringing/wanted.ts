import type { LonLat } from '../../geo';
import { DEFAULT_LIMIT_VALUES, type LimitValues } from '../../limits';
import type { Kind } from '../../layout';

/** A piece as it was picked from the kit shelf and put on the plan. */
export type Wanted = {
  readonly kind: Kind;
  /** One position for a point; for a line or an area its corners in order, not closed. */
  readonly places: readonly LonLat[];
  /** What the shelf or the reader says of it: a rod's system and length, a line's utility. */
  readonly members?: Readonly<Record<string, unknown>>;
  /** For an area with one place: the circle round it. Not given: as large as its kind is drawn. */
  readonly radiusFt?: number;
  /** For a run: the pieces its first and last places are on, in either order. */
  readonly ends?: readonly [string, string];
};

export type Means = {
  /** A fresh id at each call. */
  readonly newId: () => string;
  readonly limits?: LimitValues;
};

export const limitsOf = ({ limits }: Means): LimitValues => limits ?? DEFAULT_LIMIT_VALUES;
