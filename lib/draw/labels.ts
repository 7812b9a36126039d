import { meanOf, type Vec } from '../geo';
import type { Piece } from '../layout';
import { placeLabels, type Wanted } from './label-places';
import type { Frame } from './frame';
import { sheetName } from './names';
import { ROD_RADIUS_PX, Y_RADIUS_PX, Z_RADIUS_PX } from './points';
import type { SheetInput } from './sheet';
import type { Group } from './types';
import { PUMP_RADIUS_PX, unitRing } from './units';

const SIZE_PX = 15;

/** A label for every piece that has a name, set where it covers least. */
export function labelGroups(frame: Frame, _input: SheetInput): Group[] {
  const { layout, site } = frame.sheet;
  const wanted = [...layout.pieces, ...site.features].flatMap((piece): Wanted[] => {
    const text = sheetName(piece, layout, site);
    const seat = text === null ? null : seatOf(frame, piece);
    return text === null || seat === null ? [] : [{ id: piece.id, text, size: SIZE_PX, ...seat }];
  });
  return placeLabels(frame, wanted).map(({ id, mark }) => ({ id, layer: 'label', marks: [mark] }));
}

const RADIUS_PX: Partial<Record<Piece['kind'], number>> = {
  rod: ROD_RADIUS_PX,
  'z-probe': Z_RADIUS_PX,
  'y-probe': Y_RADIUS_PX,
  tester: 12,
  pump: PUMP_RADIUS_PX,
  'release-point': 9,
  vent: 9,
  'fixed-point': 9,
  note: 8,
};

/** Where the label's piece lies and how far its symbol reaches from there. */
function seatOf(
  frame: Frame,
  piece: Piece,
): Pick<Wanted, 'at' | 'reach' | 'token' | 'ring'> | null {
  const token = piece.kind === 'release-point' || piece.kind === 'pool' ? 'alarm' : 'ink';
  if (piece.kind === 'casualty-vehicle' || piece.kind === 'receiving-vehicle') {
    return { at: frame.vec(piece.at), reach: 0, token, ring: unitRing(frame, piece) };
  }
  if (piece.kind === 'pool') {
    const at: Vec | null = meanOf((piece.rings[0] ?? []).slice(1).map(frame.vec));
    return at && { at, reach: -8, token, ring: null };
  }
  const reach = RADIUS_PX[piece.kind];
  return reach === undefined || !('at' in piece)
    ? null
    : { at: frame.vec(piece.at), reach, token, ring: null };
}
