import 'server-only';
import type { NextRequest } from 'next/server';
import { Refusal } from '../problems';

const megabytes = (bytes: number): string =>
  bytes >= 1_000_000 ? `${Math.round(bytes / 1_000_000)} MB` : `${Math.round(bytes / 1000)} kB`;

const tooLarge = (most: number) =>
  new Refusal(
    'too-large',
    `What was sent is larger than ${megabytes(most)}, the most taken here. Nothing was changed.`,
  );

/** The body as JSON, never more of it in memory than `most` bytes. */
export async function readJson(request: NextRequest, most: number): Promise<unknown> {
  const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
  if (type !== 'application/json' && type !== 'application/geo+json') {
    throw new Refusal('wrong-media-type', 'Send JSON, with the content type application/json.');
  }
  const announced = Number(request.headers.get('content-length') ?? Number.NaN);
  if (announced > most) throw tooLarge(most);

  const bytes = await readBytes(request, most);
  // A proxy in between may cut a large body off without a word.
  if (Number.isFinite(announced) && announced !== bytes.length) {
    throw new Refusal(
      'bad-request',
      `Only ${bytes.length} of ${announced} bytes arrived. Nothing was changed; send it again.`,
    );
  }
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes)) as unknown;
  } catch {
    throw new Refusal('bad-request', 'What was sent is not JSON in UTF-8. Nothing was changed.');
  }
}

async function readBytes(request: NextRequest, most: number): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  let length = 0;
  const reader = request.body?.getReader();
  while (reader) {
    const { done, value } = (await reader.read()) as ReadableStreamReadResult<Uint8Array>;
    if (done) break;
    length += value.length;
    if (length > most) {
      await reader.cancel();
      throw tooLarge(most);
    }
    chunks.push(value);
  }
  return Buffer.concat(chunks, length);
}
