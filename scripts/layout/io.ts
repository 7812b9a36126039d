import { readFile } from 'node:fs/promises';
import { text } from 'node:stream/consumers';
import { parseExchange, type Fault, type Parsed } from '../../lib/layout/exchange';

export const EXIT = { done: 0, openItems: 1, badInput: 2, badUsage: 3 } as const;

/** The command was called in a way it doesn't know. */
export class Usage extends Error {}

/** The file can't be read as a layout. */
export class BadInput extends Error {
  constructor(readonly faults: readonly Fault[]) {
    super(
      `The file has ${faults.length} ${faults.length === 1 ? 'fault' : 'faults'}; nothing was done.`,
    );
  }
}

export type Sound = Extract<Parsed, { ok: true }>;

/** Opens and parses an exchange file; `-` is standard input. Throws BadInput with every fault. */
export async function readLayout(file: string): Promise<Sound> {
  const parsed = parseExchange(parseJson(await readText(file)));
  if (!parsed.ok) throw new BadInput(parsed.faults);
  return parsed;
}

async function readText(file: string): Promise<string> {
  try {
    return file === '-' ? await text(process.stdin) : await readFile(file, 'utf8');
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    const why =
      code === 'ENOENT'
        ? 'there is no such file'
        : code === 'EISDIR'
          ? 'it is a folder'
          : String(code);
    throw new BadInput([{ path: '', message: `cannot read ${file}: ${why}` }]);
  }
}

function parseJson(content: string): unknown {
  try {
    return JSON.parse(content.replace(/^\uFEFF/, ''));
  } catch (error) {
    throw new BadInput([{ path: '', message: `not JSON: ${(error as Error).message}` }]);
  }
}

/** Writes to standard output and waits until it is taken: a pipe may be slow. */
export function print(value: unknown): Promise<void> {
  return new Promise((resolve, reject) => {
    process.stdout.write(`${JSON.stringify(value, null, 2)}\n`, (error) =>
      error ? reject(error) : resolve(),
    );
  });
}
