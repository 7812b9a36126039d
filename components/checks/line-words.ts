import type { Finding } from '@/lib/checks';
import { pieceName } from '@/components/drawing/piece-words';
import { findPiece, nameOf, type Sheet } from '@/lib/layout';

/** Names of the subjects as people say them; systems, classes and tickets are names already. */
export const subjectNames = (sheet: Sheet, { subjects }: Finding): string[] =>
  subjects.map((subject) => {
    const piece = findPiece(sheet, subject);
    return piece ? pieceName(sheet, piece) : subject.replaceAll('-', ' ');
  });

/**
 * The finding's sentence, with what it is about put before it where it doesn't say so itself. A
 * sentence that begins with the bare kind ("Jumper needs 5 ft") gets its full name instead.
 */
export function lineWords(sheet: Sheet, finding: Finding): string {
  const { message } = finding;
  const said = bare(message);
  const unsaid = subjectNames(sheet, finding).filter((name) => !said.includes(bare(name)));
  const [name] = unsaid;
  if (name === undefined) return message;
  const piece = findPiece(sheet, finding.subjects[0] ?? '');
  const called = piece && nameOf(piece);
  if (called && message.toLowerCase().startsWith(`${called.toLowerCase()} `)) {
    return capital(name) + message.slice(called.length);
  }
  return `${unsaid.map(capital).join(' to ')}: ${message}`;
}

/** Letters and figures only: a name is said however it is spaced. */
const bare = (text: string): string =>
  ` ${text
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()} `;

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** The piece that a finding is about, to select it on the plan; null where it has none. */
export function pieceOf(sheet: Sheet, { subjects }: Finding): string | null {
  // Of two, the later is the one that remedies move.
  return subjects.findLast((subject) => findPiece(sheet, subject) !== null) ?? null;
}
