/**
 * The sender's address out of X-Forwarded-For. The nearest proxy writes the last entry, and
 * without one Next puts the socket's address there; earlier entries are whatever the sender wrote.
 */
export function addressOf(forwardedFor: string | null | undefined): string {
  const nearest = forwardedFor?.split(',').at(-1)?.trim();
  return nearest && /^[0-9a-fA-F.:%\w-]{2,64}$/.test(nearest) ? nearest : 'unknown';
}
