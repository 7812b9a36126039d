import { isUnit, nameOf, piecesOf, type Layout, type Piece, type SiteGround } from '../layout';

/** What a piece is called on the sheet; null where its own words along it say enough. */
export function sheetName(piece: Piece, layout: Layout, site: SiteGround): string | null {
  if (piece.label && piece.kind !== 'fixed-point') return piece.label;
  switch (piece.kind) {
    case 'rod':
      return nameOf(piece);
    case 'z-probe':
      return piecesOf(layout.pieces, 'z-probe').length > 1 && piece.serves
        ? `Z–${piece.serves.join('')}`
        : 'Z';
    case 'y-probe':
      return piece.serves ? `Y–${piece.serves.join('')}` : 'Y';
    case 'tester':
      return 'Tester';
    case 'release-point':
      return 'Leak';
    case 'pool':
      return 'Pool';
    case 'vent':
      return 'Vent';
    case 'fixed-point':
      return fixedPointName(piece, site);
    case 'note':
      return piece.text ?? null;
    default:
      return isUnit(piece) ? capital(nameOf(piece)) : null;
  }
}

/** F1, F2 … in the order drawn unless labelled, with its own name behind. */
function fixedPointName(piece: Piece & { kind: 'fixed-point' }, site: SiteGround): string {
  const place = piecesOf(site.features, 'fixed-point').findIndex((p) => p.id === piece.id) + 1;
  const number = piece.label ?? `F${place}`;
  if (!piece.name) return number;
  return piece.name.startsWith(number) ? piece.name : `${number} ${piece.name}`;
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
