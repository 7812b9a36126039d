import { beside, span, stations } from '../curves';
import { INKS } from '../inks';
import type { Pen } from '../pen';
import type { Prepared } from '../prepare';
import type { Ft, Surface } from '../scene';

const FILL: Record<Surface, string> = {
  asphalt: INKS.asphalt,
  concrete: INKS.concrete,
  gravel: INKS.gravel,
};

type PreparedRoad = Prepared['roads'][number];
type Stand = Prepared['scene']['hardstands'][number];

/**
 * Everything loose or rolled opens into one another where it meets; slabs lie on it with an edge
 * of their own, and bridges cross over it.
 */
export function ways({ scene, roads, stones }: Prepared, pen: Pen): string[] {
  const seen = roads.filter((road) => pen.shows(road.line));
  const stands = scene.hardstands.filter((stand) => pen.shows(stand.outline));
  const slabs = stands.filter((stand) => stand.surface === 'concrete');
  const level = seen.filter((road) => !road.over);
  const bridges = seen.filter((road) => road.over);
  return [
    ...surfaced(
      level,
      stands.filter((stand) => stand.surface !== 'concrete'),
      pen,
    ),
    ...pebbles(stones, pen),
    ...firm(level, pen),
    ...slabs.flatMap((slab) => drawSlab(slab, pen)),
    ...bridges.flatMap((road) => [...surfaced([road], [], pen), ...paint(road, pen)]),
  ];
}

const edgePx = (pen: Pen): number => (pen.zoom >= 18 ? 1.2 : 0.8);
const widePx = (road: PreparedRoad, pen: Pen): number => pen.wide(road.width_ft, 1.5);

/** All edges first, then all surfaces, so that no edge runs across a mouth. */
function surfaced(roads: readonly PreparedRoad[], stands: readonly Stand[], pen: Pen): string[] {
  const edge = edgePx(pen) * 2;
  return [
    ...stands.map(({ outline }) =>
      pen.area(outline, INKS.kerb, { stroke: INKS.kerb, width: edge }),
    ),
    ...roads.map((road) =>
      pen.line(road.line, { stroke: INKS.kerb, width: widePx(road, pen) + edge }),
    ),
    ...stands.map(({ outline, surface }) => pen.area(outline, FILL[surface])),
    ...roads.map((road) =>
      pen.line(road.line, { stroke: FILL[road.surface], width: widePx(road, pen) }),
    ),
  ];
}

/** Asphalt again, over the gravel that runs up to it, with its paint. */
function firm(roads: readonly PreparedRoad[], pen: Pen): string[] {
  const asphalt = roads.filter((road) => road.surface === 'asphalt');
  return [
    ...asphalt.map((road) =>
      pen.line(road.line, { stroke: INKS.asphalt, width: widePx(road, pen) }),
    ),
    ...asphalt.flatMap((road) => paint(road, pen)),
  ];
}

function drawSlab({ outline }: Stand, pen: Pen): string[] {
  const slab = pen.area(outline, INKS.concrete, { stroke: INKS.kerb, width: edgePx(pen) });
  if (pen.zoom < 19) return [slab];
  const joints = jointsOf(outline);
  return [slab, ...joints.map((joint) => pen.line(joint, { stroke: INKS.joint, width: 1 }))];
}

/** Stones tell gravel from paving without colour. */
function pebbles(stones: readonly Ft[], pen: Pen): string[] {
  if (pen.zoom < 19) return [];
  const size = pen.wide(0.14, 0.6);
  return stones
    .filter((at, i) => (pen.zoom >= 20 || i % 3 === 0) && pen.shows([at]))
    .map((at) => pen.disc(at, size, INKS.stone));
}

/** Ten feet of paint and thirty of gap: the usual broken line of a road. */
const BROKEN_FT = [10, 30] as const;

function paint(road: PreparedRoad, pen: Pen): string[] {
  if (pen.zoom < 18) return [];
  return road.lines.map(({ offset_ft, dashed }) =>
    pen.line(beside(road.line, offset_ft), {
      stroke: INKS.roadPaint,
      width: pen.wide(0.5, 1.1),
      ...(dashed ? { dash: BROKEN_FT.map((ft) => ft * pen.pxPerFt) } : {}),
    }),
  );
}

const JOINT_SPACING_FT = 15;

/** Joints across a four-sided slab, square to its longer sides; other slabs stay plain. */
function jointsOf(outline: readonly Ft[]): Ft[][] {
  const [a, b, c, d, again] = outline;
  if (!a || !b || !c || !d || !again || outline.length !== 5) return [];
  const [one, other]: [Ft[], Ft[]] =
    span(a, b) > span(b, c)
      ? [
          [a, b],
          [d, c],
        ]
      : [
          [b, c],
          [a, d],
        ];
  const ends = stations(other, JOINT_SPACING_FT, JOINT_SPACING_FT);
  return stations(one, JOINT_SPACING_FT, JOINT_SPACING_FT).flatMap((start, i) => {
    const end = ends[i];
    return end ? [[start.at, end.at]] : [];
  });
}
