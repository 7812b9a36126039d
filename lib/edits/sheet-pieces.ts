import { findPiece, isSiteKind, type LayoutPiece, type Piece, type Sheet } from '../layout';
import type { SiteFeature } from '../layout';
import { EditError } from './types';

/** Changes to the lists of pieces. Whichever of layout and site has no change keeps its identity. */

export function requirePiece(sheet: Sheet, id: string): Piece {
  const piece = findPiece(sheet, id);
  if (!piece) throw new EditError('That piece is no longer on the drawing.', id);
  return piece;
}

/** Puts changed pieces in the places of those with their ids. */
export function withPieces(sheet: Sheet, changed: ReadonlyMap<string, Piece>): Sheet {
  const ofSite = [...changed.values()].filter((piece) => isSiteKind(piece.kind)).length;
  const swap = <P extends Piece>(pieces: P[]): P[] =>
    pieces.map((piece) => (changed.get(piece.id) as P | undefined) ?? piece);
  // A site may hold tens of thousands of lines: they are not walked while a rod is dragged.
  return withLists(
    sheet,
    ofSite < changed.size ? swap(sheet.layout.pieces) : sheet.layout.pieces,
    ofSite > 0 ? swap(sheet.site.features) : sheet.site.features,
  );
}

export function withAdded(sheet: Sheet, added: readonly Piece[]): Sheet {
  const site = added.filter((piece): piece is SiteFeature => isSiteKind(piece.kind));
  const layout = added.filter((piece): piece is LayoutPiece => !isSiteKind(piece.kind));
  return withLists(
    sheet,
    layout.length > 0 ? [...sheet.layout.pieces, ...layout] : sheet.layout.pieces,
    site.length > 0 ? [...sheet.site.features, ...site] : sheet.site.features,
  );
}

export function withoutPieces(sheet: Sheet, gone: ReadonlySet<string>): Sheet {
  const keep = <P extends Piece>(pieces: P[]): P[] =>
    pieces.some((piece) => gone.has(piece.id))
      ? pieces.filter((piece) => !gone.has(piece.id))
      : pieces;
  return withLists(sheet, keep(sheet.layout.pieces), keep(sheet.site.features));
}

function withLists(sheet: Sheet, pieces: LayoutPiece[], features: SiteFeature[]): Sheet {
  const layout = pieces === sheet.layout.pieces ? sheet.layout : { ...sheet.layout, pieces };
  const site = features === sheet.site.features ? sheet.site : { ...sheet.site, features };
  return layout === sheet.layout && site === sheet.site ? sheet : { layout, site };
}
