/**
 * True where two documents say the same as JSON: the server's copy has its members in another
 * order, and lacks those that were undefined here.
 */
export function sameDocument(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (Array.isArray(a) && Array.isArray(b)) {
    return a.length === b.length && a.every((value, i) => sameDocument(value, b[i]));
  }
  if (!isRecord(a) || !isRecord(b)) return false;
  const names = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...names].every((name) => sameDocument(a[name], b[name]));
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
