/**
 * What next-auth's sign-in answers in `error`, as text because it travels in an address. The
 * words are made here so that nothing from an address is ever shown as it came.
 */
export type SignInError =
  | { readonly code: 'wrong' }
  | { readonly code: 'too-many-tries'; readonly minutes: number }
  | { readonly code: 'database-away' }
  | { readonly code: 'unknown' };

export function writeSignInError(error: SignInError): string {
  return error.code === 'too-many-tries' ? `${error.code}:${error.minutes}` : error.code;
}

export function readSignInError(text: string): SignInError {
  const [code, minutes] = text.split(':');
  if (code === 'too-many-tries') return { code, minutes: Math.max(1, Number(minutes) || 1) };
  if (code === 'wrong' || code === 'CredentialsSignin') return { code: 'wrong' };
  return { code: code === 'database-away' ? code : 'unknown' };
}

export function signInWords(text: string): string {
  const error = readSignInError(text);
  switch (error.code) {
    case 'wrong':
      return 'The e-mail or the password is not right. Check both and try again; your administrator can set a new password.';
    case 'too-many-tries':
      return `Too many tries. Nothing is locked for good: try again in ${error.minutes} ${error.minutes === 1 ? 'minute' : 'minutes'}.`;
    case 'database-away':
      return 'The database is not answering, so nobody can sign in just now. Try again in a moment.';
    case 'unknown':
      return 'Signing in failed on the server. Try again; if it keeps failing, tell your administrator when it happened.';
  }
}
