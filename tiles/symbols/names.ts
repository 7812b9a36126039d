import { INKS } from '../inks';
import { lettering } from '../lettering';
import { tidy, type Pen } from '../pen';
import type { Prepared } from '../prepare';
import type { FixedThing, Name } from '../scene';

type Style = { readonly size: number; readonly ink: string } & {
  readonly bold?: boolean;
  readonly spaced?: number;
};

/**
 * A map client shows tiles at 0.71 to 1.41 of their size between zooms: letters are made to read
 * at the small end without shouting at the large one.
 */
const STYLE: Record<Name['weight'], Style> = {
  place: { size: 22, ink: INKS.name, bold: true, spaced: 1.2 },
  way: { size: 18, ink: INKS.name, spaced: 1 },
  thing: { size: 17, ink: INKS.thing },
  water: { size: 17, ink: INKS.water, spaced: 0.6 },
};

export function names({ scene }: Prepared, pen: Pen): string[] {
  return scene.names
    .filter((name) => pen.zoom >= name.from_zoom && pen.shows([name.at]))
    .map((name) =>
      lettering(pen, { ...name, ...STYLE[name.weight], halo: 5, ground: INKS[name.on ?? 'paper'] }),
    );
}

/** What distances are taped from: small, plain, never larger than the plan's own marks. */
export function fixedThings({ scene }: Prepared, pen: Pen): string[] {
  if (pen.zoom < 19) return [];
  return scene.fixed.filter(({ at }) => pen.shows([at])).map((thing) => mark(thing, pen));
}

function mark({ at, looks }: FixedThing, pen: Pen): string {
  const [x, y] = pen.point(at).map(tidy) as [string, string];
  const r = tidy(pen.wide(0.55, 2.6));
  const ink = `fill="none" stroke="${INKS.wall}" stroke-width="1.3"`;
  const shapes: Record<FixedThing['looks'], string> = {
    sign: `<path d="M-1 0H1" transform="scale(${tidy(pen.wide(1.4, 6))} 1)" vector-effect="non-scaling-stroke" ${ink}/><circle r="${r}" fill="${INKS.wall}"/>`,
    hydrant: `<circle r="${tidy(pen.wide(0.9, 4))}" ${ink}/><circle r="${tidy(pen.wide(0.3, 1.4))}" fill="${INKS.wall}"/>`,
    light: `<circle r="${r}" fill="${INKS.wall}"/><circle r="${tidy(pen.wide(1.1, 5))}" ${ink}/>`,
    marker: `<rect x="-${r}" y="-${r}" width="${tidy(2 * Number(r))}" height="${tidy(2 * Number(r))}" fill="${INKS.paper}" stroke="${INKS.wall}" stroke-width="1.3"/>`,
  };
  return `<g transform="translate(${x} ${y})">${shapes[looks]}</g>`;
}
