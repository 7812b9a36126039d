import { checks } from './checks';
import { page } from './page';
import type { Bench } from './result';

/** Every bench by its name, in the order of the report. */
export const BENCHES: Readonly<Record<string, Bench>> = { checks, page };
