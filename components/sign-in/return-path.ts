/** Where a sign-in leads when nothing else was asked for. */
export const AFTER_SIGN_IN = '/sites';

const SELF = 'http://self.invalid';

/**
 * The page to return to after signing in, from an address anybody may have written. Only a path of
 * this server is followed: `//elsewhere`, `/\elsewhere` and full addresses of other servers lead
 * to the sites instead. `origin` lets a full address of our own pass, as a redirect writes it.
 */
export function returnPath(asked: string | null | undefined, origin: string = SELF): string {
  if (!asked) return AFTER_SIGN_IN;
  if (!URL.canParse(asked, origin)) return AFTER_SIGN_IN;
  const target = new URL(asked, origin);
  const own = target.origin === new URL(origin).origin;
  if (!own || target.pathname.startsWith('//') || target.pathname === '/sign-in') {
    return AFTER_SIGN_IN;
  }
  return `${target.pathname}${target.search}${target.hash}`;
}
