import { feetToMetres, inchesToMetres, type Vec } from '../geo';
import { UNKNOWN_DIAMETER_IN } from '../limits';
import { placesOf, type BuriedLine, type Utility } from '../layout';
import type { Frame } from './frame';
import { wordsAlong } from './line-words';
import { line, stroke } from './marks';
import type { UtilityToken } from './themes';
import type { Group, Mark } from './types';

/** Never a single letter: C, R and P are systems. */
export const UTILITY_WORDS: Readonly<Record<Utility, string>> = {
  electric: 'ELEC',
  'gas-oil-steam': 'GAS',
  communications: 'COMM',
  'potable-water': 'WATER',
  'reclaimed-water': 'RECL',
  sewer: 'SEWER',
};

const TOKENS: Readonly<Record<Utility, UtilityToken>> = {
  electric: 'electric',
  'gas-oil-steam': 'gas',
  communications: 'communications',
  'potable-water': 'potable',
  'reclaimed-water': 'reclaimed',
  sewer: 'sewer',
};

/** In one ink the classes are told apart by dash as well as by word. */
const INK_DASHES: Readonly<Record<Utility, readonly number[]>> = {
  electric: [14, 3, 3, 3],
  'gas-oil-steam': [14, 6],
  communications: [5, 5],
  'potable-water': [22, 6],
  'reclaimed-water': [22, 4, 4, 4],
  sewer: [9, 4],
};

type Lines = (readonly Vec[])[];
type Batch = { readonly half: number; readonly lines: Lines };

/**
 * Lines of one class and doubt are painted as one path: a site may have thousands. Bands lie
 * lowest, so that no line is dimmed by a neighbour's doubt.
 */
export function drawBuriedLines(frame: Frame, buried: readonly BuriedLine[]): Group[] {
  const bands = new Map<string, Batch>();
  const cores = new Map<Utility, Lines>();
  const each: Group[] = [];
  for (const piece of buried) {
    const lines = placesOf(frame.plane, piece);
    const half = doubtMetres(frame, piece);
    const key = `${piece.utility}|${half.toFixed(3)}`;
    const batch = bands.get(key) ?? { half, lines: [] };
    batch.lines.push(...lines);
    bands.set(key, batch);
    const together = cores.get(piece.utility) ?? [];
    together.push(...lines);
    cores.set(piece.utility, together);
    each.push({
      id: piece.id,
      layer: 'ground',
      hit: { type: 'lines', lines, nearPx: 7 },
      marks: lines.flatMap((path) => wordMarks(frame, piece, path)),
    });
  }
  return [
    {
      id: '~buried-doubt',
      layer: 'ground',
      marks: [...bands].map(([key, b]) => band(frame, key, b)),
    },
    { id: '~buried-lines', layer: 'ground', marks: [...cores].map(([u, l]) => core(frame, u, l)) },
    ...each,
  ];
}

/** Metres each side of the drawn centreline in which the line may lie, tolerance included. */
export function doubtMetres(frame: Frame, piece: BuriedLine): number {
  const { values } = frame.limits;
  const doubt = {
    A: values.doubt_a_ft,
    B: values.doubt_b_ft,
    C: values.doubt_c_ft,
    D: values.doubt_d_ft,
  }[piece.quality ?? 'D'];
  const radius = inchesToMetres(piece.diameter_in ?? UNKNOWN_DIAMETER_IN.value) / 2;
  return radius + feetToMetres(values.buried_tolerance_ft + doubt);
}

function band(frame: Frame, key: string, { half, lines }: Batch): Mark {
  const utility = key.split('|')[0] as Utility;
  return line(
    lines,
    stroke(TOKENS[utility], 1, { widthMetres: half * 2, opacity: frame.inkOnly ? 0.07 : 0.17 }),
  );
}

function core(frame: Frame, utility: Utility, lines: Lines): Mark {
  return frame.inkOnly
    ? line(lines, stroke('ink', 2.5, { dash: INK_DASHES[utility] }))
    : line(lines, stroke(TOKENS[utility], 2.75, { casing: { token: 'casing', width: 5 } }));
}

function wordMarks(frame: Frame, piece: BuriedLine, path: readonly Vec[]): Mark[] {
  const word = UTILITY_WORDS[piece.utility];
  const size = piece.diameter_in === undefined ? '' : ` ${piece.diameter_in} in`;
  const text = frame.inkOnly ? `${word}${size}, ${piece.quality ?? 'D'}` : word;
  return wordsAlong(frame, path, text, frame.inkOnly ? 'ink' : `${TOKENS[piece.utility]}-word`);
}
