import type { Finding, Missing } from '@/lib/checks';
import type { Sheet } from '@/lib/layout';
import { countedSubjects } from './subject-words';

/** What a long run of one rule's met findings comes to, after "12 rods and probes". */
const MET: Record<string, string> = {
  'system-complete': 'with rods',
  'rods-joined': 'each joined into one piece',
  'units-grounded': 'grounded to their own systems',
  'cables-separate': 'touching one system only',
  'systems-apart': 'far enough apart',
  'rods-apart': 'spaced right',
  'outside-hot-zone': 'outside the hot zone',
  upwind: 'upwind',
  uphill: 'uphill',
  'ignition-clear': 'clear of the release',
  'vent-clear': 'clear of the vent',
  'drivable-ground': 'on ground that can be driven',
  'low-ground': 'out of low ground',
  'test-complete': 'with Z, Y and a tester',
  'z-distance': 'with Z far enough',
  'y-distance': 'with Y in its place',
  'y-in-line': 'with Y in line',
  'y-ratio': 'with Y where it reads true',
  'z-far-enough': 'small beside the distance to Z',
  'test-line-clear-of-metal': 'with no metal along the test line',
  'leads-clear': 'clear of the hot zone',
  'clear-of-buried-lines': 'clear of buried lines',
  'clear-of-overhead': 'clear of overhead lines',
  'cables-reach': 'reached by the kit',
};

/** Rules whose subjects aren't pieces or systems say the whole of it. */
const MET_WHOLE: Record<string, (count: number) => string> = {
  'buried-lines-known': (count) => `${count} owners have answered`,
  'locates-current': (count) => `${count} locate tickets current`,
  'kit-covers': (count) => `${count} kinds of item, enough in the kit`,
};

export const MISSING_WORDS: Record<Missing, string> = {
  wind: 'wind not entered',
  slope: 'slope not entered',
  source: 'no release point drawn',
  'hot-zone': 'no hot zone drawn',
  vent: 'no vent drawn',
  liquid: 'liquid not entered',
  acceptance: 'acceptance not set',
  kit: 'no kit chosen',
  'owner-answer': 'owner has not answered',
  locate: 'no locate ticket',
  overhead: 'overhead lines not looked for',
  voltage: 'voltage not known',
  'buried-lines': 'buried lines not drawn',
  'test-line': 'no Z or Y drawn',
  rods: 'no rods drawn',
};

export function foldWords(
  sheet: Sheet,
  title: string,
  findings: readonly [Finding, ...Finding[]],
): string {
  const [first] = findings;
  const subjects = countedSubjects(sheet, findings);
  if (first.status === 'meets') {
    const whole = MET_WHOLE[first.rule];
    if (whole) return whole(findings.length);
    const predicate = MET[first.rule];
    return predicate ? `${subjects} ${predicate}` : `${title}: ${subjects}`;
  }
  if (first.status === 'not-known') {
    const missing = first.missing.map((what) => MISSING_WORDS[what]).join(', ');
    if (missing) return `${title}, ${subjects}: ${missing}`;
    const said = [...new Set(findings.map(({ message }) => lowerFirst(message)))];
    return said.length <= MOST_SAID
      ? `${title}: ${said.join(', ')}`
      : `${title}, ${subjects}: not known`;
  }
  return `${title}, ${subjects}`;
}

/** More reasons than these are read one by one, by opening the line. */
const MOST_SAID = 2;

const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
