import type * as z from 'zod/mini';

/** What is wrong with a file and where, as `features[3].properties.system`. */
export type Fault = { readonly path: string; readonly message: string };

type Step = PropertyKey;

export const pathText = (steps: readonly Step[]): string =>
  steps.reduce<string>(
    (text, step) =>
      typeof step === 'number'
        ? `${text}[${step}]`
        : text
          ? `${text}.${String(step)}`
          : String(step),
    '',
  );

/** Faults of a failed parse. `lead` turns a path inside the value into one inside the file. */
export function faultsOf(
  error: z.core.$ZodError,
  lead: (steps: readonly Step[]) => readonly Step[] = (steps) => steps,
): Fault[] {
  return error.issues.map((issue) => ({
    path: pathText(lead(issue.path)),
    message: plainMessage(issue),
  }));
}

/** zod's own words for what a schema left unsaid, without its vocabulary of types. */
const plainMessage = (issue: z.core.$ZodIssue): string =>
  issue.message.replace(/^Invalid input: /, '');
