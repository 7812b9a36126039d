import { writeFileSync } from 'node:fs';
import { BENCHES } from '../tests/bench/benches';
import { report } from '../tests/bench/report';
import type { Result } from '../tests/bench/result';

const RESULTS = new URL('../tests/bench/RESULTS.md', import.meta.url);

/** `npm run bench -- NAME…` prints a JSON line for every figure; `all` also writes the report. */
async function main(names: readonly string[]): Promise<number> {
  const known = Object.keys(BENCHES);
  const wanted = names.includes('all') ? known : names;
  const unknown = wanted.filter((name) => !known.includes(name));
  if (wanted.length === 0 || unknown.length > 0) {
    process.stderr.write(
      `${unknown.length > 0 ? `There is no bench ${unknown.join(', ')}. ` : ''}Name some of: ${known.join(', ')}, all.\n`,
    );
    return 3;
  }
  const results: Result[] = [];
  for (const name of wanted) {
    await BENCHES[name]?.((result) => {
      results.push(result);
      process.stdout.write(`${JSON.stringify(result)}\n`);
    });
  }
  if (names.includes('all')) writeFileSync(RESULTS, report(results));
  return 0;
}

main(process.argv.slice(2)).then(
  (code) => {
    process.exitCode = code;
  },
  (error: unknown) => {
    process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
    process.exitCode = 1;
  },
);
