import { beside, rectangle } from '../curves';
import { INKS } from '../inks';
import type { Pen } from '../pen';
import type { Prepared } from '../prepare';

/** Standard gauge, 4 ft 8½ in between the rails' inner faces; the heads are 0.23 ft wide. */
const HALF_GAUGE_FT = 4.708 / 2 + 0.115;
const TIE_LENGTH_FT = 8.5;
const TIE_WIDTH_FT = 0.75;
const BALLAST_WIDTH_FT = 13;

/** Track: ballast, ties and both rails at true size; far out, one line with a few cross strokes. */
export function tracks({ rails }: Prepared, pen: Pen): string[] {
  const seen = rails.filter((rail) => pen.shows(rail.line));
  if (pen.zoom < 19) {
    return seen.flatMap(({ line, ties }) => [
      pen.line(line, { stroke: INKS.rail, width: pen.zoom >= 18 ? 1.4 : 1 }),
      ...ties
        .filter((_, i) => i % (pen.zoom >= 18 ? 8 : 16) === 0)
        .map(({ at, toward_deg }) => {
          const tie = rectangle(at, toward_deg + 90, TIE_LENGTH_FT, 0);
          return pen.line(tie.slice(1, 3), { stroke: INKS.rail, width: 1 });
        }),
    ]);
  }
  return [
    ...seen.map(({ line }) =>
      pen.line(line, { stroke: INKS.ballast, width: pen.wide(BALLAST_WIDTH_FT) }),
    ),
    ...seen.flatMap(({ ties }) =>
      ties.flatMap(({ at, toward_deg }) => {
        const tie = rectangle(at, toward_deg + 90, TIE_LENGTH_FT, TIE_WIDTH_FT);
        return pen.shows(tie) ? [pen.area(tie, INKS.tie)] : [];
      }),
    ),
    ...seen.flatMap(({ line }) =>
      [-HALF_GAUGE_FT, HALF_GAUGE_FT].map((offset) =>
        pen.line(beside(line, offset), { stroke: INKS.rail, width: pen.wide(0.23, 1.2) }),
      ),
    ),
  ];
}
