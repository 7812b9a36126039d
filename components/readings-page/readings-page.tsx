import { CAUTION_WORDS, FIELD_CAUTION_WORDS } from '@/components/ui/caution';
import { SYSTEMS, UNIT_WORDS } from '@/lib/layout';
import { DEFAULT_LIMIT_VALUES as LIMITS, TRUE_POINT_RATIO } from '@/lib/limits';
import { Grid } from './grid';
import { Blank, BlankRow, TickBox } from './blank';

const TRUE_POINT_PCT = Math.round(TRUE_POINT_RATIO.value * 100);

const READINGS = [
  'System',
  'Rods × length',
  'Z to system, ft',
  'Y to system, ft',
  'Reading, Ω',
  'Y nearer, ft',
  'Reading, Ω',
  'Y farther, ft',
  'Reading, Ω',
  'Steady?',
  'Time',
  'Read by',
] as const;

/** One sheet, sized to fit both letter and A4 inside 10 mm margins. */
export function ReadingsPage() {
  return (
    <section
      aria-label="The page to print"
      className="readings-page border border-rule text-sm leading-tight print:border-0 print:text-[9pt]"
    >
      <header className="flex flex-wrap items-baseline justify-between gap-x-6 border-b-2 border-ink px-2 py-1.5">
        <h2 className="text-lg font-bold print:text-[13pt]">Readings of three ground systems</h2>
        <p className="font-bold">NOT A RECORD OF APPROVAL</p>
      </header>
      <BlankRow>
        <Blank wide>Place</Blank>
        <Blank>Incident no.</Blank>
        <Blank>Date</Blank>
        <Blank>Liquid, UN</Blank>
      </BlankRow>
      <BlankRow>
        <Blank>Wind from °</Blank>
        <Blank>Speed, swing ±</Blank>
        <Blank>Seen at</Blank>
        <Blank>Downhill to °</Blank>
        <Blank>Grade %</Blank>
        <Blank>Soil</Blank>
      </BlankRow>
      <BlankRow>
        <Blank wide>Meter, serial no.</Blank>
        <Blank>Calibrated until</Blank>
        <Blank>Battery</Blank>
        <Blank>Checker reads</Blank>
        <Blank>Earth noise</Blank>
      </BlankRow>
      <div className="relative border-b border-ink p-1">
        <Grid across={38} down={19} />
        <div className="mt-1 flex flex-wrap gap-x-6 gap-y-1 px-1">
          <span>One square = ______ ft</span>
          <span>North: draw an arrow</span>
          <span>
            Measured from (two fixed points): ____________________ and ____________________
          </span>
        </div>
      </div>
      <div
        className="overflow-x-auto print:overflow-visible"
        tabIndex={0}
        role="region"
        aria-label="Readings"
      >
        <table className="w-full table-fixed border-collapse max-md:min-w-[56rem] print:min-w-0">
          <caption className="px-2 py-1 text-left">
            Read each system alone, before anything is connected to it. Y stands on the line from
            the system to Z, near {TRUE_POINT_PCT} % of the way; then a tenth of the Z distance
            nearer and farther. Usual: Z {LIMITS.z_min_ft} to {LIMITS.z_max_ft} ft, Y{' '}
            {LIMITS.y_min_ft} to {LIMITS.y_max_ft} ft. A reading stands when the three differ
            little; if they do not, move Z out or turn the line.
          </caption>
          <thead>
            <tr>
              {READINGS.map((title, index) => (
                <th
                  key={`${title}${index}`}
                  scope="col"
                  className="border border-ink px-1 py-0.5 text-left align-bottom font-semibold"
                >
                  {title}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {SYSTEMS.map((system) =>
              [1, 2].map((reading) => (
                <tr key={`${system}${reading}`} className="h-9 print:h-[8mm]">
                  {reading === 1 && (
                    <th
                      scope="rowgroup"
                      rowSpan={2}
                      className="border border-ink px-1 text-left align-middle"
                    >
                      <span className="block text-lg leading-none print:text-[13pt]">{system}</span>
                      <span className="font-normal">{UNIT_WORDS[system]}</span>
                    </th>
                  )}
                  {READINGS.slice(1).map((title, index) => (
                    <td key={`${title}${index}`} className="border border-ink" />
                  ))}
                </tr>
              )),
            )}
          </tbody>
        </table>
      </div>
      <BlankRow>
        <Blank>Accept below, Ω</Blank>
        <Blank wide>Set by (local authority)</Blank>
        <Blank>
          C accepted <TickBox /> at
        </Blank>
        <Blank>
          R accepted <TickBox /> at
        </Blank>
        <Blank>
          P accepted <TickBox /> at
        </Blank>
      </BlankRow>
      <BlankRow>
        <Blank wide>Readings taken by</Blank>
        <Blank wide>Written down by</Blank>
        <Blank wide>Safety officer</Blank>
      </BlankRow>
      <footer className="px-2 py-1.5 font-semibold">
        {CAUTION_WORDS} {FIELD_CAUTION_WORDS}
      </footer>
    </section>
  );
}
