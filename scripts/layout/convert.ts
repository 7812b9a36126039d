import { parseArgs } from 'node:util';
import { writeExchange } from '../../lib/layout/exchange';
import { EXIT, print, readLayout, Usage } from './io';
import { oneFile } from './words';

/** `convert FILE --to geojson` */
export async function convert(words: readonly string[]): Promise<number> {
  const { file, values } = oneFile('convert', words, (args) =>
    parseArgs({ args, allowPositionals: true, options: { to: { type: 'string' } } }),
  );
  if (values.to !== 'geojson') {
    throw new Usage(`--to takes geojson${values.to ? `, not ${JSON.stringify(values.to)}` : ''}`);
  }
  await print(writeExchange(await readLayout(file)));
  return EXIT.done;
}
