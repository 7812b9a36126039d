import type { Finding } from '@/lib/checks';
import { findPiece, type Kind, type Sheet } from '@/lib/layout';

/** What pieces are called when several are counted together: one word, many words. */
const COUNTED: Partial<Record<Kind, readonly [string, string]>> = {
  rod: ['rod', 'rods'],
  'z-probe': ['probe', 'probes'],
  'y-probe': ['probe', 'probes'],
  tester: ['tester', 'testers'],
  'casualty-vehicle': ['unit', 'units'],
  'receiving-vehicle': ['unit', 'units'],
  pump: ['unit', 'units'],
  jumper: ['jumper', 'jumpers'],
  'ground-cable': ['cable', 'cables'],
  'bond-cable': ['cable', 'cables'],
  'test-lead': ['test lead', 'test leads'],
  hose: ['hose', 'hoses'],
};

const SYSTEM = /^[CRP]$/;
const MOST_WORDS = 3;

/** "12 rods and probes", "3 systems", "3 pairs of systems", "6 pairs of rods", "5 lines". */
export function countedSubjects(sheet: Sheet, findings: readonly Finding[]): string {
  const count = findings.length;
  const words = [...new Set(findings.map((finding) => subjectWord(sheet, finding, count)))];
  const named = words.length > MOST_WORDS ? ['pieces'] : words;
  return `${count} ${listed(named)}`;
}

function subjectWord(sheet: Sheet, { subjects }: Finding, count: number): string {
  const [first, second] = subjects;
  if (first === undefined) return count === 1 ? 'answer' : 'answers';
  const one = wordOf(sheet, first);
  if (second === undefined) return count === 1 ? one[0] : one[1];
  const other = wordOf(sheet, second);
  if (one[1] === other[1]) return `${count === 1 ? 'pair' : 'pairs'} of ${one[1]}`;
  return count === 1 ? one[0] : one[1];
}

function wordOf(sheet: Sheet, subject: string): readonly [string, string] {
  const piece = findPiece(sheet, subject);
  if (piece) return COUNTED[piece.kind] ?? ['piece', 'pieces'];
  return SYSTEM.test(subject) ? ['system', 'systems'] : ['line', 'lines'];
}

export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
}
