import type { Liquid } from '@/lib/layout';

/** "n-Hexane, UN 1208"; null while neither is entered. */
export function liquidWords(liquid: Liquid | null): string | null {
  const un = liquid?.un ? `UN ${liquid.un.replace(/^UN\s*/i, '')}` : null;
  return [liquid?.name, un].filter(Boolean).join(', ') || null;
}
