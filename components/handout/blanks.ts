import { lineWords } from '@/components/checks/line-words';
import type { Finding, Missing } from '@/lib/checks';
import type { Sheet } from '@/lib/layout';

/** Something not known, to be written in by hand: `_` stands for a line, `[]` for a box to tick. */
export type Blank = {
  readonly number: number;
  readonly form: string;
  /** Findings that wait for it. */
  readonly findings: readonly string[];
};

/** What has to be entered, once for the sheet or once for each subject. */
const FORMS: Readonly<Record<Missing, { readonly form: string; readonly each: boolean }>> = {
  wind: { form: 'Wind from _° at _ mph, swings ± _°, seen at _', each: false },
  slope: { form: 'Downhill to _°, steepness _ %', each: false },
  source: { form: 'Release point: _ ft from _, bearing _°', each: false },
  'hot-zone': { form: 'Hot zone: _ ft round _, set by _', each: false },
  vent: { form: 'Vent of the receiving vehicle: _', each: false },
  liquid: { form: 'Liquid _ UN _ flash point _ °F', each: false },
  acceptance: { form: 'Accept below _ Ω, set by _', each: false },
  kit: { form: 'Kit carried: _', each: false },
  'owner-answer': { form: '_ answered at _ [] marked [] clear, by _', each: true },
  locate: { form: 'Locate ticket _ starts _ valid until _', each: false },
  overhead: { form: 'Overhead lines [] none known at _ [] seen, where _', each: false },
  voltage: { form: 'Voltage of the overhead line _ V, says _', each: true },
  'buried-lines': { form: 'Buried lines along the test line: _', each: false },
  'test-line': { form: 'Z and Y placed at _', each: true },
  rods: { form: 'Rods driven at _', each: true },
};

/** One blank for everything that is not known, however many checks wait for it. */
export function blanksOf(sheet: Sheet, findings: readonly Finding[]): Blank[] {
  const byKey = new Map<string, { form: string; findings: string[] }>();
  for (const finding of findings) {
    if (finding.status !== 'not-known') continue;
    for (const { key, form } of askedBy(sheet, finding)) {
      const blank = byKey.get(key) ?? { form, findings: [] };
      blank.findings.push(finding.id);
      byKey.set(key, blank);
    }
  }
  return [...byKey.values()].map((blank, i) => ({ number: i + 1, ...blank }));
}

function askedBy(sheet: Sheet, finding: Finding): { key: string; form: string }[] {
  const [subject = ''] = finding.subjects;
  if (finding.missing.length === 0) {
    const { message } = finding;
    // Every check says of a unit that isn't drawn that it isn't: that is one blank.
    return NOT_DRAWN.test(message)
      ? [{ key: message, form: `${message}. It stands _ ft from _, bearing _°, heading _°` }]
      : [{ key: finding.id, form: `${lineWords(sheet, finding)}: _` }];
  }
  return finding.missing.map((what) => {
    const { form, each } = FORMS[what];
    if (!each) return { key: what, form };
    const key = `${what} ${subject}`;
    if (what === 'owner-answer') {
      return { key, form: form.replace('_', capital(subject.replaceAll('-', ' '))) };
    }
    return { key, form: `${lineWords(sheet, finding)}. ${form}` };
  });
}

const NOT_DRAWN = /is not drawn$/;
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
