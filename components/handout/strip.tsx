import {
  standsWords,
  windFromWords,
  speedWords,
  swingWords,
  downhillWords,
} from '@/components/conditions/condition-words';
import { countFindings } from '@/components/checks/count-findings';
import { liquidWords } from '@/components/title-block/liquid-words';
import { StatusShape } from '@/components/ui/status-mark';
import { STATUS_WORDS } from '@/components/ui/status';
import type { Status } from '@/lib/checks';
import type { LengthUnit, Scale } from '@/lib/draw';
import type { Blank } from './blanks';
import { BlankForm, BlankNumber } from './blank-form';
import type { HandoutInput } from './handout-input';
import { Legend } from './legend';
import { LocalClock, LocalFirstToFail } from './local-words';
import { STRIP_MM } from './page-geometry';
import { PaperDial } from './paper-dial';
import { probeDistances } from './probe-distances';
import { TitleBlock } from './title-block';

type StripProps = {
  input: HandoutInput;
  blanks: readonly Blank[];
  units: LengthUnit;
  scale: Scale;
  heightMm: number;
};

const COUNTED: readonly Status[] = ['not-met', 'not-known', 'caution', 'meets'];

/** The right strip: how far it has come, the wind, the facts, what to fill in, the title block. */
export function Strip({ input, blanks, units, scale, heightMm }: StripProps) {
  const counts = countFindings(input.findings);
  return (
    <div className="strip" style={{ width: `${STRIP_MM}mm`, height: `${heightMm}mm` }}>
      <p className="not-approved">NOT APPROVED</p>
      <ul className="counts">
        {COUNTED.map((status) => (
          <li key={status}>
            <StatusShape status={status} /> <strong>{counts[status]}</strong> {STATUS_WORDS[status]}
          </li>
        ))}
      </ul>
      <p className="strip-part">
        <strong>First to fail:</strong>{' '}
        <LocalFirstToFail first={input.firstToFail} asOf={input.asOf} />
      </p>
      <Weather input={input} />
      <Facts input={input} units={units} />
      <BlanksToFill blanks={blanks} />
      <section className="strip-part rest">
        <h2>Legend</h2>
        <Legend sheet={input.sheet} />
      </section>
      <TitleBlock input={input} units={units} scale={scale} />
    </div>
  );
}

/** A single blank stands here; of several only how many, for they are listed behind. */
function BlanksToFill({ blanks }: { blanks: readonly Blank[] }) {
  const [only, ...others] = blanks;
  if (!only) return null;
  if (others.length > 0) {
    return <h2 className="strip-part">{blanks.length} blanks to fill, listed behind</h2>;
  }
  return (
    <section className="strip-part">
      <h2>1 blank to fill</h2>
      <p className="strip-blank">
        <BlankNumber number={only.number} />
        <span>
          <BlankForm form={only.form} />
        </span>
      </p>
    </section>
  );
}

function Weather({ input }: { input: HandoutInput }) {
  const { conditions } = input.sheet.layout;
  const { values } = input.limits;
  const judged = input.findings.some(
    ({ rule, status }) => rule === 'upwind' && status !== 'not-known' && status !== 'n/a',
  );
  const stands = standsWords(input.arc, conditions.wind, {
    judged,
    calmBelowMph: values.calm_below_mph,
  });
  const wind = [speedWords(conditions.wind, 'mph'), swingWords(conditions.wind)];
  const seen = conditions.wind?.observed_at;
  return (
    <section className="strip-part weather">
      <PaperDial conditions={conditions} arc={input.arc} />
      <div>
        <p>
          <strong>{windFromWords(conditions.wind) ?? 'Wind not known'}</strong>
        </p>
        {conditions.wind && (
          <>
            <p>{wind.filter(Boolean).join(', ') || 'speed and swing not known'}</p>
            <p>
              {seen ? (
                <>
                  seen <LocalClock at={seen} beside={input.asOf} />
                </>
              ) : (
                'time not known'
              )}
            </p>
          </>
        )}
        <p>
          <strong>{[stands.alarm, stands.words].filter(Boolean).join('. ')}</strong>
        </p>
        <p>
          {unbroken(downhillWords(conditions.slope, '%', values.level_below_pct)) ??
            'Slope not known'}
        </p>
      </div>
    </section>
  );
}

/** A figure stays on the line with its unit. */
const unbroken = (words: string | null): string | undefined => words?.replace(' %', '\u00a0%');

function Facts({ input, units }: { input: HandoutInput; units: LengthUnit }) {
  const { layout } = input.sheet;
  const { acceptance } = input.limits;
  const { systems, z, y } = probeDistances(layout, units);
  const facts: readonly (readonly [string, string])[] = [
    ['Liquid', liquidWords(layout.liquid) ?? 'not known'],
    ['Accept below', acceptance ? `${acceptance.max_ohm} Ω` : 'not set'],
    [`Z from ${systems}, ${units}`, z],
    [`Y from ${systems}, ${units}`, y],
  ];
  return (
    <dl className="strip-part facts">
      {facts.map(([name, value]) => (
        <div key={name}>
          <dt>{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}
