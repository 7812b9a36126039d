import type { Finding, Status } from '@/lib/checks';
import { KIND_WORDS } from '@/lib/edits';
import type { LonLat } from '@/lib/geo';
import { isUnit, planeOf, systemOfUnit, type Piece, type Sheet } from '@/lib/layout';
import { rankOf } from '@/components/checks/count-findings';
import { pieceName } from '@/components/drawing/piece-words';
import { middleOf, polarFrom, referenceOf } from './piece-place';

/** One piece as the table lists it. `worst` is the worst the checks say of it. */
export type PieceRow = {
  readonly id: string;
  readonly name: string;
  readonly kind: string;
  readonly system: string;
  readonly bearingDeg: number;
  readonly feet: number;
  readonly at: LonLat;
  readonly worst: Status;
  readonly worstWords: string | null;
};

export function pieceRows(sheet: Sheet, findings: readonly Finding[]): PieceRow[] {
  const { layout, site } = sheet;
  const plane = planeOf(layout);
  const from = referenceOf(layout).at;
  const worst = worstByPiece(findings);
  return [...layout.pieces, ...site.features].map((piece): PieceRow => {
    const middle = middleOf(layout, piece);
    const said = worst.get(piece.id);
    return {
      id: piece.id,
      name: pieceName(sheet, piece),
      kind: KIND_WORDS[piece.kind],
      system: systemWords(piece),
      ...polarFrom(layout, from, middle),
      at: plane.toLonLat(middle),
      worst: said?.status ?? 'n/a',
      worstWords: said && said.status !== 'meets' ? said.message : null,
    };
  });
}

function worstByPiece(findings: readonly Finding[]): Map<string, Finding> {
  const worst = new Map<string, Finding>();
  for (const finding of findings) {
    for (const id of finding.subjects) {
      const before = worst.get(id);
      if (!before || rankOf(finding.status) < rankOf(before.status)) worst.set(id, finding);
    }
  }
  return worst;
}

function systemWords(piece: Piece): string {
  if (piece.kind === 'rod') return piece.system;
  if (piece.kind === 'z-probe' || piece.kind === 'y-probe') {
    return piece.serves?.join(', ') ?? 'all';
  }
  return isUnit(piece) ? systemOfUnit(piece) : '';
}
