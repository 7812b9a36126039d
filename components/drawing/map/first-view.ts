import { feetToMetres, type LonLat, type Vec } from '@/lib/geo';
import { footprintOf, isUnit, placesOf, planeOf, type Kind, type Sheet } from '@/lib/layout';

/** Ground shown round the middle of a drawing on which little or nothing is drawn yet. */
const LEAST_REACH_FT = 60;
const EMPTY_REACH_FT = 120;
/** What reaches far round everything and would make the rest small. */
const WIDE: readonly Kind[] = ['warm-zone', 'note'];

/** What a drawing opens on: what the layout holds, or the ground round the origin of an empty one. */
export function placesToShow(sheet: Sheet): LonLat[] {
  const plane = planeOf(sheet.layout);
  const drawn = sheet.layout.pieces
    .filter(({ kind }) => !WIDE.includes(kind))
    .flatMap((piece) =>
      isUnit(piece) ? footprintOf(plane, piece) : placesOf(plane, piece).flat(),
    );
  const [low, high] = reaching(drawn);
  return [plane.toLonLat(low), plane.toLonLat(high)];
}

/** Lower left and upper right corner of what is shown, never less than a scene's worth of ground. */
function reaching(places: readonly Vec[]): [Vec, Vec] {
  const reach = feetToMetres(places.length === 0 ? EMPTY_REACH_FT : LEAST_REACH_FT);
  const [xs, ys] = [places.map((v) => v.x), places.map((v) => v.y)];
  const span = (values: number[]): [number, number] => {
    const [low, high] = values.length ? [Math.min(...values), Math.max(...values)] : [0, 0];
    const middle = (low + high) / 2;
    return [Math.min(low, middle - reach), Math.max(high, middle + reach)];
  };
  const [x, y] = [span(xs), span(ys)];
  return [
    { x: x[0], y: y[0] },
    { x: x[1], y: y[1] },
  ];
}
