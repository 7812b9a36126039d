import type { Who } from '@/lib/api';

/** A joined person as the API names people; a join that found nobody is all null. */
export const whoOf = (
  person: { id: string | null; name: string | null } | null | undefined,
): Who | null => (person?.id && person.name !== null ? { id: person.id, name: person.name } : null);
