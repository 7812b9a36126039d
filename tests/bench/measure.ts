/** What one call costs, milliseconds. */
export type Cost = { readonly wall: number; readonly cpu: number };
export type Spread = { readonly median: number; readonly min: number; readonly max: number };
export type Work = () => unknown;

/** Fewer say nothing about the spread on a noisy machine. */
export const ROUNDS = 7;
/** Long enough for the clock and the processor's accounts to mean something. */
const MEASURE_MS = 40;

/**
 * Two ways of the same work in one run, in turns A B B A, so that a machine that grows slower or
 * faster meanwhile does so for both.
 */
export function compare(ours: Work, peer: Work, rounds = ROUNDS): { ours: Cost[]; peer: Cost[] } {
  const [oursTimes, peerTimes] = [timesFor(ours), timesFor(peer)];
  const costs = { ours: [] as Cost[], peer: [] as Cost[] };
  for (let round = 0; round < rounds; round += 1) {
    const first = costOf(ours, oursTimes);
    const peers = [costOf(peer, peerTimes), costOf(peer, peerTimes)];
    const last = costOf(ours, oursTimes);
    costs.ours.push(mean([first, last]));
    costs.peer.push(mean(peers));
  }
  return costs;
}

/** Each call alone, for what the slowest of many cost. */
export function each(work: Work, calls: number): Cost[] {
  timesFor(work);
  return Array.from({ length: calls }, () => costOf(work, 1));
}

export function spread(values: readonly number[]): Spread {
  const sorted = [...values].sort((a, b) => a - b);
  return { median: quantile(sorted, 0.5), min: sorted[0] ?? NaN, max: sorted.at(-1) ?? NaN };
}

/** By linear interpolation between the two nearest. `sorted` rises. */
export function quantile(sorted: readonly number[], q: number): number {
  const at = q * (sorted.length - 1);
  const low = sorted[Math.floor(at)] ?? NaN;
  const high = sorted[Math.ceil(at)] ?? NaN;
  return low + (high - low) * (at - Math.floor(at));
}

/** How often to call it at a time; finding out warms it up as well. */
function timesFor(work: Work): number {
  for (let times = 1; ; times *= 2) {
    if (costOf(work, times).wall * times >= MEASURE_MS) return times;
  }
}

function costOf(work: Work, times: number): Cost {
  const cpu = process.cpuUsage();
  const wall = performance.now();
  for (let i = 0; i < times; i += 1) work();
  const took = performance.now() - wall;
  const used = process.cpuUsage(cpu);
  return { wall: took / times, cpu: (used.user + used.system) / 1000 / times };
}

const mean = (costs: readonly Cost[]): Cost => ({
  wall: costs.reduce((sum, { wall }) => sum + wall, 0) / costs.length,
  cpu: costs.reduce((sum, { cpu }) => sum + cpu, 0) / costs.length,
});
