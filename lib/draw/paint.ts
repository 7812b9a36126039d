import type { Theme } from './themes';
import type {
  DisplayList,
  Fill,
  GlyphMark,
  Layer,
  LettersMark,
  Mark,
  PathMark,
  Projector,
  Px,
  Stroke,
  TextMark,
} from './types';

/** What of a 2D canvas context is used; the browser's and Konva's both fit. */
export type Surface = {
  save(): void;
  restore(): void;
  translate(x: number, y: number): void;
  rotate(radians: number): void;
  beginPath(): void;
  closePath(): void;
  moveTo(x: number, y: number): void;
  lineTo(x: number, y: number): void;
  arc(x: number, y: number, radius: number, from: number, to: number): void;
  stroke(): void;
  fill(rule?: 'nonzero' | 'evenodd'): void;
  setLineDash(dash: number[]): void;
  fillText(text: string, x: number, y: number): void;
  strokeText(text: string, x: number, y: number): void;
  fillStyle: unknown;
  strokeStyle: unknown;
  globalAlpha: number;
  lineWidth: number;
  lineCap: unknown;
  lineJoin: unknown;
  font: string;
  textAlign: unknown;
  textBaseline: unknown;
};

export type PaintOptions = {
  readonly projector: Projector;
  readonly theme: Theme;
  readonly fontFamily: string;
  /** Only these layers; all when absent. */
  readonly layers?: readonly Layer[];
  /** Nothing outside is painted: px of the surface. */
  readonly clip?: { readonly width: number; readonly height: number };
};

export const HALO_PX = 4;
/** From the middle of a capital down to its foot, parts of the size (capitals are 0.66 high). */
export const CAPITAL_MIDDLE = 0.33;

export function paint(surface: Surface, list: DisplayList, options: PaintOptions): void {
  const { layers } = options;
  for (const group of list.groups) {
    if (layers && !layers.includes(group.layer)) continue;
    for (const mark of group.marks) paintMark(surface, mark, options);
  }
}

export function paintMark(surface: Surface, mark: Mark, options: PaintOptions): void {
  switch (mark.type) {
    case 'path':
      return paintPath(surface, mark, options);
    case 'circle': {
      const at = options.projector.toPx(mark.at);
      surface.beginPath();
      surface.arc(at.x, at.y, mark.radiusMetres * options.projector.pxPerMetre, 0, Math.PI * 2);
      return inkPath(surface, mark.stroke, mark.fill, options);
    }
    case 'glyph':
      return paintGlyph(surface, mark, options);
    case 'text':
      return paintText(surface, mark, options);
    case 'letters':
      return paintLetters(surface, mark, options);
  }
}

function paintPath(surface: Surface, mark: PathMark, options: PaintOptions): void {
  surface.beginPath();
  for (const line of mark.lines) {
    line.forEach((place, i) => {
      const at = options.projector.toPx(place);
      if (i === 0) surface.moveTo(at.x, at.y);
      else surface.lineTo(at.x, at.y);
    });
    if (mark.closed) surface.closePath();
  }
  inkPath(surface, mark.stroke, mark.fill, options);
}

function paintGlyph(surface: Surface, mark: GlyphMark, options: PaintOptions): void {
  const at = options.projector.toPx(mark.at);
  if (outside(at, 40, options)) return;
  surface.save();
  surface.translate(at.x, at.y);
  if (mark.turnDeg !== 0) surface.rotate((mark.turnDeg * Math.PI) / 180);
  for (const shape of mark.shapes) {
    surface.beginPath();
    if (shape.type === 'disc') {
      surface.arc(shape.at.x, shape.at.y, shape.radius, 0, Math.PI * 2);
    } else {
      shape.points.forEach((p, i) =>
        i === 0 ? surface.moveTo(p.x, p.y) : surface.lineTo(p.x, p.y),
      );
      if (shape.closed) surface.closePath();
    }
    inkPath(surface, shape.stroke, shape.fill, options);
  }
  surface.restore();
}

function paintText(surface: Surface, mark: TextMark, options: PaintOptions): void {
  const at = options.projector.toPx(mark.at);
  if (outside(at, 400, options)) return;
  surface.save();
  surface.translate(at.x + mark.offset.x, at.y + mark.offset.y);
  if (mark.turnDeg !== 0) surface.rotate((mark.turnDeg * Math.PI) / 180);
  setFont(surface, mark, options);
  surface.textAlign = mark.anchor === 'middle' ? 'center' : mark.anchor;
  if (mark.halo) haloText(surface, mark.text, mark.size, options.theme[mark.halo]);
  surface.fillStyle = options.theme[mark.token];
  surface.fillText(mark.text, 0, mark.size * CAPITAL_MIDDLE);
  surface.restore();
}

function paintLetters(surface: Surface, mark: LettersMark, options: PaintOptions): void {
  surface.save();
  setFont(surface, mark, options);
  surface.textAlign = 'center';
  const letters = [...mark.text];
  // All halos first: a letter's halo must not bite into its neighbour.
  for (const inking of mark.halo ? [true, false] : [false]) {
    mark.letters.forEach(({ at, turnDeg }, i) => {
      const px = options.projector.toPx(at);
      const letter = letters[i] ?? '';
      if (outside(px, 40, options)) return;
      surface.save();
      surface.translate(px.x, px.y);
      surface.rotate((turnDeg * Math.PI) / 180);
      if (inking && mark.halo) haloText(surface, letter, mark.size, options.theme[mark.halo]);
      surface.fillStyle = options.theme[mark.token];
      if (!inking) surface.fillText(letter, 0, mark.size * CAPITAL_MIDDLE);
      surface.restore();
    });
  }
  surface.restore();
}

function inkPath(
  surface: Surface,
  stroke: Stroke | null,
  fill: Fill | null,
  { theme, projector }: PaintOptions,
): void {
  if (fill && fill.opacity > 0) {
    surface.globalAlpha = fill.opacity;
    surface.fillStyle = theme[fill.token];
    surface.fill('evenodd');
    surface.globalAlpha = 1;
  }
  if (!stroke) return;
  surface.lineJoin = 'round';
  surface.lineCap = stroke.cap ?? 'butt';
  if (stroke.casing) {
    surface.setLineDash([]);
    surface.strokeStyle = theme[stroke.casing.token];
    surface.lineWidth = stroke.casing.width;
    surface.stroke();
  }
  surface.globalAlpha = stroke.opacity ?? 1;
  surface.setLineDash(stroke.dash ? [...stroke.dash] : []);
  surface.strokeStyle = theme[stroke.token];
  surface.lineWidth = strokeWidth(stroke, projector.pxPerMetre);
  surface.stroke();
  surface.globalAlpha = 1;
}

export const strokeWidth = (stroke: Stroke, pxPerMetre: number): number =>
  Math.max(stroke.width, (stroke.widthMetres ?? 0) * pxPerMetre);

function haloText(surface: Surface, text: string, size: number, colour: string): void {
  surface.strokeStyle = colour;
  surface.lineWidth = HALO_PX;
  surface.lineJoin = 'round';
  surface.setLineDash([]);
  surface.strokeText(text, 0, size * CAPITAL_MIDDLE);
}

function setFont(surface: Surface, mark: TextMark | LettersMark, options: PaintOptions): void {
  surface.font = `${mark.weight} ${mark.size}px ${options.fontFamily}`;
  surface.textBaseline = 'alphabetic';
}

const outside = (at: Px, reach: number, { clip }: PaintOptions): boolean =>
  clip !== undefined &&
  (at.x < -reach || at.y < -reach || at.x > clip.width + reach || at.y > clip.height + reach);
