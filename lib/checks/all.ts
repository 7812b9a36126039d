import type { Check } from './types';

/** Every check, in the order of the questions it answers. */
export const CHECKS: readonly Check[] = [];
