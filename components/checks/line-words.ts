import type { Finding } from '@/lib/checks';
import { pieceName } from '@/components/drawing/piece-words';
import { findPiece, type Sheet } from '@/lib/layout';

/** Names of the subjects as people say them; systems, classes and tickets are names already. */
export const subjectNames = (sheet: Sheet, { subjects }: Finding): string[] =>
  subjects.map((subject) => {
    const piece = findPiece(sheet, subject);
    return piece ? pieceName(sheet, piece) : subject.replaceAll('-', ' ');
  });

/** The finding's sentence, with what it is about put before it where it doesn't say so itself. */
export function lineWords(sheet: Sheet, finding: Finding): string {
  const said = finding.message.toLowerCase();
  const unsaid = subjectNames(sheet, finding).filter((name) => !said.includes(name.toLowerCase()));
  return unsaid.length === 0 ? finding.message : `${unsaid.join(' to ')}: ${finding.message}`;
}

/** The piece that a finding is about, to select it on the plan; null where it has none. */
export function pieceOf(sheet: Sheet, { subjects }: Finding): string | null {
  // Of two, the later is the one that remedies move.
  return subjects.findLast((subject) => findPiece(sheet, subject) !== null) ?? null;
}
