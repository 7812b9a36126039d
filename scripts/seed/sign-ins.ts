import { randomInt } from 'node:crypto';
import { mkdir, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { DEMO_PEOPLE } from '../../demo/demo';

export type DemoSignIn = { name: string; email: string; role: string; password: string };

const FILE = 'demo-sign-ins.json';
/** No characters that look alike: these get typed off a screen. */
const ALPHABET = 'abcdefghjkmnpqrstuvwxyz23456789';

function password(): string {
  const group = () =>
    Array.from({ length: 4 }, () => ALPHABET[randomInt(ALPHABET.length)]).join('');
  return `${group()}-${group()}-${group()}`;
}

export const makeSignIns = (): DemoSignIn[] =>
  DEMO_PEOPLE.map(({ name, email, role }) => ({
    name,
    email,
    role,
    password: password(),
  }));

/** Readable by the owner only, and never half written. */
export async function keepSignIns(folder: string, signIns: readonly DemoSignIn[]): Promise<void> {
  await mkdir(folder, { recursive: true });
  const file = join(folder, FILE);
  await writeFile(`${file}.new`, `${JSON.stringify(signIns, null, 2)}\n`, { mode: 0o600 });
  await rename(`${file}.new`, file);
}
