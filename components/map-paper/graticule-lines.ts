/** The next of 1, 2, 5, 10 … (or a tenth, hundredth of them) that is at least `least`. */
export function gridStep(least: number): number {
  const decade = 10 ** Math.floor(Math.log10(least));
  return decade * ([1, 2, 5].find((part) => part * decade >= least) ?? 10);
}

/** Every multiple of `step` from `from` to `to`, both included. */
export function linesBetween(from: number, to: number, step: number): number[] {
  const first = Math.ceil(from / step);
  const count = Math.floor(to / step) - first + 1;
  return Array.from({ length: Math.max(0, count) }, (_, i) => (first + i) * step);
}

/** "100.25° W", with as many decimals as the step needs. */
export function degreeWords(degrees: number, step: number, plus: string, minus: string): string {
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const text = Math.abs(degrees).toFixed(decimals);
  const side = Number(text) === 0 ? '' : degrees > 0 ? ` ${plus}` : ` ${minus}`;
  return `${text}°${side}`;
}
