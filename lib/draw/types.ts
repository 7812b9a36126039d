import type { Vec } from '../geo';
import type { Token } from './themes';

/**
 * A drawing as plain data in two unit spaces. Places and true-size shapes are in ground metres
 * (the layout's local plane, x east, y north); symbols, strokes, letters and offsets are in px of
 * the screen or of the paper at 96 to the inch, x right, y down. Screen, SVG and paper paint the
 * same list.
 */
export type DisplayList = { readonly groups: readonly Group[] };

/** Paint order: what comes first lies lowest. */
export const LAYERS = ['ground', 'zone', 'run', 'piece', 'dimension', 'label'] as const;
export type Layer = (typeof LAYERS)[number];

export type Group = {
  /** A piece's id, or a name of the drawing's own that begins with `~`. */
  readonly id: string;
  readonly layer: Layer;
  /** Where a pointer finds the piece; absent where there is nothing to take. */
  readonly hit?: Hit;
  readonly marks: readonly Mark[];
};

export type Hit =
  | { readonly type: 'spot'; readonly at: Vec; readonly radiusPx: number }
  | { readonly type: 'lines'; readonly lines: readonly (readonly Vec[])[]; readonly nearPx: number }
  /** Outer ring first, then holes; `edge` takes only the outline, so that zones don't swallow. */
  | {
      readonly type: 'area';
      readonly rings: readonly (readonly Vec[])[];
      readonly nearPx: number;
      readonly edge: boolean;
    };

/** A distance on the screen or the paper. */
export type Px = { readonly x: number; readonly y: number };

export type Stroke = {
  readonly token: Token;
  readonly width: number;
  /** Width on the ground, for bands that are as wide as they are true; then `width` is a floor. */
  readonly widthMetres?: number;
  readonly dash?: readonly number[];
  readonly opacity?: number;
  readonly cap?: 'butt' | 'round';
  /** A wider line painted beneath, for lines that must be seen over any ground. */
  readonly casing?: { readonly token: Token; readonly width: number };
};

export type Fill = { readonly token: Token; readonly opacity: number };

export type PathMark = {
  readonly type: 'path';
  readonly lines: readonly (readonly Vec[])[];
  readonly closed: boolean;
  readonly stroke: Stroke | null;
  /** Filled by the even-odd rule, so that holes stay open. */
  readonly fill: Fill | null;
};

/** A circle of true size. */
export type CircleMark = {
  readonly type: 'circle';
  readonly at: Vec;
  readonly radiusMetres: number;
  readonly stroke: Stroke | null;
  readonly fill: Fill | null;
};

export type PxShape =
  | {
      readonly type: 'line';
      readonly points: readonly Px[];
      readonly closed: boolean;
      readonly stroke: Stroke | null;
      readonly fill: Fill | null;
    }
  | {
      readonly type: 'disc';
      readonly at: Px;
      readonly radius: number;
      readonly stroke: Stroke | null;
      readonly fill: Fill | null;
    };

/** A symbol of fixed size round a place. `turnDeg` turns it clockwise, 0 leaves it upright. */
export type GlyphMark = {
  readonly type: 'glyph';
  readonly at: Vec;
  readonly turnDeg: number;
  readonly shapes: readonly PxShape[];
};

export type Weight = 400 | 600 | 700;

/** Words stand with the middle of their height on the anchor plus offset. */
export type TextMark = {
  readonly type: 'text';
  readonly at: Vec;
  readonly offset: Px;
  readonly text: string;
  readonly size: number;
  readonly weight: Weight;
  readonly token: Token;
  readonly halo: Token | null;
  readonly turnDeg: number;
  readonly anchor: 'start' | 'middle' | 'end';
};

/** Words that follow a curve, letter by letter; `text` is what a reader or a search gets. */
export type LettersMark = {
  readonly type: 'letters';
  readonly text: string;
  readonly letters: readonly { readonly at: Vec; readonly turnDeg: number }[];
  readonly size: number;
  readonly weight: Weight;
  readonly token: Token;
  readonly halo: Token | null;
};

export type Mark = PathMark | CircleMark | GlyphMark | TextMark | LettersMark;

/** How the ground lies on the screen or the paper. Supplied by whoever paints. */
export type Projector = {
  toPx(place: Vec): Px;
  readonly pxPerMetre: number;
};

/** What the list is drawn for: symbols are spaced for this scale. */
export type View = {
  readonly metresPerPx: number;
  /** Ground that is seen; labels keep inside it. */
  readonly bounds?: Bounds;
};

export type Bounds = { readonly min: Vec; readonly max: Vec };

export type LengthUnit = 'ft' | 'm';
