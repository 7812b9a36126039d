import type { LengthUnit, Scale } from '@/lib/draw';
import type { HandoutInput } from './handout-input';
import { LocalDateTime } from './local-words';
import { paperBar } from './paper-scale-bar';

const BAR_MOST_MM = 50;
const BAR_PARTS = 4;

export function TitleBlock({
  input,
  units,
  scale,
}: {
  input: HandoutInput;
  units: LengthUnit;
  scale: Scale;
}) {
  const { name, planned_at: planned } = input.sheet.layout;
  return (
    <section className="title-block">
      <h2>{name ?? 'Not named yet'}</h2>
      <dl>
        <Cell name="Site">{input.siteName}</Cell>
        <Cell name="Agency">{input.agencyName}</Cell>
        <Cell name="Drawn by">{input.drawnBy ?? '–'}</Cell>
        <Cell name="Checked by">not checked</Cell>
        <Cell name="Revision">draft, version {input.version}</Cell>
        <Cell name="Planned start">{planned ? <LocalDateTime at={planned} /> : 'not planned'}</Cell>
      </dl>
      <ScaleBar units={units} scale={scale} />
    </section>
  );
}

const Cell = ({ name, children }: { name: string; children: React.ReactNode }) => (
  <div>
    <dt>{name}</dt>
    <dd>{children}</dd>
  </div>
);

/** Bar and ratio are made from the same figure, so that they can't disagree. */
function ScaleBar({ units, scale }: { units: LengthUnit; scale: Scale }) {
  const { length, mm } = paperBar(scale, units, BAR_MOST_MM);
  const part = mm / BAR_PARTS;
  const marks = [0, length / 2, length];
  return (
    <div className="paper-bar">
      <div className="bar-figures" style={{ width: `${mm}mm` }} aria-hidden="true">
        {marks.map((value, i) => (
          <span key={value} style={{ left: `${(mm / 2) * i}mm` }}>
            {value}
            {i === 2 && ` ${units}`}
          </span>
        ))}
      </div>
      <svg
        role="img"
        aria-label={`Scale bar of ${length} ${units}`}
        width={`${mm}mm`}
        height="2.2mm"
        viewBox={`0 0 ${mm} 2.2`}
      >
        {Array.from({ length: BAR_PARTS }, (_, i) => (
          <rect
            key={i}
            x={i * part}
            y="0.15"
            width={part}
            height="1.9"
            fill={i % 2 === 0 ? '#000' : '#fff'}
            stroke="#000"
            strokeWidth="0.3"
          />
        ))}
      </svg>
      <p>
        <strong>{scale.words}</strong>
        {units === 'ft' && ` (1:${scale.ratio})`} at full size
      </p>
    </div>
  );
}
