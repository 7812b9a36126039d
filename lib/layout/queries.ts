import type { LonLat } from '../geo';
import { PIECE_DEFAULTS } from '../limits';
import { KIND_WORDS } from './kind-words';
import type { Kind, Piece, PieceOf, Probe, Rod, Run, Unit } from './pieces';
import type { Layout, Sheet, SiteGround } from './schema';
import { SYSTEMS, type System } from './values';

/** Questions asked of a layout in many places, each with one answer. Defaults live here. */

export const UNIT_OF_SYSTEM = {
  C: 'casualty-vehicle',
  R: 'receiving-vehicle',
  P: 'pump',
} as const satisfies Record<System, Kind>;

export const UNIT_WORDS: Record<System, string> = {
  C: 'casualty vehicle',
  R: 'receiving vehicle',
  P: 'pump',
};

export const systemOfUnit = (unit: Unit): System =>
  unit.kind === 'casualty-vehicle' ? 'C' : unit.kind === 'receiving-vehicle' ? 'R' : 'P';

/** A pump on the receiving vehicle, or none, has no system of its own. Not entered: separate. */
export const pumpIsSeparate = (layout: Layout): boolean =>
  layout.pump === null || layout.pump === 'separate';

export const systemsInUse = (layout: Layout): System[] =>
  SYSTEMS.filter((system) => system !== 'P' || pumpIsSeparate(layout));

export function piecesOf<K extends Kind>(
  pieces: readonly Piece[],
  ...kinds: readonly K[]
): PieceOf<K>[] {
  return pieces.filter((piece): piece is PieceOf<K> =>
    (kinds as readonly Kind[]).includes(piece.kind),
  );
}

export const isUnit = (piece: Piece): piece is Unit =>
  piece.kind === 'casualty-vehicle' || piece.kind === 'receiving-vehicle' || piece.kind === 'pump';

export const isRun = (piece: Piece): piece is Run =>
  piece.kind === 'jumper' ||
  piece.kind === 'ground-cable' ||
  piece.kind === 'bond-cable' ||
  piece.kind === 'hose' ||
  piece.kind === 'test-lead';

export const unitOf = (layout: Layout, system: System): Unit | null =>
  (layout.pieces.find((piece) => piece.kind === UNIT_OF_SYSTEM[system]) as Unit | undefined) ??
  null;

export const rodsOf = (layout: Layout, system: System): Rod[] =>
  piecesOf(layout.pieces, 'rod').filter((rod) => rod.system === system);

/** The probe of that kind which serves the system; of several, the one drawn last. */
export function probeFor(
  layout: Layout,
  kind: 'z-probe' | 'y-probe',
  system: System,
): Probe | null {
  const serving = piecesOf(layout.pieces, kind).filter((probe) =>
    servedBy(layout, probe).includes(system),
  );
  return serving.at(-1) ?? null;
}

/** A probe that names no systems serves all that are in use. */
export const servedBy = (layout: Layout, probe: Probe): readonly System[] =>
  probe.serves ?? systemsInUse(layout);

export const rodLengthFt = (rod: Rod): number => rod.length_ft ?? PIECE_DEFAULTS.rod.length_ft;
export const rodDrivenFt = (rod: Rod): number => rod.driven_ft ?? rodLengthFt(rod);
export const rodDiameterIn = (rod: Rod): number =>
  rod.diameter_in ?? PIECE_DEFAULTS.rod.diameter_in;

export function unitSizeFt(unit: Unit): { length: number; width: number } {
  const size = unit.kind === 'pump' ? PIECE_DEFAULTS.pump : PIECE_DEFAULTS.vehicle;
  return { length: unit.length_ft ?? size.length_ft, width: unit.width_ft ?? size.width_ft };
}

/** Ids that the product makes. Any other was given by a person or a file and may serve as a name. */
const MADE_ID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** What to call a piece in a sentence: its label, else what a person called it, else its kind. */
export function nameOf(piece: Piece): string {
  if (piece.label) return piece.label;
  if (isUnit(piece)) return UNIT_WORDS[systemOfUnit(piece)];
  if (!MADE_ID.test(piece.id)) return piece.id;
  return piece.kind === 'y-probe' && piece.serves
    ? `Y probe for ${piece.serves.join(', ')}`
    : KIND_WORDS[piece.kind];
}

export function findPiece(sheet: Sheet, id: string): Piece | null {
  return (
    sheet.layout.pieces.find((piece) => piece.id === id) ??
    sheet.site.features.find((feature) => feature.id === id) ??
    null
  );
}

/** Every position a piece is made of, in order. */
export function positionsOf(piece: Piece): LonLat[] {
  if ('at' in piece) return [piece.at];
  if ('path' in piece) return piece.path;
  return ('paths' in piece ? piece.paths : piece.rings).flat();
}

export const EMPTY_GROUND: SiteGround = {
  features: [],
  answers: {},
  overhead_none_known_as_of: null,
  locates: [],
};

export function emptyLayout(origin: LonLat, name: string | null = null): Layout {
  return {
    version: 1,
    name,
    origin,
    planned_at: null,
    pump: null,
    conditions: {},
    liquid: null,
    kit: null,
    pieces: [],
  };
}
