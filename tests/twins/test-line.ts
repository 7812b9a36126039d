import type { System } from '@/lib/layout';
import { drawnPath } from './kit';
import { inArea, feetToEdge, type Flat } from './ground';
import { apart, DRAWN, HAIR, LETTERS, near, tell, type Scene, type TwinFinding } from './scene';

/** Will the test line read true? */

type Answer = Pick<TwinFinding, 'status'> & Partial<TwinFinding>;

const forSystems = (
  scene: Scene,
  rule: string,
  gate: 'deviation' | 'ack',
  answer: (system: System) => Answer,
): TwinFinding[] =>
  LETTERS.map((system) => {
    if (!scene.inUse.includes(system)) return tell(rule, gate, [system], 'n/a');
    const { status, ...told } = answer(system);
    return tell(rule, gate, [system], status, told);
  });

export const testComplete = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'test-complete', 'deviation', (system) => {
    const there = [
      scene.probe('z-probe', system) !== null,
      scene.probe('y-probe', system) !== null,
      scene.all('tester').length > 0,
    ];
    const value = there.filter((is) => !is).length;
    return { status: value === 0 ? 'meets' : 'not-met', value, unit: 'count' };
  });

type Line = { centre: Flat; z: Flat | null; y: Flat | null };

function testLine(scene: Scene, system: System): Line | null {
  const centre = scene.centre(system);
  if (!centre) return null;
  const z = scene.probe('z-probe', system);
  const y = scene.probe('y-probe', system);
  return { centre, z: z && scene.flat(z.at), y: y && scene.flat(y.at) };
}

function ratioOf(scene: Scene, system: System): number | null {
  const line = testLine(scene, system);
  if (!line?.z || !line.y) return null;
  return apart(line.centre, line.y) / apart(line.centre, line.z);
}

function ratioAnswer(scene: Scene, system: System): Answer {
  const { y_ratio_min, y_ratio_max, y_ratio_low, y_ratio_high } = scene.values;
  const value = ratioOf(scene, system);
  if (value === null) return { status: 'not-known' };
  const tie = near(value, 'ratio', [y_ratio_min, y_ratio_max, y_ratio_low, y_ratio_high]);
  const status =
    value >= y_ratio_min && value <= y_ratio_max
      ? 'meets'
      : value >= y_ratio_low && value <= y_ratio_high
        ? 'caution'
        : 'not-met';
  return { status, value, unit: 'ratio', tie };
}

export const yRatio = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'y-ratio', 'deviation', (system) => ratioAnswer(scene, system));

/** A probe's distance within its band; above the band the ratio may save it. */
function distanceAnswer(
  scene: Scene,
  system: System,
  probe: 'z' | 'y',
  min: number,
  max: number,
): Answer {
  const line = testLine(scene, system);
  const at = line?.[probe];
  if (!line || !at) return { status: 'not-known' };
  const value = apart(line.centre, at);
  const ratio = ratioAnswer(scene, system);
  const above = value > max + DRAWN;
  const tie = near(value, 'ft', [min - DRAWN, max + DRAWN]) || (above && ratio.tie === true);
  const told = { value, unit: 'ft', tie } as const;
  if (value < min - DRAWN) return { status: 'not-met', ...told };
  if (above) return { status: ratio.status === 'meets' ? 'caution' : 'not-met', ...told };
  return { status: 'meets', ...told };
}

export const zDistance = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'z-distance', 'deviation', (system) =>
    distanceAnswer(scene, system, 'z', scene.values.z_min_ft, scene.values.z_max_ft),
  );

export const yDistance = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'y-distance', 'deviation', (system) =>
    distanceAnswer(scene, system, 'y', scene.values.y_min_ft, scene.values.y_max_ft),
  );

export function zCentral(scene: Scene): TwinFinding[] {
  const feet = scene.inUse.flatMap((system) => {
    const line = testLine(scene, system);
    return line?.z ? [apart(line.centre, line.z)] : [];
  });
  const rule = ['z-central', 'ack', []] as const;
  if (feet.length < scene.inUse.length) return [tell(...rule, 'not-known')];
  const value = Math.max(...feet) - Math.min(...feet);
  const most = scene.values.z_spread_max_ft + DRAWN;
  const tie = near(value, 'ft', [most]);
  return [tell(...rule, value <= most ? 'meets' : 'caution', { value, unit: 'ft', tie })];
}

export const yInLine = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'y-in-line', 'deviation', (system) => {
    const line = testLine(scene, system);
    if (!line?.z || !line.y) return { status: 'not-known' };
    const { centre, z, y } = line;
    const far = apart(centre, z);
    const ahead: Flat = [(z[0] - centre[0]) / far, (z[1] - centre[1]) / far];
    const to: Flat = [y[0] - centre[0], y[1] - centre[1]];
    const along = to[0] * ahead[0] + to[1] * ahead[1];
    const value = Math.abs(to[0] * ahead[1] - to[1] * ahead[0]);
    const angle = (Math.atan2(value, along) * 180) / Math.PI;
    const { y_offset_max_ft, y_angle_max_deg } = scene.values;
    const between = along > 0 && along < far;
    const status = !between
      ? 'not-met'
      : value <= y_offset_max_ft + DRAWN
        ? 'meets'
        : angle <= y_angle_max_deg
          ? 'caution'
          : 'not-met';
    const tie =
      near(along, 'ft', [0, far]) ||
      (between && near(value, 'ft', [y_offset_max_ft + DRAWN])) ||
      (between && near(angle, 'deg', [y_angle_max_deg]));
    return { status, value, unit: 'ft', tie };
  });

export const zFarEnough = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'z-far-enough', 'ack', (system) => {
    const line = testLine(scene, system);
    if (!line?.z) return { status: 'not-known' };
    const rods = scene.rods(system);
    const spread = rods.flatMap((a) => rods.map((b) => apart(scene.flat(a.at), scene.flat(b.at))));
    const driven = rods.map((rod) => rod.driven_ft ?? rod.length_ft ?? 8);
    const value = apart(line.centre, line.z) / Math.max(...spread, ...driven);
    const least = scene.values.z_extent_min_ratio;
    const tie = near(value, 'ratio', [least]);
    return { status: value >= least ? 'meets' : 'caution', value, unit: 'ratio', tie };
  });

/** Lines that carry the test current where it should not go, each as its unbroken parts. */
function metal(scene: Scene): Flat[][] {
  const buried = scene
    .all('buried-line')
    .filter(({ material }) => material !== 'nonmetal')
    .flatMap(({ paths }) => paths);
  const other = scene.all('metal-line').map(({ path }) => path);
  return [...buried, ...other].map((path) => scene.path(path));
}

const STEP = 0.01;

/** The longest unbroken stretch near and along `from` → `to`, walked a hundredth of a foot a step. */
function longestRun(parts: Flat[][], from: Flat, to: Flat, nearFt: number, angleDeg: number) {
  let longest = 0;
  for (const part of parts) {
    let run = 0;
    for (let i = 1; i < part.length; i++) {
      const [a, b] = [part[i - 1]!, part[i]!];
      const steps = Math.max(1, Math.round(apart(a, b) / STEP));
      const step = apart(a, b) / steps;
      const along = lineAngle(a, b, from, to) <= angleDeg;
      for (let s = 0; s < steps; s++) {
        const part = (s + 0.5) / steps;
        const at: Flat = [a[0] + (b[0] - a[0]) * part, a[1] + (b[1] - a[1]) * part];
        run = along && feetToSegment(at, from, to) <= nearFt ? run + step : 0;
        longest = Math.max(longest, run);
      }
    }
  }
  return longest;
}

/** The angle at which two lines would cross, 0 … 90: metal has no front. */
function lineAngle(a: Flat, b: Flat, from: Flat, to: Flat): number {
  const direction = (p: Flat, q: Flat): number =>
    (Math.atan2(q[0] - p[0], q[1] - p[1]) * 180) / Math.PI;
  const turn = Math.abs(direction(a, b) - direction(from, to)) % 180;
  return Math.min(turn, 180 - turn);
}

function feetToSegment(at: Flat, a: Flat, b: Flat): number {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const part = ((at[0] - a[0]) * dx + (at[1] - a[1]) * dy) / (dx * dx + dy * dy);
  const held = Math.min(1, Math.max(0, part));
  return apart(at, [a[0] + dx * held, a[1] + dy * held]);
}

export const OWNERS = [
  'electric',
  'gas-oil-steam',
  'communications',
  'potable-water',
  'reclaimed-water',
  'sewer',
  'private',
] as const;

export const answerOf = (
  scene: Scene,
  owner: (typeof OWNERS)[number],
): 'marked' | 'clear' | null => {
  const answer = scene.site.answers[owner]?.answer;
  return answer === 'marked' || answer === 'clear' ? answer : null;
};

export const testLineClearOfMetal = (scene: Scene): TwinFinding[] =>
  forSystems(scene, 'test-line-clear-of-metal', 'ack', (system) => {
    const line = testLine(scene, system);
    if (!line?.z) return { status: 'not-known' };
    const parts = metal(scene);
    const anAnswerIsOut = OWNERS.some((owner) => answerOf(scene, owner) === null);
    if (parts.length === 0 && anAnswerIsOut) return { status: 'not-known' };
    const { metal_near_ft, metal_angle_deg, metal_run_ft } = scene.values;
    const { centre, z } = line;
    const run = (more: number): number =>
      longestRun(parts, centre, z, metal_near_ft + more, metal_angle_deg + more);
    const value = run(0);
    // Metal that runs almost with the line, or turns away at almost the angle, is a hair's matter.
    const tie =
      Math.abs(value - metal_run_ft - DRAWN) < 3 * HAIR.ft || run(0.001) - run(-0.001) > HAIR.ft;
    const status = value <= metal_run_ft + DRAWN ? 'meets' : 'caution';
    return { status, value, unit: 'ft', tie };
  });

export function leadsClear(scene: Scene): TwinFinding[] {
  const leads = scene.all('test-lead');
  const zones = scene.all('hot-zone').map((zone) => scene.rings(zone));
  if (leads.length === 0) return [tell('leads-clear', 'deviation', [], 'n/a')];
  return leads.map((lead) => {
    const { id } = lead;
    if (zones.length === 0) return tell('leads-clear', 'deviation', [id], 'not-known');
    const walked = walk(scene.path(drawnPath(scene, lead)), 0.1);
    const inside = walked.filter((at) => zones.some((zone) => inArea(at, zone)));
    const clearance = Math.min(
      ...walked.flatMap((at) => zones.map((zone) => feetToEdge(at, zone))),
    );
    const tie = inside.length > 0 ? inside.length < 5 : clearance < 0.1;
    return tell('leads-clear', 'deviation', [id], inside.length > 0 ? 'not-met' : 'meets', { tie });
  });
}

/** Places along a path, `step` feet apart. */
function walk(path: readonly Flat[], step: number): Flat[] {
  return path.slice(1).flatMap((b, i) => {
    const a = path[i]!;
    const steps = Math.max(1, Math.ceil(apart(a, b) / step));
    return Array.from({ length: steps + 1 }, (_, s): Flat => {
      const part = s / steps;
      return [a[0] + (b[0] - a[0]) * part, a[1] + (b[1] - a[1]) * part];
    });
  });
}
