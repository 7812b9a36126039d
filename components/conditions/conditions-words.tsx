'use client';

import type { ReactNode } from 'react';
import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing } from '@/lib/client/use-drawing';
import {
  downhillWords,
  seenWords,
  soilWords,
  speedWords,
  standsWords,
  swingWords,
  windFromWords,
  type Seen,
  type Stands,
} from './condition-words';
import { NotEntered } from './not-entered';
import { useSpeedUnit, useSteepnessUnit } from './units';

/** What the dial shows, in words: wind, how old it is, what the layout stands for, downhill. */
export function ConditionsWords({ children }: { children?: ReactNode }) {
  const { wind, slope, soil } = useDrawing((s) => s.sheet.layout.conditions);
  const asOf = useDrawing((s) => s.asOf);
  const limits = useDrawing((s) => s.limits.values);
  const arc = useDrawing((s) => s.standsFor);
  const judged = useDrawing((s) => s.findings.some(isHeldToTheWind));
  const canDraw = useDrawing((s) => s.canDraw);
  const [speedUnit] = useSpeedUnit();
  const [steepnessUnit] = useSteepnessUnit();

  const from = windFromWords(wind);
  const speed = speedWords(wind, speedUnit);
  const swing = swingWords(wind);
  const downhill = downhillWords(slope, steepnessUnit, limits.level_below_pct);
  const soilLine = soilWords(soil);
  return (
    <div className="min-w-0 space-y-1.5 leading-snug">
      <div>
        <p className="text-lg font-bold leading-tight">
          {from ?? <NotEntered>Wind not known</NotEntered>}
        </p>
        <p>
          {speed ?? <NotEntered>speed</NotEntered>}
          {speed && swing && ', '}
          {swing ?? <NotEntered>swing</NotEntered>}
        </p>
        {wind?.observed_at ? (
          <SeenLine seen={seenWords(wind.observed_at, asOf, limits.wind_fresh_min)} />
        ) : (
          <NotEntered>when seen</NotEntered>
        )}
      </div>
      {wind?.from_deg == null && canDraw ? (
        <p className="text-sm leading-tight">
          Press the dial: outer ring for where the wind comes from, inner for downhill.
        </p>
      ) : (
        <StandsLine
          stands={standsWords(arc, wind, { judged, calmBelowMph: limits.calm_below_mph })}
        />
      )}
      <div>
        <p>{downhill ?? <NotEntered>Slope not known</NotEntered>}</p>
        <div className="flex flex-wrap items-baseline justify-between gap-x-3">
          {soilLine && <p className="text-ink-soft">{soilLine}</p>}
          {children}
        </div>
      </div>
    </div>
  );
}

/** With one answer to `upwind` there is wind and a source, and so an arc or truly none. */
const isHeldToTheWind = ({ rule, status }: { rule: string; status: string }): boolean =>
  rule === 'upwind' && status !== 'not-known' && status !== 'n/a';

function SeenLine({ seen }: { seen: Seen }) {
  if (seen.fresh === 'fresh') return <p className="text-ink-soft">{seen.words}</p>;
  if (seen.fresh === 'ahead') return <NotEntered>{seen.words}</NotEntered>;
  return (
    <p className="font-bold text-caution">
      <StatusShape status="caution" /> {seen.words}. Look again.
    </p>
  );
}

function StandsLine({ stands: { alarm, words, tone } }: { stands: Stands }) {
  return (
    <div className="leading-tight">
      {alarm && (
        <p className="font-bold text-alarm">
          <StatusShape status="not-met" /> {alarm}
        </p>
      )}
      {words && (
        <p className={tone === 'stands' ? 'font-bold text-spruce' : alarm ? '' : 'font-bold'}>
          {words}
        </p>
      )}
    </div>
  );
}
