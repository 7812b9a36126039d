import type { Status } from '@/lib/checks';

/** A status in words; shape and colour only repeat it. */
export const STATUS_WORDS: Record<Status, string> = {
  meets: 'meets',
  caution: 'caution',
  'not-met': 'not met',
  'not-known': 'not known',
  'n/a': 'does not apply',
};

/** Ink of the status on paper or margin, never the only sign of it. */
export const STATUS_INK: Record<Status, string> = {
  meets: 'text-spruce',
  caution: 'text-caution',
  'not-met': 'text-alarm',
  'not-known': 'text-ink',
  'n/a': 'text-ink-soft',
};
