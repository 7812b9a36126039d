import 'server-only';
import { hash, verify } from '@node-rs/argon2';

/** argon2id with the library's defaults, which are OWASP's: 19 MiB, two passes, one lane. */
export const hashPassword = (password: string): Promise<string> => hash(password);

let nobody: Promise<string> | undefined;

/**
 * Whether the password is right. For an account that isn't there, a hash that nothing matches is
 * checked all the same, so that the time taken doesn't tell which e-mails are known.
 */
export async function isRight(stored: string | null, password: string): Promise<boolean> {
  nobody ??= hash(crypto.randomUUID());
  const right = await verify(stored ?? (await nobody), password);
  return right && stored !== null;
}
