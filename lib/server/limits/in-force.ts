import 'server-only';
import { limitsFrom, type Limits } from '@/lib/limits';
import type { SignedIn } from '../session';
import { readLimits } from './read-limits';

/** The agency's limits as the checks take them; number 0 says that it has set none. */
export async function limitsInForce(person: SignedIn): Promise<{ limits: Limits; number: number }> {
  const { limits: set } = await readLimits(person);
  if (!set) return { limits: limitsFrom(), number: 0 };
  return { limits: limitsFrom(set.values, set.acceptance, set.name), number: set.number };
}
