import { scaleBarLength } from './scale-bar-length';

const MOST_PX = 168;
const PARTS = [0, 1, 2, 3];

/** How long a stretch of ground is on the screen at this moment. */
export function ScaleBar({ metresPerPx }: { metresPerPx: number }) {
  const bar = scaleBarLength(metresPerPx, MOST_PX);
  if (!bar) return null;
  const { feet, px } = bar;
  const number = (value: number): string => String(Number(value.toPrecision(6)));
  return (
    <div role="img" aria-label={`Scale bar, ${number(feet)} feet`} className="px-1">
      <div className="relative h-5 text-sm leading-tight" style={{ width: px }}>
        <span className="absolute left-0">0</span>
        <span className="absolute left-1/2 -translate-x-1/2">{number(feet / 2)}</span>
        <span className="absolute right-0 whitespace-nowrap">{number(feet)} ft</span>
      </div>
      <svg width={px} height="9" className="block overflow-visible">
        {PARTS.map((part) => (
          <rect
            key={part}
            x={(part * px) / 4}
            y="0.75"
            width={px / 4}
            height="7.5"
            strokeWidth="1.5"
            className={`stroke-ink ${part % 2 === 0 ? 'fill-ink' : 'fill-paper'}`}
          />
        ))}
      </svg>
    </div>
  );
}
