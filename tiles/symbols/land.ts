import { step } from '../curves';
import { INKS } from '../inks';
import { tidy, type Pen } from '../pen';
import type { Prepared } from '../prepare';
import type { Ft } from '../scene';

/** Fields with their rows; rows only where they stand far enough apart to read as rows. */
export function fields({ scene, rows }: Prepared, pen: Pen): string[] {
  const marks = scene.fields.map((field) => pen.area(field.outline, INKS.field));
  if (pen.zoom >= 19) {
    const width = pen.wide(0.5, 0.7);
    for (const row of rows) {
      if (pen.shows(row)) marks.push(pen.line(row, { stroke: INKS.furrow, width }));
    }
  }
  return marks;
}

/** A ditch as its floor with tick marks down both banks, pointing to the low ground. */
export function ditches({ ditches: all }: Prepared, pen: Pen): string[] {
  return all.flatMap(({ line, outline }) => {
    if (!pen.shows(outline)) return [];
    if (pen.zoom < 19) {
      return [pen.area(outline, INKS.ditch, { stroke: INKS.ditchBank, width: 0.8 })];
    }
    const marks = [pen.area(outline, INKS.ditch, { stroke: INKS.ditchBank, width: 1 })];
    for (const [i, middle] of line.entries()) {
      // The outline runs up one bank and back down the other, so its two ends meet each station.
      for (const bank of [outline[i]!, outline[2 * line.length - 1 - i]!]) {
        const tick: Ft[] = [bank, halfway(bank, middle)];
        if (pen.shows(tick)) marks.push(pen.line(tick, { stroke: INKS.ditchBank, width: 0.9 }));
      }
    }
    return [...marks, pen.line(line, { stroke: INKS.ditchBank, width: 1, dash: [9, 6] })];
  });
}

const halfway = (a: Ft, b: Ft): Ft => [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];

const LOBES = 9;

/** A tree as its crown seen from above, with a lobed edge and the stem. */
export function trees({ scene }: Prepared, pen: Pen): string[] {
  return scene.trees.flatMap(({ at, crown_ft }, i) => {
    const radius = crown_ft / 2;
    const rim = Array.from({ length: LOBES }, (_, k): Ft => {
      const uneven = 1 + 0.09 * Math.sin(i * 2.7 + k * 2.1);
      return step(at, (k * 360) / LOBES + i * 17, radius * uneven);
    });
    if (!pen.shows(rim)) return [];
    if (pen.zoom < 18) return [pen.disc(at, pen.wide(radius, 1), INKS.crown)];
    const px = rim.map((p) => pen.point(p));
    const arcs = px.map((_, k) => {
      const [a, b] = [px[k]!, px[(k + 1) % LOBES]!];
      const bulge = Math.hypot(b[0] - a[0], b[1] - a[1]) * 0.58;
      return `A${tidy(bulge)} ${tidy(bulge)} 0 0 1 ${tidy(b[0])} ${tidy(b[1])}`;
    });
    const start = px[0]!;
    const d = `M${tidy(start[0])} ${tidy(start[1])}${arcs.join('')}Z`;
    return [
      `<path d="${d}" fill="${INKS.crown}" fill-opacity="0.9" stroke="${INKS.crownEdge}" stroke-width="1.1"/>`,
      pen.disc(at, pen.wide(0.5, 1.2), INKS.crownEdge),
    ];
  });
}
