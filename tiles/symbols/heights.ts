import { stations } from '../curves';
import { INKS } from '../inks';
import { lettering } from '../lettering';
import { tidy, type Pen } from '../pen';
import type { Prepared } from '../prepare';
import type { Contour } from '../contours';

/** Every fifth line is drawn firmer, as on survey sheets. */
const INDEX_EVERY_FT = 5;

/** Feet between contour lines: close together they'd be a grey wash. */
const intervalFt = (zoom: number): number =>
  zoom >= 19 ? 1 : zoom === 18 ? 2 : zoom === 17 ? 5 : 10;

const isIndex = ({ height_ft }: Contour): boolean => height_ft % INDEX_EVERY_FT === 0;

const drawnAt = (contour: Contour, zoom: number): boolean =>
  contour.height_ft % intervalFt(zoom) === 0 || (zoom >= 18 && isIndex(contour));

export function contourLines({ contours }: Prepared, pen: Pen): string[] {
  return contours
    .filter((contour) => drawnAt(contour, pen.zoom) && pen.shows(contour.path))
    .map((contour) => {
      const firm = isIndex(contour) && pen.zoom >= 18;
      const stroke = firm ? INKS.indexContour : INKS.contour;
      return `<path d="${softened(contour, pen)}" fill="none" stroke="${stroke}" stroke-width="${firm ? 1.5 : 1.1}"/>`;
    });
}

/** Curves through the middles of the traced steps: without them a grid shows at close zoom. */
function softened(contour: Contour, pen: Pen): string {
  const px = contour.path.map((at) => pen.point(at));
  const first = px[0]!;
  let d = `M${tidy(first[0])} ${tidy(first[1])}`;
  for (let i = 1; i < px.length - 1; i++) {
    const [a, b] = [px[i]!, px[i + 1]!];
    d += `Q${tidy(a[0])} ${tidy(a[1])} ${tidy((a[0] + b[0]) / 2)} ${tidy((a[1] + b[1]) / 2)}`;
  }
  const last = px.at(-1)!;
  return `${d}L${tidy(last[0])} ${tidy(last[1])}`;
}

/** Heights on their lines, reading uphill side up, thin lines only where there is room. */
export function contourHeights({ contours, isOpen }: Prepared, pen: Pen): string[] {
  if (pen.zoom < 18) return [];
  return contours
    .filter((contour) => drawnAt(contour, pen.zoom) && (isIndex(contour) || pen.zoom >= 20))
    .flatMap((contour, i) => {
      const apart = (isIndex(contour) ? 560 : 980) / pen.pxPerFt;
      const start = apart * (0.25 + ((contour.height_ft * 0.37 + i * 0.11) % 0.5));
      return stations(contour.path, apart, start)
        .filter(({ at }) => pen.shows([at]) && isOpen(at))
        .map(({ at, toward_deg }) =>
          lettering(pen, {
            text: String(contour.height_ft),
            at,
            toward_deg,
            size: 17,
            ink: INKS.height,
            halo: 7,
          }),
        );
    });
}
