import type { Vec } from '../geo';
import { footprintOf, type Piece } from '../layout';
import type { Clutter } from './clutter';
import type { Frame } from './frame';
import { placeLabels, type Wanted } from './label-places';
import { sheetName } from './names';
import { ROD_RADIUS_PX, Y_RADIUS_PX, Z_RADIUS_PX } from './points';
import { boundsOf } from './paper';
import type { Group } from './types';
import { PUMP_RADIUS_PX } from './units';

const SIZE_PX = 15;
/** Paper is read nearer than a screen. */
const PAPER_SIZE_PX = 13;

/** Rods first: theirs is the label a crew looks for. */
const ORDER: readonly Piece['kind'][] = [
  'rod',
  'z-probe',
  'y-probe',
  'release-point',
  'fixed-point',
];

/** A label for every piece that has a name and is seen. */
export function drawLabels(frame: Frame, clutter: Clutter): Group[] {
  const { layout, site } = frame.sheet;
  const wanted = [...layout.pieces, ...site.features]
    .flatMap((piece): { rank: number; label: Wanted }[] => {
      const seat = seatOf(frame, piece);
      const text = seat && isSeen(frame, seat.at) ? sheetName(piece, layout, site) : null;
      if (!seat || !text) return [];
      const rank = ORDER.indexOf(piece.kind);
      const label = {
        id: piece.id,
        text: short(text),
        size: frame.inkOnly ? PAPER_SIZE_PX : SIZE_PX,
        ...seat,
      };
      return [{ rank: rank < 0 ? ORDER.length : rank, label }];
    })
    .sort((a, b) => a.rank - b.rank)
    .map(({ label }) => label);
  return placeLabels(clutter, wanted).map(({ id, mark }) => ({
    id,
    layer: 'label',
    marks: [mark],
  }));
}

function isSeen({ view: { bounds } }: Frame, at: Vec): boolean {
  return (
    !bounds ||
    (at.x >= bounds.min.x && at.x <= bounds.max.x && at.y >= bounds.min.y && at.y <= bounds.max.y)
  );
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

const POOL_HOLDS_WORD_PX = 22;

type Seat = Pick<Wanted, 'at' | 'reach' | 'token' | 'ring'>;

/** Where the label's piece lies and how far its symbol reaches from there. */
function seatOf(frame: Frame, piece: Piece): Seat | null {
  const token = piece.kind === 'release-point' || piece.kind === 'pool' ? 'alarm' : 'ink';
  if (piece.kind === 'casualty-vehicle' || piece.kind === 'receiving-vehicle') {
    return { at: frame.vec(piece.at), reach: 0, token, ring: footprintOf(frame.plane, piece) };
  }
  if (piece.kind === 'pool') {
    const bounds = boundsOf((piece.rings[0] ?? []).map(frame.vec));
    if (!bounds) return null;
    const { min, max } = bounds;
    const half = Math.min(max.x - min.x, max.y - min.y) / 2 / frame.view.metresPerPx;
    // A pool large enough has its word inside, a small one beside it.
    const reach = half > POOL_HOLDS_WORD_PX ? -8 : half;
    return { at: { x: (min.x + max.x) / 2, y: (min.y + max.y) / 2 }, reach, token, ring: null };
  }
  const reach = RADIUS_PX[piece.kind];
  return reach === undefined || !('at' in piece)
    ? null
    : { at: frame.vec(piece.at), reach: reach * frame.symbols, token, ring: null };
}

/** Notes are written out in the tables; on the plan they must not bury it. */
const MOST_CHARACTERS = 34;
const short = (text: string): string =>
  text.length <= MOST_CHARACTERS ? text : `${text.slice(0, MOST_CHARACTERS - 1).trimEnd()}…`;
