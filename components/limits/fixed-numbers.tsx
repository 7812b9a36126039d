import {
  BURIED_REPORT_WITHIN_FT,
  DRAWN_WITHIN_FT,
  OVERHEAD_CLEARANCE,
  TRUE_POINT_RATIO,
  UNKNOWN_DIAMETER_IN,
  type Backing,
} from '@/lib/limits';
import { BackingWords } from './backing-words';

const FIXED: readonly { title: string; value: string; backing: Backing }[] = [
  {
    title: 'Where the reading is true in even soil, part of the way to Z',
    value: `${TRUE_POINT_RATIO.value}`,
    backing: TRUE_POINT_RATIO,
  },
  {
    title: 'Spacing is met within, the drawing’s own resolution',
    value: `${DRAWN_WITHIN_FT.value} ft`,
    backing: DRAWN_WITHIN_FT,
  },
  {
    title: 'Diameter taken for a buried line whose own is not known',
    value: `${UNKNOWN_DIAMETER_IN.value} in`,
    backing: UNKNOWN_DIAMETER_IN,
  },
  {
    title: 'Buried lines are reported within',
    value: `${BURIED_REPORT_WITHIN_FT.value} ft`,
    backing: BURIED_REPORT_WITHIN_FT,
  },
];

/** Numbers that no agency sets: a regulation's table, or the drawing's own resolution. */
export function FixedNumbers() {
  const { rows, unknownDrawnFeet } = OVERHEAD_CLEARANCE;
  return (
    <section aria-labelledby="fixed-numbers" className="mt-8 min-w-0">
      <h2 id="fixed-numbers" className="border-b-2 border-ink text-lg font-bold">
        Numbers nobody sets here
      </h2>
      <dl>
        {FIXED.map((row) => (
          <div
            key={row.title}
            className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-6 border-b border-rule-faint py-2 md:grid-cols-[minmax(0,2fr)_9rem_minmax(0,3fr)]"
          >
            <dt className="font-semibold">{row.title}</dt>
            <dd className="whitespace-nowrap text-right text-lg font-bold leading-6">
              {row.value}
            </dd>
            <dd className="text-ink-soft max-md:col-span-2">
              <BackingWords backing={row.backing} />
            </dd>
          </div>
        ))}
      </dl>
      <h3 className="mt-6 border-b border-ink font-bold">Clearance from overhead lines</h3>
      <p className="py-2 text-ink-soft">
        <BackingWords backing={OVERHEAD_CLEARANCE} />A line of unknown voltage is drawn at{' '}
        {unknownDrawnFeet} ft and stays not known; above the table only its owner can say.
      </p>
      <table className="w-full max-w-md border-collapse text-left">
        <thead className="text-sm text-ink-soft">
          <tr className="border-b border-rule">
            <th scope="col" className="py-1 font-normal">
              Voltage up to and with, kV
            </th>
            <th scope="col" className="py-1 text-right font-normal">
              Keep away, ft
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.upToVolts} className="border-b border-rule-faint">
              <th scope="row" className="py-1.5 font-normal">
                {row.upToVolts / 1000}
              </th>
              <td className="py-1.5 text-right text-lg font-bold">{row.feet}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
