/** How far a trade number can be trusted. Every number of the product carries one of these. */
export type Mark = 'published' | 'common-practice' | 'from-memory' | 'our-default';

export const MARK_WORDS: Record<Mark, string> = {
  published: 'published source',
  'common-practice': 'common practice, no source',
  'from-memory': 'from memory, confirm against the current edition',
  'our-default': 'our default, the agency sets its own',
};

/** A mark with what stands behind it. `source` is a sentence fragment that can follow "from". */
export type Backing = { readonly mark: Mark; readonly source: string };

export const COMMON_PRACTICE: Backing = {
  mark: 'common-practice',
  source: 'Common practice of the trade',
};
export const OUR_DEFAULT: Backing = {
  mark: 'our-default',
  source: 'Default of this product; the agency sets its own',
};
