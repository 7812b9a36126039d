import { INKS } from './inks';
import { tidy, type Pen } from './pen';
import { MAP_FONT } from './map-font';
import type { Ft } from './scene';

export type Words = {
  readonly text: string;
  readonly at: Ft;
  /** Direction the words run on the ground; left out, level on the sheet. */
  readonly toward_deg?: number;
  readonly size: number;
  readonly ink: string;
  readonly bold?: boolean;
  readonly spaced?: number;
  /** Width of the paper left clear around the letters. */
  readonly halo?: number;
  /** What the halo is cut from, where that isn't paper. */
  readonly ground?: string;
  readonly start?: boolean;
};

/** Words at a point of the ground, never upside down. */
export function lettering(pen: Pen, words: Words): string {
  const [x, y] = pen.point(words.at);
  const turned = words.toward_deg === undefined ? 0 : upright(words.toward_deg - 90);
  const place = `translate(${tidy(x)} ${tidy(y)})${turned ? ` rotate(${tidy(turned)})` : ''}`;
  const family = words.bold ? MAP_FONT.bold : MAP_FONT.regular;
  const spacing = words.spaced ? ` letter-spacing="${words.spaced}"` : '';
  const anchor = words.start ? 'start' : 'middle';
  const attributes = `font-family="${family}" font-size="${words.size}" text-anchor="${anchor}"${spacing}`;
  const letters = escaped(words.text);
  const drop = tidy(words.size * 0.33); // puts the middle of the capitals on the point
  // The halo is a text of its own beneath: painting order inside one text is not kept everywhere.
  const halo = words.halo
    ? `<text ${attributes} y="${drop}" fill="none" stroke="${words.ground ?? INKS.paper}" stroke-width="${words.halo}" stroke-linejoin="round">${letters}</text>`
    : '';
  return `<g transform="${place}">${halo}<text ${attributes} y="${drop}" fill="${words.ink}">${letters}</text></g>`;
}

function upright(degrees: number): number {
  const turn = ((degrees % 360) + 540) % 360; // −180 … 180, moved up by 180
  const level = turn - 180;
  if (level > 90) return level - 180;
  return level <= -90 ? level + 180 : level;
}

const escaped = (text: string): string =>
  text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;');
