import { Usage } from './io';

/** Splits a command's words into its one file and its options. Throws Usage. */
export function oneFile<V>(
  command: string,
  words: readonly string[],
  parse: (args: string[]) => { values: V; positionals: string[] },
): { file: string; values: V } {
  let parsed;
  try {
    parsed = parse([...words]);
  } catch (error) {
    throw new Usage((error as Error).message);
  }
  const [file, ...extra] = parsed.positionals;
  if (!file || extra.length > 0) throw new Usage(`${command} takes one FILE`);
  return { file, values: parsed.values };
}
