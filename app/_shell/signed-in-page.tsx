import { notFound, redirect } from 'next/navigation';
import type { ReactNode } from 'react';
import { isDatabaseAway, Refusal } from '@/lib/server/problems';
import { currentPerson, type SignedIn } from '@/lib/server/session';
import { DatabaseAway } from './database-away';

/**
 * A page for someone signed in; anyone else signs in first and returns to `path`. What the verbs
 * refuse becomes the page that says so: another agency's thing is simply not found.
 */
export async function signedInPage(
  path: string,
  render: (person: SignedIn) => Promise<ReactNode> | ReactNode,
): Promise<ReactNode> {
  const person = await orPage(currentPerson);
  if ('page' in person) return person.page;
  if (!person.value) redirect(`/sign-in?callbackUrl=${encodeURIComponent(path)}`);
  const signedIn = person.value;
  const page = await orPage(async () => render(signedIn));
  return 'page' in page ? page.page : page.value;
}

type Made<Value> = { value: Value } | { page: ReactNode };

async function orPage<Value>(make: () => Promise<Value>): Promise<Made<Value>> {
  try {
    return { value: await make() };
  } catch (error) {
    if (error instanceof Refusal && error.code === 'not-found') notFound();
    if (isDatabaseAway(error)) return { page: <DatabaseAway /> };
    throw error;
  }
}
