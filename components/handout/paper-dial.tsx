import { arcDegrees } from '@/components/conditions/condition-words';
import { arcPath, spot } from '@/components/conditions/dial-geometry';
import type { WindArc } from '@/lib/checks';
import type { Conditions } from '@/lib/layout';

const RIM = 78;
const TICKS = Array.from({ length: 36 }, (_, i) => i * 10);

/** North, the wind, downhill, and the arc of winds that the layout stands for; in one ink. */
export function PaperDial({ conditions, arc }: { conditions: Conditions; arc: WindArc | null }) {
  const from = conditions.wind?.from_deg;
  const down = conditions.slope?.down_deg;
  const north = spot(0, RIM - 17);
  return (
    <svg viewBox="-98 -98 196 196" role="img" aria-label="Wind and downhill, north up">
      <circle r={RIM} fill="none" stroke="#000" strokeWidth="1.75" />
      {TICKS.map((degrees) => {
        const [a, b] = [spot(degrees, RIM - (degrees % 90 === 0 ? 10 : 5)), spot(degrees, RIM)];
        return (
          <line key={degrees} x1={a.x} y1={a.y} x2={b.x} y2={b.y} stroke="#000" strokeWidth="1.5" />
        );
      })}
      <text x={north.x} y={north.y + 7} textAnchor="middle" fontSize="21" fontWeight="700">
        N
      </text>
      {arc && (
        <path
          d={arcPath(arc.from_deg, arcDegrees(arc), 90)}
          fill="none"
          stroke="#000"
          strokeWidth="10"
        />
      )}
      {from != null && (
        <g transform={`rotate(${from})`}>
          <path d={`M0 ${-RIM} V-50`} stroke="#000" strokeWidth="5" fill="none" />
          <path d="M0 -32 L-9 -54 L9 -54 Z" />
        </g>
      )}
      {down != null && (
        <path
          transform={`rotate(${down})`}
          d="M-3 6 V-14 H-9 L0 -30 L9 -14 H3 V6 Z"
          fill="#fff"
          stroke="#000"
          strokeWidth="2.25"
          strokeLinejoin="round"
        />
      )}
    </svg>
  );
}
