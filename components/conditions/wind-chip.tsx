'use client';

import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing } from '@/lib/client/use-drawing';
import { degreesWords, inArc, speedWords } from './condition-words';
import { useSpeedUnit } from './units';

/** The wind in a corner of the plan, for a screen too small for the dial. */
export function WindChip() {
  const wind = useDrawing((s) => s.sheet.layout.conditions.wind);
  const arc = useDrawing((s) => s.standsFor);
  const [unit] = useSpeedUnit();
  const from = wind?.from_deg ?? null;
  const stands = arc !== null && from !== null && inArc(from, arc);
  return (
    <div className="flex items-center gap-2 border border-rule bg-paper px-3 py-1.5 leading-tight">
      {from === null ? (
        <StatusShape status="not-known" size={20} />
      ) : (
        <svg viewBox="-20 -20 40 40" width="34" height="34" aria-hidden="true">
          <g transform={`rotate(${from})`}>
            <line y1="-18" y2="4" strokeWidth="3" className="stroke-ink" />
            <path d="M0 18 L-6 3 L6 3 Z" className="fill-ink" />
          </g>
        </svg>
      )}
      <p>
        <strong className="block text-lg leading-tight">
          {from === null ? 'Wind not known' : degreesWords(from)}
        </strong>
        <span>{speedWords(wind, unit) ?? 'speed not known'}</span>
        {from !== null && arc !== null && !stands && (
          <span className="block font-bold text-alarm">Does not stand now</span>
        )}
      </p>
    </div>
  );
}
