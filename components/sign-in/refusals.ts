/** Why nobody was signed in: what happened, and what to do next. */
export type Refusal = { title: string; next: string };

export const UNREACHABLE: Refusal = {
  title: 'The server can’t be reached.',
  next: 'What you entered is still here. Check the network and try again.',
};

const WRONG: Refusal = {
  title: 'E-mail and password don’t belong together.',
  next: 'Check both and try again. If you have forgotten the password, ask your agency’s administrator.',
};

const TOO_MANY: Refusal = {
  title: 'Too many tries.',
  next: 'Wait a quarter of an hour, then try again, or ask your agency’s administrator.',
};

const FAILED: Refusal = {
  title: 'The server could not sign you in.',
  next: 'Your password may well be right. Try again in a minute; if it goes on, tell your agency’s administrator.',
};

/** The same words for an unknown e-mail and a wrong password: neither tells who has an account. */
export function refusalFor(error: string | null | undefined, status: number): Refusal {
  if (error === 'too-many-tries' || status === 429) return TOO_MANY;
  if (error === 'CredentialsSignin') return WRONG;
  return FAILED;
}
