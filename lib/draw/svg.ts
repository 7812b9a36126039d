import { CAPITAL_MIDDLE, HALO_PX, strokeWidth } from './paint';
import { textWidth } from './text-width';
import type { Theme } from './themes';
import type {
  DisplayList,
  Fill,
  Group,
  Layer,
  LettersMark,
  Mark,
  Projector,
  PxShape,
  Stroke,
  TextMark,
} from './types';

/** An SVG element as data: a string or React elements are made of it. Attributes as SVG spells. */
export type SvgNode = {
  readonly tag: 'g' | 'path' | 'circle' | 'text';
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children: readonly SvgNode[] | string;
};

type Attributes = Record<string, string | number>;

export type SvgOptions = {
  readonly projector: Projector;
  readonly theme: Theme;
  readonly layers?: readonly Layer[];
};

/** The list as SVG in px, one `g` a group with the piece's id in `data-piece`. */
export function svgNodes(list: DisplayList, options: SvgOptions): SvgNode[] {
  return list.groups
    .filter((group) => group.marks.length > 0)
    .filter((group) => !options.layers || options.layers.includes(group.layer))
    .map((group) => groupNode(group, options));
}

export function svgText(nodes: readonly SvgNode[]): string {
  return nodes
    .map(({ tag, attributes, children }) => {
      const written = Object.entries(attributes)
        .map(([name, value]) => ` ${name}="${escaped(String(value))}"`)
        .join('');
      const inner = typeof children === 'string' ? escaped(children) : svgText(children);
      return `<${tag}${written}>${inner}</${tag}>`;
    })
    .join('');
}

/** A whole SVG file, for a picture that stands alone. */
export function svgDocument(
  list: DisplayList,
  options: SvgOptions & {
    readonly width: number;
    readonly height: number;
    readonly fontFamily: string;
  },
): string {
  const { width, height, theme, fontFamily } = options;
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" ` +
    `viewBox="0 0 ${width} ${height}" font-family="${escaped(fontFamily)}">` +
    `<rect width="${width}" height="${height}" fill="${theme.paper}"/>` +
    `${svgText(svgNodes(list, options))}</svg>`
  );
}

const groupNode = (group: Group, options: SvgOptions): SvgNode => ({
  tag: 'g',
  attributes: { 'data-piece': group.id, 'data-layer': group.layer },
  children: group.marks.flatMap((mark) => markNodes(mark, options)),
});

function markNodes(mark: Mark, options: SvgOptions): SvgNode[] {
  const { projector } = options;
  switch (mark.type) {
    case 'path':
      return inked(
        'path',
        {
          d: mark.lines
            .map((line) =>
              pathData(
                line.map((v) => projector.toPx(v)),
                mark.closed,
              ),
            )
            .join(''),
        },
        mark.stroke,
        mark.fill,
        options,
      );
    case 'circle': {
      const at = projector.toPx(mark.at);
      const r = number(mark.radiusMetres * projector.pxPerMetre);
      return inked(
        'circle',
        { cx: number(at.x), cy: number(at.y), r },
        mark.stroke,
        mark.fill,
        options,
      );
    }
    case 'glyph': {
      const at = projector.toPx(mark.at);
      const turn = mark.turnDeg === 0 ? '' : ` rotate(${number(mark.turnDeg)})`;
      return [
        {
          tag: 'g',
          attributes: { transform: `translate(${number(at.x)} ${number(at.y)})${turn}` },
          children: mark.shapes.flatMap((shape) => shapeNodes(shape, options)),
        },
      ];
    }
    case 'text':
      return [textNode(mark, options)];
    case 'letters':
      return [lettersNode(mark, options)];
  }
}

function shapeNodes(shape: PxShape, options: SvgOptions): SvgNode[] {
  return shape.type === 'disc'
    ? inked(
        'circle',
        { cx: number(shape.at.x), cy: number(shape.at.y), r: number(shape.radius) },
        shape.stroke,
        shape.fill,
        options,
      )
    : inked('path', { d: pathData(shape.points, shape.closed) }, shape.stroke, shape.fill, options);
}

/** One element, or two where a casing lies beneath. */
function inked(
  tag: 'path' | 'circle',
  shape: Readonly<Record<string, string | number>>,
  stroke: Stroke | null,
  fill: Fill | null,
  { theme, projector }: SvgOptions,
): SvgNode[] {
  const filled: Attributes =
    fill && fill.opacity > 0
      ? { fill: theme[fill.token], 'fill-opacity': fill.opacity, 'fill-rule': 'evenodd' }
      : { fill: 'none' };
  const node = (attributes: Attributes): SvgNode => ({
    tag,
    attributes: { ...shape, ...attributes },
    children: [],
  });
  if (!stroke) return [node(filled)];
  const drawn: Attributes = {
    stroke: theme[stroke.token],
    'stroke-width': number(strokeWidth(stroke, projector.pxPerMetre)),
    'stroke-linejoin': 'round',
    'stroke-linecap': stroke.cap ?? 'butt',
    ...(stroke.dash ? { 'stroke-dasharray': stroke.dash.join(' ') } : {}),
    ...(stroke.opacity === undefined ? {} : { 'stroke-opacity': stroke.opacity }),
  };
  if (!stroke.casing) return [node({ ...filled, ...drawn })];
  return [
    node({
      ...filled,
      stroke: theme[stroke.casing.token],
      'stroke-width': stroke.casing.width,
      'stroke-linejoin': 'round',
      'stroke-linecap': stroke.cap ?? 'butt',
    }),
    node({ fill: 'none', ...drawn }),
  ];
}

function textNode(mark: TextMark, { projector, theme }: SvgOptions): SvgNode {
  const at = projector.toPx(mark.at);
  const [x, y] = [number(at.x + mark.offset.x), number(at.y + mark.offset.y)];
  const turn = mark.turnDeg === 0 ? '' : ` rotate(${number(mark.turnDeg)})`;
  return {
    tag: 'text',
    attributes: {
      transform: `translate(${x} ${y})${turn}`,
      y: number(mark.size * CAPITAL_MIDDLE),
      'text-anchor': mark.anchor,
      ...lettering(mark, theme),
    },
    children: mark.text,
  };
}

/** One text element with a place for each letter: it is still found, copied and read as words. */
function lettersNode(mark: LettersMark, { projector, theme }: SvgOptions): SvgNode {
  const half = mark.size * CAPITAL_MIDDLE;
  const letters = [...mark.text];
  // `rotate` turns a letter about its own start on the baseline, whatever the anchor.
  const feet = mark.letters.map(({ at, turnDeg }, i) => {
    const px = projector.toPx(at);
    const turn = (turnDeg * Math.PI) / 180;
    const [sin, cos] = [Math.sin(turn), Math.cos(turn)];
    const back = textWidth(letters[i] ?? '', mark.size, mark.weight) / 2;
    return { x: px.x - sin * half - cos * back, y: px.y + cos * half - sin * back };
  });
  return {
    tag: 'text',
    attributes: {
      x: feet.map((p) => number(p.x)).join(' '),
      y: feet.map((p) => number(p.y)).join(' '),
      rotate: mark.letters.map(({ turnDeg }) => number(turnDeg)).join(' '),
      ...lettering(mark, theme),
    },
    children: mark.text,
  };
}

const lettering = (
  { size, weight, token, halo }: TextMark | LettersMark,
  theme: Theme,
): Record<string, string | number> => ({
  'font-size': size,
  'font-weight': weight,
  fill: theme[token],
  ...(halo
    ? {
        stroke: theme[halo],
        'stroke-width': HALO_PX,
        'stroke-linejoin': 'round',
        'paint-order': 'stroke',
      }
    : {}),
});

function pathData(points: readonly { x: number; y: number }[], closed: boolean): string {
  const d = points.map((p, i) => `${i === 0 ? 'M' : 'L'}${number(p.x)} ${number(p.y)}`).join('');
  return closed ? `${d}Z` : d;
}

/** A thousandth of a px is 0.0003 mm on paper. */
const number = (value: number): number => Math.round(value * 1000) / 1000;

const escaped = (text: string): string =>
  text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
