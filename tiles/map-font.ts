import { rmSync } from 'node:fs';
import { mkdtemp, readFile, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';
import { inflateSync } from 'node:zlib';

/** The families as the shipped files name themselves. */
export const MAP_FONT = { regular: 'Source Sans 3', bold: 'Source Sans 3 SemiBold' } as const;

const FILES = ['400', '600'].map(
  (weight) => `@fontsource/source-sans-3/files/source-sans-3-latin-${weight}-normal.woff`,
);

let ready: Promise<void> | undefined;

/**
 * Lets the rasteriser see the shipped font and nothing else, so that a map reads the same on every
 * machine. It finds fonts through fontconfig, which looks in folders and can't read WOFF; so the
 * files are unpacked to a folder of their own, which goes when the process ends. Must be awaited
 * before the process draws its first words: fontconfig reads its settings once.
 */
export const readyMapFont = (): Promise<void> => (ready ??= unpackFont());

async function unpackFont(): Promise<void> {
  const folder = await mkdtemp(join(tmpdir(), 'map-font-'));
  process.once('exit', () => rmSync(folder, { recursive: true, force: true }));
  const find = createRequire(import.meta.url).resolve;
  for (const file of FILES) {
    const name = basename(file).replace('.woff', '.ttf');
    await writeFile(join(folder, name), unpackWoff(await readFile(find(file))));
  }
  const settings = join(folder, 'fonts.conf');
  await writeFile(
    settings,
    `<?xml version="1.0"?><fontconfig><dir>${folder}</dir><cachedir>${folder}</cachedir></fontconfig>`,
  );
  process.env.FONTCONFIG_FILE = settings;
}

/** A WOFF 1.0 file (W3C, 2012) is a TrueType file with each table deflated. */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new Error('The font file is not WOFF 1.0');
  const count = woff.readUInt16BE(12);
  const head = Buffer.alloc(12 + 16 * count);
  const searched = 2 ** Math.floor(Math.log2(count));
  woff.copy(head, 0, 4, 8);
  head.writeUInt16BE(count, 4);
  head.writeUInt16BE(searched * 16, 6);
  head.writeUInt16BE(Math.log2(searched), 8);
  head.writeUInt16BE((count - searched) * 16, 10);
  const parts: Uint8Array[] = [head];
  let offset = head.length;
  for (let i = 0; i < count; i++) {
    const entry = 44 + 20 * i;
    const [start, packed, length] = [4, 8, 12].map((at) => woff.readUInt32BE(entry + at)) as [
      number,
      number,
      number,
    ];
    const stored = woff.subarray(start, start + packed);
    const table = packed < length ? inflateSync(stored) : stored;
    const row = 12 + 16 * i;
    woff.copy(head, row, entry, entry + 4);
    woff.copy(head, row + 4, entry + 16, entry + 20);
    head.writeUInt32BE(offset, row + 8);
    head.writeUInt32BE(length, row + 12);
    const padding = Buffer.alloc((4 - (length % 4)) % 4);
    parts.push(table, padding);
    offset += length + padding.length;
  }
  return Buffer.concat(parts);
}
