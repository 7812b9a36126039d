import type { Allowed, Finding, MeasureUnit } from '@/lib/checks';

/** Where things stand along a gauge: fractions of its width, 0 at the left end, 1 at the right. */
export type GaugeScale = {
  readonly from: number;
  readonly to: number;
  readonly bandStart: number;
  readonly bandEnd: number;
  readonly mark: number;
  readonly ends: readonly GaugeEnd[];
};

export type GaugeEnd = {
  readonly at: number;
  readonly value: number;
  /** Which way the number grows from its place, so that it stays on the line and off the other. */
  readonly anchor: 'start' | 'middle' | 'end';
};

/** Two numbers nearer than this would run into each other in the narrowest strip. */
const CROWDED = 0.16;
const NEAR_AN_EDGE = 0.06;

/** A half turn is as far as two directions can be apart: the line for angles never moves. */
const MOST_DEGREES = 180;

/** Counts have no scale worth drawing: one rod of one is not a place on a line. */
const drawn = (unit: MeasureUnit): boolean => unit !== 'count';

/** The scale of a finding's gauge; null where there is nothing measured, or nothing to hold it to. */
export function gaugeScale({ measured, allowed }: Finding): GaugeScale | null {
  if (!measured || !allowed || !drawn(measured.unit)) return null;
  if (allowed.min === null && allowed.max === null) return null;
  if (!Number.isFinite(measured.value)) return null;

  const { from, to } = lineFor(measured.value, measured.unit, allowed);
  const along = (value: number): number => (value - from) / (to - from);
  const bandStart = allowed.min === null ? 0 : along(allowed.min);
  const bandEnd = allowed.max === null ? 1 : along(allowed.max);
  return {
    from,
    to,
    bandStart,
    bandEnd,
    mark: along(measured.value),
    ends: endsOf(allowed, along),
  };
}

function lineFor(
  value: number,
  unit: MeasureUnit,
  { min, max }: Allowed,
): { from: number; to: number } {
  if (unit === 'deg') return { from: 0, to: MOST_DEGREES };
  const limits = [min, max].filter((limit) => limit !== null);
  const least = Math.min(0, value, ...limits);
  // Room beyond the band, so that a value outside it is seen to be outside.
  const most = Math.max(value * 1.1, (max ?? 0) * 1.25, max === null ? (min ?? 0) * 2 : 0);
  return { from: least < 0 ? -roundUp(-least * 1.1) : 0, to: roundUp(Math.max(most, 1e-6)) };
}

/** Up to the next round number, so that the line jumps seldom while a piece is dragged. */
function roundUp(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value));
  const step = [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10].find(
    (s) => s * power >= value * (1 - 1e-9),
  );
  return (step ?? 10) * power;
}

function endsOf({ min, max }: Allowed, along: (value: number) => number): GaugeEnd[] {
  const crowded = min !== null && max !== null && along(max) - along(min) < CROWDED;
  const end = (value: number, whenCrowded: 'start' | 'end'): GaugeEnd => {
    const at = along(value);
    if (at < NEAR_AN_EDGE) return { at, value, anchor: 'start' };
    if (at > 1 - NEAR_AN_EDGE) return { at, value, anchor: 'end' };
    return { at, value, anchor: crowded ? whenCrowded : 'middle' };
  };
  return [...(min === null ? [] : [end(min, 'end')]), ...(max === null ? [] : [end(max, 'start')])];
}
