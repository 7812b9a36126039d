import { cpus, totalmem } from 'node:os';
import type { Result } from './result';

/** The table that is kept in the project: a *no* stays written until it is true. */
export function report(results: readonly Result[]): string {
  const rows = results.map((result) =>
    [
      result.name,
      result.what,
      figure(result.ratio, result.unit),
      figure(result.min, result.unit),
      figure(result.max, result.unit),
      result.goal,
      result.holds ? 'yes' : '**no**',
    ].join(' | '),
  );
  return [
    '# Measured',
    '',
    'Written by `npm run bench -- all`. Ratios are of processor time, the median of rounds taken in turns; a ratio says how many times cheaper ours is than the plain way named beside it.',
    '',
    `Machine: ${machine()}.`,
    '',
    '| name | what | ratio | min | max | goal | holds |',
    '| --- | --- | --- | --- | --- | --- | --- |',
    ...rows.map((row) => `| ${row} |`),
    '',
  ].join('\n');
}

function figure(value: number, unit: Result['unit']): string {
  const text = value.toLocaleString('en-US', { maximumSignificantDigits: 3 });
  return unit === '×' || unit === '' ? `${text}${unit}` : `${text} ${unit}`;
}

function machine(): string {
  const processors = cpus();
  const model = processors[0]?.model.trim() ?? 'unknown processor';
  const memory = Math.round(totalmem() / 2 ** 30);
  return `${processors.length} × ${model}, ${memory} GiB, Node ${process.versions.node}`;
}
