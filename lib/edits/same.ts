/**
 * True where two values say the same as JSON: order of members doesn't matter, and an absent
 * member equals an undefined one. Edits use it to leave the sheet alone when nothing changes.
 */
export function same(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (Array.isArray(a) && Array.isArray(b)) {
    return a.length === b.length && a.every((value, i) => same(value, b[i]));
  }
  if (!isRecord(a) || !isRecord(b)) return false;
  const names = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...names].every((name) => same(a[name], b[name]));
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
