import { currentPerson, type SignedIn } from '@/lib/server/session';

/**
 * A page's title from what it shows. Where that can't be read the page itself says why, so here
 * the plain word is enough.
 */
export async function titleFor(
  plain: string,
  read: (person: SignedIn) => Promise<string>,
): Promise<string> {
  try {
    const person = await currentPerson();
    return person ? await read(person) : plain;
  } catch {
    return plain;
  }
}
