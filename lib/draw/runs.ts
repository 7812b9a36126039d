import { placesOf, type Run } from '../layout';
import { lying } from './curves';
import type { Frame } from './frame';
import { line, stroke } from './marks';
import type { Group, Stroke } from './types';

type RunLook = { readonly bow: number; readonly strokes: readonly Stroke[] };

/** Bows to different sides, so that runs between the same two pieces don't lie on each other. */
const LOOKS: Readonly<Record<Run['kind'], RunLook>> = {
  jumper: {
    bow: 0,
    strokes: [stroke('spruce', 3.5, { casing: { token: 'paper', width: 6 } })],
  },
  'ground-cable': {
    bow: 0.07,
    strokes: [stroke('spruce', 2.5, { casing: { token: 'paper', width: 5 } })],
  },
  'bond-cable': {
    bow: -0.06,
    strokes: [stroke('ink', 2.5, { dash: [0.1, 5], cap: 'round' })],
  },
  hose: {
    bow: 0.045,
    strokes: [stroke('paper', 4.5, { casing: { token: 'ink', width: 7.5 } })],
  },
  'test-lead': {
    bow: 0.02,
    strokes: [stroke('ink', 1.5, { dash: [9, 3, 1.5, 3, 1.5, 3] })],
  },
};

export function drawRun(frame: Frame, run: Run): Group {
  const look = LOOKS[run.kind];
  const path = lying(placesOf(frame.plane, run)[0] ?? [], look.bow);
  return {
    id: run.id,
    layer: 'run',
    hit: { type: 'lines', lines: [path], nearPx: 8 },
    marks: look.strokes.map((drawn) => line([path], drawn)),
  };
}
