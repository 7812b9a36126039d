import { PlanShapes } from '@/components/plan/plan-svg';
import {
  borderTicks,
  drawSheet,
  PX_PER_MM,
  windowProjector,
  type Bounds,
  type LengthUnit,
  type SizeMm,
} from '@/lib/draw';
import type { Vec } from '@/lib/geo';
import type { HandoutInput } from './handout-input';
import { TICKS_MM } from './page-geometry';

const TICK_PX = 5;
const LABEL_PX = 13;
/** A label nearer to a corner than this would stand out over it. */
const LABEL_ROOM_PX = 22;

/**
 * The plan to scale in its frame, with the distances from the zero along two sides. Its own unit
 * is 1/96 inch of paper, so that what CSS calls mm and what the scale says agree exactly.
 */
export function PlanDrawing({
  input,
  units,
  plan,
  seen,
  pxPerMetre,
  zero,
}: {
  input: HandoutInput;
  units: LengthUnit;
  plan: SizeMm;
  seen: Bounds;
  pxPerMetre: number;
  /** Where the border's distances are counted from. */
  zero: Vec;
}) {
  const inset = TICKS_MM * PX_PER_MM;
  const [width, height] = [plan.widthMm * PX_PER_MM, plan.heightMm * PX_PER_MM];
  const view = { metresPerPx: 1 / pxPerMetre, bounds: seen };
  const list = drawSheet({
    sheet: input.sheet,
    limits: input.limits,
    findings: input.findings,
    units,
    inkOnly: true,
    view,
  });
  const projector = windowProjector(seen, pxPerMetre);
  const ticks = borderTicks(view, units, zero).filter(({ edge, at }) => {
    const { x, y } = projector.toPx({ x: at, y: at });
    const along = edge === 'top' ? x : y;
    return along > LABEL_ROOM_PX && along < (edge === 'top' ? width : height) - LABEL_ROOM_PX;
  });
  return (
    <svg
      role="img"
      aria-label="The plan to scale"
      width={`${plan.widthMm + TICKS_MM}mm`}
      height={`${plan.heightMm + TICKS_MM}mm`}
      viewBox={`0 0 ${width + inset} ${height + inset}`}
      className="plan-drawing"
    >
      <svg x={inset} y={inset} width={width} height={height} overflow="hidden">
        <PlanShapes list={list} projector={projector} theme="print" />
      </svg>
      <rect
        x={inset}
        y={inset}
        width={width}
        height={height}
        fill="none"
        stroke="#000"
        strokeWidth="2.5"
      />
      <g fontSize={LABEL_PX} textAnchor="middle" stroke="none">
        {ticks.map(({ edge, at, label }) =>
          edge === 'top' ? (
            <Tick key={`${edge}${label}`} x={inset + projector.toPx({ x: at, y: 0 }).x} y={inset}>
              <path d={`M0 0V${-TICK_PX}`} stroke="#000" />
              <text y={-TICK_PX - 4}>{label}</text>
            </Tick>
          ) : (
            <Tick key={`${edge}${label}`} x={inset} y={inset + projector.toPx({ x: 0, y: at }).y}>
              <path d={`M0 0H${-TICK_PX}`} stroke="#000" />
              <text transform={`translate(${-TICK_PX - 4} 0) rotate(-90)`}>{label}</text>
            </Tick>
          ),
        )}
      </g>
    </svg>
  );
}

const Tick = ({ x, y, children }: { x: number; y: number; children: React.ReactNode }) => (
  <g transform={`translate(${x} ${y})`}>{children}</g>
);
