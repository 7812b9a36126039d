import type { CheckInput } from './types';

/** What stops meeting first as time and wind go on. `at` is an instant where time decides. */
export type FirstToFail = { readonly words: string; readonly at: string | null };

export function firstToFail(_input: CheckInput): FirstToFail {
  return { words: 'Nothing is known to fail first', at: null };
}
