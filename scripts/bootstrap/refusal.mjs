// @ts-check

/** Why a command stops, in one sentence that says what to do. Shown without a stack. */
export class Refusal extends Error {
  name = 'Refusal';
}
