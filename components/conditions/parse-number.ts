/** What was typed into a number field: a number, nothing (null), or a sentence about it. */
export type ReadNumber = { readonly value: number | null } | { readonly fault: string };

export function parseNumber(text: string, least: number, most: number): ReadNumber {
  // People type "330°", "8 mph", "3,5" and a true minus; only what stays ambiguous is refused.
  const bare = text
    .trim()
    .replace(/^[−–]/, '-')
    .replace(/^(-?\d+),(\d{1,2})$/, '$1.$2')
    .replace(/\s*(°|%|ft|mph|kn|km\/h|m\/s|in|Ω·?m?|V)$/i, '');
  if (bare === '') return { value: null };
  if (!/^[-+]?(\d+\.?\d*|\.\d+)$/.test(bare)) return { fault: 'Enter a number, or leave it empty' };
  const value = Number(bare);
  if (value < least || value > most) {
    return { fault: rangeFault(least, most) };
  }
  return { value };
}

function rangeFault(least: number, most: number): string {
  if (most === Infinity) return `Enter ${least} or more`;
  if (least === -Infinity) return `Enter ${most} or less`;
  return `Enter ${least} to ${most}`;
}
