import type { Fault } from '@/lib/api';

/** An id used twice would make every edit that names it ambiguous. */
export function duplicateFaults(pieces: readonly { readonly id: string }[], path: string): Fault[] {
  const first = new Map<string, number>();
  return pieces.flatMap(({ id }, index) => {
    const earlier = first.get(id);
    if (earlier === undefined) {
      first.set(id, index);
      return [];
    }
    return [
      {
        path: `${path}[${index}].id`,
        message: `the id ${JSON.stringify(id.slice(0, 80))} is already that of ${path}[${earlier}]`,
      },
    ];
  });
}
