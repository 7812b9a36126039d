import type { LonLat } from '../geo';
import { emptyLayout, planeAt, type Kind, type Piece, type Sheet } from '../layout';
import { limitsFrom } from '../limits';
import { drawLayout, drawSite } from './sheet';
import type { Mark } from './types';

export type LegendEntry = {
  readonly id: string;
  readonly words: string;
  /** The symbol round 0, 0 at one px to the metre, drawn as on the sheet. */
  readonly marks: readonly Mark[];
};

/** Kinds that the plan itself puts no word to. */
const WORDS: readonly (readonly [Kind, string])[] = [
  ['rod', 'rod'],
  ['z-probe', 'probe, outer'],
  ['y-probe', 'probe, inner'],
  ['fixed-point', 'fixed point'],
  ['jumper', 'jumper'],
  ['ground-cable', 'ground cable'],
  ['bond-cable', 'bond cable'],
  ['hose', 'hose'],
  ['test-lead', 'test lead'],
  ['buried-line', 'buried line'],
  ['no-drive', 'no-drive ground'],
  ['low-ground', 'low ground'],
];

const ORIGIN: LonLat = [0, 0];
const HALF = 16;

/** The symbols of what is drawn on the sheet, in the order a crew meets them. */
export function legendOf(sheet: Sheet, inkOnly: boolean): LegendEntry[] {
  const drawn = new Map<Kind, Piece>();
  for (const piece of [...sheet.layout.pieces, ...sheet.site.features]) {
    if (!drawn.has(piece.kind)) drawn.set(piece.kind, piece);
  }
  return WORDS.flatMap(([kind, words]) => {
    const piece = drawn.get(kind);
    return piece ? [{ id: kind, words, marks: symbolOf(piece, inkOnly) }] : [];
  });
}

/** The piece laid on an empty sheet round its origin, at one px to the metre. */
function symbolOf(piece: Piece, inkOnly: boolean): Mark[] {
  const plane = planeAt(ORIGIN);
  const at = (x: number, y: number): LonLat => plane.toLonLat({ x, y });
  const path = [at(-HALF, 0), at(HALF, 0)];
  const ring = [at(-HALF, -6), at(HALF, -6), at(HALF, 6), at(-HALF, 6), at(-HALF, -6)];
  const laid = {
    ...piece,
    ...('at' in piece && { at: ORIGIN, heading_deg: 90, length_ft: 1, width_ft: 1 }),
    ...('path' in piece && { path }),
    ...('paths' in piece && { paths: [path], quality: 'A' as const, diameter_in: 1 }),
    ...('rings' in piece && { rings: [ring] }),
  } as Piece;
  const sheet = {
    layout: { ...emptyLayout(ORIGIN), pieces: [laid] },
    site: { features: [laid], answers: {}, overhead_none_known_as_of: null, locates: [] },
  } as Sheet;
  const input = { sheet, limits: limitsFrom(), inkOnly, view: { metresPerPx: 1 } };
  return [...drawSite(input).groups, ...drawLayout(input).groups]
    .filter(({ layer }) => layer !== 'label')
    .flatMap(({ marks }) => marks)
    .filter(({ type }) => type !== 'text');
}
