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

/** Everything at ground level opens into one another where it meets; bridges cross over it. */
export function ways({ scene, roads, stones }: Prepared, pen: Pen): string[] {
  const seen = roads.filter((road) => pen.shows(road.line));
  const stands = scene.hardstands.filter((stand) => pen.shows(stand.outline));
  const level = seen.filter((road) => !road.over);
  const bridges = seen.filter((road) => road.over);
  return [
    ...surfaced(level, stands, pen),
    ...textures(stands, stones, pen),
    ...level.flatMap((road) => paint(road, pen)),
    ...bridges.flatMap((road) => [...surfaced([road], [], pen), ...paint(road, pen)]),
  ];
}

/** All edges first, then all surfaces, so that no edge runs across a mouth. */
function surfaced(roads: readonly PreparedRoad[], stands: readonly Stand[], pen: Pen): string[] {
  const edge = pen.zoom >= 18 ? 1.2 : 0.8;
  const wide = (road: PreparedRoad): number => pen.wide(road.width_ft, 1.5);
  return [
    ...stands.map(({ outline }) =>
      pen.area(outline, INKS.kerb, { stroke: INKS.kerb, width: edge * 2 }),
    ),
    ...roads.map((road) =>
      pen.line(road.line, { stroke: INKS.kerb, width: wide(road) + edge * 2 }),
    ),
    ...stands.map(({ outline, surface }) => pen.area(outline, FILL[surface])),
    ...roads.map((road) => pen.line(road.line, { stroke: FILL[road.surface], width: wide(road) })),
  ];
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

/** Stones on gravel and joints in concrete: surfaces told apart without colour. */
function textures(stands: readonly Stand[], stones: readonly Ft[], pen: Pen): string[] {
  if (pen.zoom < 19) return [];
  const size = pen.wide(0.14, 0.6);
  const scattered = stones.filter((at, i) => (pen.zoom >= 20 || i % 3 === 0) && pen.shows([at]));
  return [
    ...scattered.map((at) => pen.disc(at, size, INKS.stone)),
    ...stands
      .filter((stand) => stand.surface === 'concrete')
      .flatMap((stand) => jointsOf(stand.outline))
      .map((joint) => pen.line(joint, { stroke: INKS.joint, width: 1 })),
  ];
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
