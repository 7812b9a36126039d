import { spread, type Cost, type Spread } from './measure';

export type Goal = { readonly atLeast: number } | { readonly atMost: number };

/** One measured line: a ratio, or an absolute figure where the goal is one. */
export type Result = {
  readonly name: string;
  readonly what: string;
  readonly unit: '×' | 'ms' | 'points' | 'KiB' | '';
  readonly ratio: number;
  readonly min: number;
  readonly max: number;
  readonly goal: string;
  readonly holds: boolean;
  /** The same by the clock, where `ratio` is of processor time. */
  readonly wall?: Spread;
  readonly rounds: number;
  readonly seed?: number;
};

export type Bench = (tell: (result: Result) => void) => Promise<void>;

type Told = Pick<Result, 'name' | 'what' | 'unit' | 'seed'> & { readonly goal: Goal };

/** From figures of several rounds; their median is what has to hold. */
export function resultOf(told: Told, values: readonly number[], walls?: readonly number[]): Result {
  const { median, min, max } = spread(values);
  const { goal, ...rest } = told;
  const holds = 'atLeast' in goal ? median >= goal.atLeast : median <= goal.atMost;
  return {
    ...rest,
    ratio: median,
    min,
    max,
    goal: goalWords(goal, told.unit),
    holds,
    ...(walls && { wall: spread(walls) }),
    rounds: values.length,
  };
}

/** How many times the peer's cost ours is, round by round. */
export const timesCheaper = (
  { ours, peer }: { ours: readonly Cost[]; peer: readonly Cost[] },
  by: keyof Cost,
): number[] => ours.map((cost, round) => (peer[round]?.[by] ?? NaN) / cost[by]);

function goalWords(goal: Goal, unit: string): string {
  const [sign, value] = 'atLeast' in goal ? ['≥', goal.atLeast] : ['≤', goal.atMost];
  const gap = unit === '×' || unit === '' ? '' : ' ';
  return `${sign} ${value.toLocaleString('en-US')}${gap}${unit}`;
}
