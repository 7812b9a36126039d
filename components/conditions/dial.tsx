'use client';

import type { WindArc } from '@/lib/checks';
import type { Conditions } from '@/lib/layout';
import { arcDegrees } from './condition-words';
import { slopeEdit, windEdit } from './condition-edits';
import { arcPath, DIAL, sectorPath, spot } from './dial-geometry';
import { DialHand } from './dial-hand';
import { degreesWords } from './condition-words';
import { useTurn, type Turning } from './use-turn';

const TICKS = Array.from({ length: 36 }, (_, i) => i * 10);

/**
 * Wind and downhill on one compass, with the arc of winds that the layout stands for round it.
 * The wind is a long filled arrow that comes in from the rim; downhill a short open one from the
 * middle outwards.
 */
export function Dial({
  conditions,
  arc,
  stands,
  disabled,
  onClear,
}: {
  conditions: Conditions;
  arc: WindArc | null;
  stands: boolean;
  disabled: boolean;
  onClear: (which: 'wind' | 'slope') => void;
}) {
  const wind = useTurn(
    (before, degrees) => windEdit(before, { from_deg: degrees }),
    (degrees) => `Wind from ${degreesWords(degrees)}`,
  );
  const downhill = useTurn(
    (before, degrees) => slopeEdit(before, { down_deg: degrees }),
    (degrees) => `Downhill to ${degreesWords(degrees)}`,
  );
  return (
    <svg
      viewBox={`${-DIAL.half} ${-DIAL.half} ${2 * DIAL.half} ${2 * DIAL.half}`}
      role="group"
      aria-label="Wind and downhill"
      className="block aspect-square w-full border border-ink bg-paper"
    >
      <Face />
      {arc && (
        <path
          d={arcPath(arc.from_deg, arcDegrees(arc), DIAL.arc)}
          fill="none"
          strokeWidth={DIAL.arcWidth}
          className={stands ? 'stroke-spruce' : 'stroke-ink-soft'}
        />
      )}
      <DownhillHand
        degrees={conditions.slope?.down_deg ?? null}
        turning={downhill}
        disabled={disabled}
        onClear={() => onClear('slope')}
      />
      <WindHand
        degrees={conditions.wind?.from_deg ?? null}
        swing={conditions.wind?.swing_deg ?? null}
        turning={wind}
        disabled={disabled}
        onClear={() => onClear('wind')}
      />
    </svg>
  );
}

function Face() {
  const north = spot(0, DIAL.rim - 20);
  return (
    <g aria-hidden="true" className="pointer-events-none">
      <circle r={DIAL.rim} fill="none" strokeWidth="1.5" className="stroke-ink" />
      {TICKS.map((degrees) => {
        const inner = spot(
          degrees,
          DIAL.rim - (degrees % 90 === 0 ? 9 : degrees % 30 === 0 ? 7 : 4),
        );
        const outer = spot(degrees, DIAL.rim);
        return (
          <line
            key={degrees}
            x1={inner.x}
            y1={inner.y}
            x2={outer.x}
            y2={outer.y}
            strokeWidth={degrees % 30 === 0 ? 1.75 : 1}
            className="stroke-ink"
          />
        );
      })}
      <text
        x={north.x}
        y={north.y}
        textAnchor="middle"
        dominantBaseline="central"
        className="fill-ink text-[17px] font-bold"
      >
        N
      </text>
    </g>
  );
}

type Hand = {
  degrees: number | null;
  turning: Turning;
  disabled: boolean;
  onClear: () => void;
};

function WindHand({ degrees, swing, ...hand }: Hand & { swing: number | null }) {
  const { rim, windTip } = DIAL;
  return (
    <DialHand
      name="Wind from"
      degrees={degrees}
      {...hand}
      grip={<line y1={-rim - 6} y2={-windTip} strokeWidth="52" className="stroke-transparent" />}
      whole={
        <circle
          r={(rim + windTip) / 2}
          fill="none"
          strokeWidth={rim - windTip}
          className="stroke-transparent"
          pointerEvents="stroke"
        />
      }
    >
      {degrees !== null && (
        <>
          {swing !== null && swing > 0 && (
            <path d={sectorPath(-swing, swing * 2, windTip, rim)} className="fill-ink opacity-10" />
          )}
          <line y1={-rim + 1} y2={-windTip - 14} strokeWidth="5" className="stroke-ink" />
          <path
            d={`M0 ${-windTip} L-8.5 ${-windTip - 18} L8.5 ${-windTip - 18} Z`}
            className="fill-ink"
          />
        </>
      )}
      <FocusRing from={-rim - 4} to={-windTip + 4} />
    </DialHand>
  );
}

function DownhillHand({ degrees, ...hand }: Hand) {
  const { hub, downhillTip } = DIAL;
  return (
    <DialHand
      name="Downhill to"
      degrees={degrees}
      {...hand}
      grip={<line y1={8} y2={-downhillTip} strokeWidth="46" className="stroke-transparent" />}
      whole={<circle r={downhillTip} className="fill-transparent" />}
    >
      {degrees === null ? (
        <circle r={hub} className="fill-none stroke-ink-soft" strokeWidth="1.5" />
      ) : (
        <path
          d={`M-2.75 5 V${-downhillTip + 14} H-8 L0 ${-downhillTip} L8 ${-downhillTip + 14} H2.75 V5 Z`}
          strokeWidth="2"
          strokeLinejoin="round"
          className="fill-paper stroke-ink"
        />
      )}
      <FocusRing from={-downhillTip - 3} to={9} />
    </DialHand>
  );
}

/** SVG groups have no outline of their own in every browser. */
function FocusRing({ from, to }: { from: number; to: number }) {
  return (
    <rect
      x={-14}
      y={from}
      width={28}
      height={to - from}
      fill="none"
      strokeWidth="3"
      className="hidden stroke-focus group-focus-visible:block"
    />
  );
}
