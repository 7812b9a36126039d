import { textWidth, type Weight } from '@/lib/draw';

/** Browsers set some words a little wider than the font's plain figures. */
const SAFETY = 1.05;

/** How many lines `text` takes in a column, broken between words as a browser does. */
export function linesNeeded(
  text: string,
  widthPx: number,
  sizePx: number,
  weight: Weight = 400,
): number {
  const wide = (words: string): number => textWidth(words, sizePx, weight) * SAFETY;
  let lines = 1;
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (wide(longer) <= widthPx || line === '') line = longer;
    else {
      lines += 1;
      line = word;
    }
    // A word that is wider than the column is broken anywhere.
    lines += Math.max(0, Math.ceil(wide(line) / widthPx) - 1) * (line === word ? 1 : 0);
  }
  return lines;
}
