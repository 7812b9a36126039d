import { COMMON_PRACTICE, MARK_WORDS, OUR_DEFAULT, type Backing } from '@/lib/limits';

/** Sources that say no more than the mark does. */
const SAID_BY_MARK: readonly string[] = [COMMON_PRACTICE.source, OUR_DEFAULT.source];

/** How far a number can be trusted, and what stands behind it. */
export function BackingWords({ backing }: { backing: Backing }) {
  const mark = MARK_WORDS[backing.mark];
  return (
    <>
      {mark.charAt(0).toUpperCase() + mark.slice(1)}
      {!SAID_BY_MARK.includes(backing.source) && <span className="block">{backing.source}</span>}
    </>
  );
}
