import { z } from 'zod';
import { notFound } from '../problems/problem';

const uuid = z.uuid();

/** An id out of an address. What isn't one leads nowhere, and must not reach an ASCII column. */
export function knownId(id: string, what: string): string {
  if (!uuid.safeParse(id).success) throw notFound(what);
  return id;
}
