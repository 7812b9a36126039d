import type { FirstToFail } from '@/lib/checks';
import { clockWords } from '@/components/conditions/time-words';

/** The line in the reader's own zone: "wind too old at 14:23, then wind past 017°". */
export function firstToFailWords(
  { words, coming }: FirstToFail,
  asOf: string | null,
  zone?: string,
): string {
  if (coming.length === 0) return words;
  return coming
    .map(({ words: said, at }) => {
      if (at === null) return said;
      const before = said.lastIndexOf(' at ');
      return `${before < 0 ? said : said.slice(0, before)} at ${clockWords(at, asOf ?? at, zone)}`;
    })
    .join(', then ');
}
