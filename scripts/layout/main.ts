import { check } from './check';
import { convert } from './convert';
import { BadInput, EXIT, Usage, print } from './io';

const COMMANDS = { check, convert };

const USAGE = `Usage: npm run -s layout -- <command>

  check FILE [--at TIME]        every check's answer as JSON
  convert FILE --to geojson     the layout written anew

FILE is an exchange file, or - for standard input.
Exit code: 0 done; 1 done, something is not met or not known; 2 bad input; 3 bad usage.
`;

/** Runs one command; answers with its exit code. Results go to standard output, words to error. */
export async function main(words: readonly string[]): Promise<number> {
  const [name, ...rest] = words;
  try {
    if (!name || !Object.hasOwn(COMMANDS, name)) {
      throw new Usage(name ? `there is no command ${JSON.stringify(name)}` : 'no command given');
    }
    return await COMMANDS[name as keyof typeof COMMANDS](rest);
  } catch (error) {
    if (error instanceof BadInput) {
      await print({ faults: error.faults });
      process.stderr.write(`${error.message}\n`);
      return EXIT.badInput;
    }
    if (error instanceof Usage) {
      process.stderr.write(`${error.message}\n\n${USAGE}`);
      return EXIT.badUsage;
    }
    throw error;
  }
}
