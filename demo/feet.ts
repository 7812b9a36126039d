import { feetToMetres, localPlane, nearestOnSegment, quantise, type LonLat } from '../lib/geo';
import type { Ft } from '../tiles/scene';

/** Readable feet east and north of a site's origin, turned into the file's positions. */
export type FromFeet = {
  readonly origin: LonLat;
  at(place: Ft): LonLat;
  path(places: readonly Ft[]): LonLat[];
  /** A closed ring; curves lose the points that a tape could not tell from a straight line. */
  ring(places: readonly Ft[]): LonLat[];
};

/** Half an inch: under the width of paint. */
const STRAIGHT_WITHIN_FT = 0.04;

export function fromFeet(origin: LonLat): FromFeet {
  const plane = localPlane(origin);
  const at = ([east, north]: Ft): LonLat =>
    quantise(plane.toLonLat({ x: feetToMetres(east), y: feetToMetres(north) }));
  const path = (places: readonly Ft[]): LonLat[] => thinned(places).map(at);
  return {
    origin,
    at,
    path,
    ring(places) {
      const ring = path(places);
      const [first, last] = [ring[0]!, ring.at(-1)!];
      return first[0] === last[0] && first[1] === last[1] ? ring : [...ring, first];
    },
  };
}

/** Douglas and Peucker's simplification: keeps the point farthest from the chord, and so on. */
function thinned(places: readonly Ft[]): Ft[] {
  if (places.length < 3) return [...places];
  const [a, b] = [vec(places[0]!), vec(places.at(-1)!)];
  let [farthest, worst] = [0, STRAIGHT_WITHIN_FT];
  for (let i = 1; i < places.length - 1; i++) {
    const { metres: feet } = nearestOnSegment(vec(places[i]!), a, b); // feet in, feet out
    if (feet > worst) [farthest, worst] = [i, feet];
  }
  if (farthest === 0) return [places[0]!, places.at(-1)!];
  return [
    ...thinned(places.slice(0, farthest + 1)).slice(0, -1),
    ...thinned(places.slice(farthest)),
  ];
}

const vec = ([x, y]: Ft) => ({ x, y });

/** A circle as a ring of 48 sides. */
export function circle(centre: Ft, radiusFt: number): Ft[] {
  const sides = 48;
  return Array.from({ length: sides + 1 }, (_, i): Ft => {
    const turn = (2 * Math.PI * (i % sides)) / sides;
    return [centre[0] + radiusFt * Math.sin(turn), centre[1] + radiusFt * Math.cos(turn)];
  });
}
