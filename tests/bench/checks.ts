import { runChecks } from '../../lib/checks';
import { compare, each, quantile, type Cost } from './measure';
import { manyLines, nudged, type Scene } from './many-lines';
import { plainTurf, rodsAndProbes } from './plain-turf';
import { resultOf, timesCheaper, type Bench } from './result';

const SEED = 20_310_504;
/** Turf takes the earth for a sphere: lengths differ by up to a third of a per cent. */
const SPHERE = 0.006;

/** A full re-check after a piece was moved, the site's ground being the same as before. */
export const checks: Bench = async (tell) => {
  const scenes = new Map([1_000, 20_000, 100_000, 1_000_000].map((n) => [n, manyLines(n, SEED)]));
  const scene = (segments: number): Scene => scenes.get(segments)!;

  agree(scene(1_000));
  const small = compare(recheck(scene(20_000)), plainOne(scene(20_000)));
  tell(
    resultOf(
      {
        name: 'checks',
        what: '60 pieces over 20,000 buried segments: one full re-check',
        unit: 'ms',
        seed: SEED,
        goal: { atMost: 4 },
      },
      small.ours.map(({ cpu }) => cpu),
      small.ours.map(({ wall }) => wall),
    ),
  );

  const { ours, peer } = compare(recheck(scene(100_000)), plainOne(scene(100_000)));
  const large = { ours, peer: timesOf(peer, rodsAndProbes(scene(100_000).layout).length) };
  tell(
    resultOf(
      {
        name: 'checks',
        what: '60 pieces over 100,000 buried segments: plain Turf ÷ full re-check',
        unit: '×',
        seed: SEED,
        goal: { atLeast: 1_000 },
      },
      timesCheaper(large, 'cpu'),
      timesCheaper(large, 'wall'),
    ),
  );

  const singles = each(recheck(scene(100_000)), 500).map(({ cpu }) => cpu);
  const p99 = quantile(
    singles.sort((a, b) => a - b),
    0.99,
  );
  tell(
    resultOf(
      {
        name: 'checks',
        what: '60 pieces over 100,000 buried segments: slowest of a hundred re-checks',
        unit: 'ms',
        seed: SEED,
        goal: { atMost: 1 },
      },
      [p99],
    ),
  );

  const growth = compare(recheck(scene(1_000)), recheck(scene(1_000_000)));
  tell(
    resultOf(
      {
        name: 'checks',
        what: 'full re-check over 1,000,000 segments ÷ over 1,000',
        unit: '×',
        seed: SEED,
        goal: { atMost: 3 },
      },
      timesCheaper(growth, 'cpu'),
      timesCheaper(growth, 'wall'),
    ),
  );
};

function recheck(scene: Scene): () => unknown {
  let step = 0;
  const { site, limits } = scene;
  return () =>
    runChecks({
      layout: nudged(scene, (step += 1) % 50),
      site,
      limits,
      asOf: scene.layout.planned_at,
    });
}

/**
 * The whole of it takes Turf minutes, so it is asked about one rod or probe at a time, another at
 * each call. Its work grows in step with their number, by which the figure is then multiplied.
 */
function plainOne(scene: Scene): () => unknown {
  const count = rodsAndProbes(scene.layout).length;
  let step = 0;
  return () => {
    step += 1;
    return plainTurf(nudged(scene, step % 50), scene.site, (place) => place === step % count);
  };
}

const timesOf = (costs: readonly Cost[], factor: number): Cost[] =>
  costs.map(({ cpu, wall }) => ({ cpu: cpu * factor, wall: wall * factor }));

/** A comparison means something only between two that answer alike. */
function agree({ layout, site, limits }: Scene): void {
  const ours = new Map(
    runChecks({ layout, site, limits, asOf: layout.planned_at })
      .filter(({ rule }) => rule === 'clear-of-buried-lines')
      .map(({ subjects, measured }) => [subjects.join(' '), measured?.value ?? NaN]),
  );
  const theirs = plainTurf(layout, site);
  for (const { piece, line, ft } of theirs) {
    const found = ours.get(`${piece} ${line}`);
    // Right at the distance where reporting begins the two may differ on whether to report.
    if (found === undefined && Math.abs(ft - 30) < 0.3) continue;
    if (found === undefined || Math.abs(found - ft) > 0.05 + SPHERE * Math.abs(ft)) {
      throw new Error(`${piece} from ${line}: ${ft} ft by Turf, ${found} ft by the checks.`);
    }
  }
}
