import type { Finding } from '@/lib/checks';
import { countWords, valueWords } from './measure-words';

/** What stands large at the end of a finding's line; null where the words say it all. */
export function lineValue({ measured, allowed, status }: Finding): string | null {
  if (!measured) return status === 'not-known' ? 'not known' : null;
  const meets = status === 'meets';
  if (measured.unit !== 'count') return valueWords(measured, allowed, meets);
  return meets || !allowed ? null : countWords(measured.value, allowed);
}
