import {
  distance,
  feetToMetres,
  meanOf,
  metresToFeet,
  quantise,
  type LonLat,
  type Vec,
} from '@/lib/geo';
import { anchorOf } from '@/lib/edits';
import {
  isRun,
  placeOf,
  placesOf,
  planeOf,
  unitOf,
  type Layout,
  type Piece,
  type Sheet,
} from '@/lib/layout';

/** Where a piece is, said by bearing and distance from another place. */
export type Polar = { readonly bearingDeg: number; readonly feet: number };

/** The middle of a piece: its point, the mean of an area's corners, the middle of a line's ends. */
export function middleOf(layout: Layout, piece: Piece): Vec {
  const places = placesOf(planeOf(layout), piece);
  const first = places[0] ?? [];
  const corners = 'rings' in piece ? first.slice(0, -1) : first;
  return meanOf(corners) ?? { x: 0, y: 0 };
}

/** The casualty vehicle's middle, else the sheet's origin: what bearings are counted from. */
export function referenceOf(layout: Layout): { readonly at: Vec; readonly words: string } {
  const casualty = unitOf(layout, 'C');
  return casualty
    ? { at: placeOf(planeOf(layout), casualty), words: 'casualty vehicle' }
    : { at: { x: 0, y: 0 }, words: 'sheet’s origin' };
}

export function polarFrom(layout: Layout, from: Vec, at: Vec): Polar {
  const metres = distance(from, at);
  return {
    bearingDeg: metres < 1e-6 ? 0 : planeOf(layout).bearing(from, at),
    feet: metresToFeet(metres),
  };
}

export function placeByPolar(layout: Layout, from: Vec, { bearingDeg, feet }: Polar): LonLat {
  const plane = planeOf(layout);
  return quantise(plane.toLonLat(plane.offset(from, bearingDeg, feetToMetres(feet))));
}

/** Where the piece's anchor goes for its middle to come to lie there. */
export function anchorFor(layout: Layout, piece: Piece, middle: LonLat): LonLat {
  if ('at' in piece) return middle;
  const plane = planeOf(layout);
  const [from, to] = [middleOf(layout, piece), plane.toPlane(middle)];
  const anchor = plane.toPlane(anchorOf(piece));
  return quantise(plane.toLonLat({ x: anchor.x + to.x - from.x, y: anchor.y + to.y - from.y }));
}

/** What runs from one piece to another lies where those are; everything else can be put elsewhere. */
export const canBeMoved = (piece: Piece): boolean => !isRun(piece);

/** A place named by the reader: a piece's middle, or the reference where none is chosen. */
export function placeNamed(sheet: Sheet, id: string | null): Vec {
  const piece = id && [...sheet.layout.pieces, ...sheet.site.features].find((p) => p.id === id);
  return piece ? middleOf(sheet.layout, piece) : referenceOf(sheet.layout).at;
}
