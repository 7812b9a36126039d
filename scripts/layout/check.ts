import { parseArgs } from 'node:util';
import { checkReport, hasOpenItems } from '../../lib/checks';
import { instant } from '../../lib/layout/values';
import { EXIT, print, readLayout, Usage } from './io';
import { oneFile } from './words';

/** `check FILE [--at TIME]` */
export async function check(words: readonly string[]): Promise<number> {
  const { file, values } = oneFile('check', words, (args) =>
    parseArgs({ args, allowPositionals: true, options: { at: { type: 'string' } } }),
  );
  if (values.at !== undefined && !instant.safeParse(values.at).success) {
    throw new Usage(
      `--at takes a time like 2031-05-04T14:00:00Z, not ${JSON.stringify(values.at)}`,
    );
  }
  const { sheet, limits } = await readLayout(file);
  const report = checkReport(sheet, limits, values.at ?? null);
  await print(report);
  return hasOpenItems(report) ? EXIT.openItems : EXIT.done;
}
