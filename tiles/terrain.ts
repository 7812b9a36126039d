import type { Ft, Ground, Swell } from './scene';

/** Height in feet at a point of the scene. */
export type Height = (at: Ft) => number;

/** A plane through points by least squares: height at the origin, and rise a foot east and north. */
export type Tilt = { readonly at_origin: number; readonly east: number; readonly north: number };

const SAMPLE_STEP_FT = 10;

/**
 * The even slope with its swells. The swells' own tilt over the working area is taken out, so that
 * the slope a planner reads there (by spot heights, or enters) is the one the contours show.
 */
export function terrain(ground: Ground): Height {
  const waves = (at: Ft): number => ground.swells.reduce((sum, s) => sum + wave(s, at), 0);
  const stray = fitTilt(waves, ground.working_radius_ft);
  const down = (ground.down_deg * Math.PI) / 180;
  const fall = ground.grade_pct / 100;
  const [east, north] = [-fall * Math.sin(down) - stray.east, -fall * Math.cos(down) - stray.north];
  const start = ground.height_ft - stray.at_origin;
  return (at) => start + east * at[0] + north * at[1] + waves(at);
}

function wave(swell: Swell, [east, north]: Ft): number {
  const turn = (swell.toward_deg * Math.PI) / 180;
  const along = east * Math.sin(turn) + north * Math.cos(turn);
  const phase = (swell.phase_deg * Math.PI) / 180;
  return swell.height_ft * Math.sin((2 * Math.PI * along) / swell.length_ft + phase);
}

/** The plane nearest to the ground within `radiusFt` of the origin. */
export function fitTilt(height: Height, radiusFt: number): Tilt {
  // Sampled on a grid symmetric about the origin, so the sums of e, n and e·n vanish.
  let [count, sum, ee, nn, eh, nh] = [0, 0, 0, 0, 0, 0];
  const steps = Math.floor(radiusFt / SAMPLE_STEP_FT);
  for (let i = -steps; i <= steps; i++) {
    for (let j = -steps; j <= steps; j++) {
      const [e, n] = [i * SAMPLE_STEP_FT, j * SAMPLE_STEP_FT];
      if (Math.hypot(e, n) > radiusFt) continue;
      const h = height([e, n]);
      count++;
      sum += h;
      ee += e * e;
      nn += n * n;
      eh += e * h;
      nh += n * h;
    }
  }
  return { at_origin: sum / count, east: eh / ee, north: nh / nn };
}

/** Which way the plane falls, and how steeply. */
export function slopeOf(tilt: Tilt): { readonly down_deg: number; readonly grade_pct: number } {
  const down = (Math.atan2(-tilt.east, -tilt.north) * 180) / Math.PI;
  return {
    down_deg: (down + 360) % 360,
    grade_pct: Math.hypot(tilt.east, tilt.north) * 100,
  };
}
