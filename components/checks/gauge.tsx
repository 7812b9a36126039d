import type { Finding } from '@/lib/checks';
import { STATUS_INK } from '@/components/ui/status';
import { StatusShape } from '@/components/ui/status-mark';
import { gaugeScale, type GaugeEnd } from './gauge-scale';
import { limitNumber } from './measure-words';

const percent = (fraction: number): string =>
  `${Math.round(Math.min(1, Math.max(0, fraction)) * 10_000) / 100}%`;

const PLACE: Record<GaugeEnd['anchor'], string> = {
  start: '',
  middle: '-translate-x-1/2',
  end: '-translate-x-full',
};

/**
 * A number line with the allowed band and the ends of it numbered; the status shape stands on it
 * as the tick. It repeats what the line says in words, so it is hidden from screen readers.
 */
export function Gauge({ finding }: { finding: Finding }) {
  const scale = gaugeScale(finding);
  if (!scale) return null;
  const { bandStart, bandEnd, mark, ends } = scale;
  const ink = STATUS_INK[finding.status];
  return (
    <div aria-hidden="true" className="relative ml-6 mr-1 h-9 select-none">
      <span className="absolute inset-x-0 top-[7px] h-[2px] bg-rule" />
      <span
        className="absolute top-[3px] h-[10px] border border-spruce bg-spruce-wash"
        style={{ left: percent(bandStart), right: percent(1 - bandEnd) }}
      />
      <span
        className={`absolute top-0 -translate-x-1/2 leading-none ${ink}`}
        style={{ left: percent(mark) }}
      >
        <span className="block size-4 bg-[radial-gradient(circle,var(--paper)_60%,transparent_62%)]">
          <StatusShape status={finding.status} size={16} />
        </span>
      </span>
      {ends.map((end) => (
        <span
          key={end.value}
          className={`absolute top-4 text-sm leading-tight text-ink-soft ${PLACE[end.anchor]}`}
          style={{ left: percent(end.at) }}
        >
          {limitNumber(end.value)}
        </span>
      ))}
    </div>
  );
}
