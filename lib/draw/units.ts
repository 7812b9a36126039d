import type { Ring, Vec } from '../geo';
import { footprintOf, type Unit } from '../layout';
import type { Frame } from './frame';
import { fill, glyph, line, pxDisc, pxLine, stroke } from './marks';
import type { Group, Mark } from './types';
import { add, between, subtract, times, unitVector } from './vectors';

const BODY = 2;
/** The cab takes this part of the length, at most so many metres. */
const CAB_PART = 0.14;
const CAB_MOST = 3;
export const PUMP_RADIUS_PX = 13;

export function drawUnit(frame: Frame, unit: Unit): Group {
  const ring = footprintOf(frame.plane, unit);
  return {
    id: unit.id,
    layer: 'piece',
    hit:
      unit.kind === 'pump'
        ? { type: 'spot', at: frame.vec(unit.at), radiusPx: PUMP_RADIUS_PX * frame.symbols }
        : { type: 'area', rings: [ring], nearPx: 6, edge: false },
    marks:
      unit.kind === 'pump'
        ? pumpMarks(frame.vec(unit.at), ring, unit.heading_deg ?? 0, frame.symbols)
        : vehicleMarks(ring, unit.kind === 'casualty-vehicle'),
  };
}

function vehicleMarks([fl, fr, rr, rl]: Ring, casualty: boolean): Mark[] {
  if (!fl || !fr || !rr || !rl) return [];
  const length = Math.hypot(fl.x - rl.x, fl.y - rl.y);
  const width = Math.hypot(fl.x - fr.x, fl.y - fr.y);
  /** A place by its part of the length from the rear and of the width from the right. */
  const spot = (ahead: number, left: number): Vec =>
    add(between(rr, fr, ahead), times(subtract(rl, rr), left));
  const cab = 1 - Math.min(CAB_PART, CAB_MOST / length);
  const arrow = cab + (1 - cab) * 0.45;
  const bend = Math.min(0.09, width / length) / 2;
  const [from, to, middle] = [0.05, cab - 0.05, (cab - 0.02) / 2];
  const centreline: Vec[] = casualty
    ? [
        spot(from, 0.5),
        spot(middle - bend * 1.6, 0.5),
        spot(middle - bend, 0.72),
        spot(middle + bend * 0.4, 0.24),
        spot(middle + bend, 0.5),
        spot(to, 0.5),
      ]
    : [spot(from, 0.5), spot(to, 0.5)];
  return [
    line([rounded([fl, fr, rr, rl], width * 0.14)], stroke('ink', BODY), true, fill('paper')),
    line([[spot(cab, 0), spot(cab, 1)]], stroke('ink', 1.5)),
    line(
      [[spot(arrow, 0.22), spot(arrow + (1 - cab) * 0.32, 0.5), spot(arrow, 0.78)]],
      stroke('ink', 1.5),
    ),
    line([centreline], stroke('ink', 1.75, casualty ? {} : { dash: [14, 4, 2, 4] })),
  ];
}

/** After ISO 10628: a circle with a triangle that points where the liquid goes. */
function pumpMarks(at: Vec, ring: Ring, headingDeg: number, symbols: number): Mark[] {
  const r = PUMP_RADIUS_PX * symbols;
  const [sin, cos] = [Math.sin(Math.PI / 3) * r, Math.cos(Math.PI / 3) * r];
  return [
    line([ring.slice(0, -1)], stroke('ink-soft', 1), true, fill('paper', 0.85)),
    glyph(
      at,
      [
        pxDisc(r, stroke('ink', 2), fill('paper')),
        pxLine(
          [
            [-sin, cos],
            [0, -r],
            [sin, cos],
          ],
          stroke('ink', 1.75),
          true,
        ),
      ],
      headingDeg,
    ),
  ];
}

/** The ring with its corners cut in short curves of `radius` metres. */
function rounded(corners: readonly Vec[], radius: number): Vec[] {
  return corners.flatMap((corner, i) => {
    const before = corners[(i + corners.length - 1) % corners.length]!;
    const after = corners[(i + 1) % corners.length]!;
    const [back, on] = [unitVector(corner, before), unitVector(corner, after)];
    if (!back || !on) return [corner];
    const a = add(corner, times(back, radius));
    const b = add(corner, times(on, radius));
    return [0, 0.25, 0.5, 0.75, 1].map((t) =>
      between(between(a, corner, t), between(corner, b, t), t),
    );
  });
}
