import type { Finding, Status } from '@/lib/checks';
import { sheetName } from '@/lib/draw/names';
import { KIND_WORDS } from '@/lib/edits';
import { findPiece, isRun, type Piece, type Sheet } from '@/lib/layout';
import { STATUS_WORDS } from '@/components/ui/status';

/** What a piece is called: "R2", "Casualty vehicle", "jumper C1 to C2". */
export function pieceName(sheet: Sheet, piece: Piece): string {
  const name = sheetName(piece, sheet.layout, sheet.site);
  if (name) return name;
  if (isRun(piece)) {
    return `${KIND_WORDS[piece.kind]} ${endName(sheet, piece.from)} to ${endName(sheet, piece.to)}`;
  }
  if (piece.kind === 'buried-line') return `${piece.utility.replaceAll('-', ' ')} line`;
  return KIND_WORDS[piece.kind];
}

function endName(sheet: Sheet, id: string): string {
  const piece = findPiece(sheet, id);
  if (!piece) return 'nothing';
  return sheetName(piece, sheet.layout, sheet.site) ?? KIND_WORDS[piece.kind];
}

const WORST: readonly Status[] = ['not-met', 'not-known', 'caution', 'meets', 'n/a'];

/** The worst of what the checks say of one piece; null where they say nothing of it. */
export function worstFinding(findings: readonly Finding[], id: string): Finding | null {
  const about = findings.filter((finding) => finding.subjects.includes(id));
  for (const status of WORST) {
    const worst = about.find((finding) => finding.status === status);
    if (worst) return worst;
  }
  return null;
}

/** "R2, rod, not met: 7.3 ft from R1". What meets is not spelled out: one word is enough. */
export function pieceSentence(sheet: Sheet, piece: Piece, worst: Finding | null): string {
  const name = pieceName(sheet, piece);
  const kind = KIND_WORDS[piece.kind];
  const named = name.toLowerCase().includes(kind) ? name : `${name}, ${kind}`;
  if (!worst || worst.status === 'n/a') return named;
  const status = STATUS_WORDS[worst.status];
  return worst.status === 'meets' ? `${named}, ${status}` : `${named}, ${status}: ${worst.message}`;
}
