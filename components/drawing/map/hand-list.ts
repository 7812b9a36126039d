import type { DisplayList, Group, Mark, Px, PxShape } from '@/lib/draw';
import type { Handle } from '@/lib/client/handles';
import type { Guide } from '@/lib/client/tools';
import { feetToMetres, type LocalPlane, type Vec } from '@/lib/geo';
import type { Limits } from '@/lib/limits';
import { piecesOf, placeOf, type Rod, type Sheet } from '@/lib/layout';

/** What comes and goes under the hand: handles, the outline being drawn, where a rod may stand. */
export function handList(
  handles: readonly Handle[],
  guide: Guide | null,
  band: DisplayList | null,
  plane: LocalPlane,
): DisplayList {
  const groups: Group[] = [...(band?.groups ?? [])];
  if (guide) groups.push({ id: '~guide', layer: 'dimension', marks: guideMarks(guide, plane) });
  if (handles.length > 0) {
    groups.push({ id: '~handles', layer: 'label', marks: handles.map(handleMark) });
  }
  return { groups };
}

const square = (half: number): Px[] => [
  { x: -half, y: -half },
  { x: half, y: -half },
  { x: half, y: half },
  { x: -half, y: half },
];

const disc = (radius: number): PxShape => ({
  type: 'disc',
  at: { x: 0, y: 0 },
  radius,
  stroke: { token: 'spruce', width: 2 },
  fill: { token: 'paper', opacity: 1 },
});

const SHAPES: Record<Handle['under']['type'], readonly PxShape[]> = {
  piece: [],
  vertex: [
    {
      type: 'line',
      points: square(6),
      closed: true,
      stroke: { token: 'spruce', width: 2 },
      fill: { token: 'paper', opacity: 1 },
    },
  ],
  end: [disc(7)],
  turn: [disc(8), { ...disc(2.5), fill: { token: 'spruce', opacity: 1 } }],
  middle: [{ ...disc(4), stroke: { token: 'spruce', width: 1.5 } }],
};

const handleMark = ({ at, under }: Handle): Mark => ({
  type: 'glyph',
  at,
  turnDeg: 0,
  shapes: SHAPES[under.type],
});

function guideMarks({ line, closed, corners, crosshair }: Guide, plane: LocalPlane): Mark[] {
  const marks: Mark[] = [];
  if (line.length > 1) {
    marks.push({
      type: 'path',
      lines: [line.map((place) => plane.toPlane(place))],
      closed,
      stroke: { token: 'spruce', width: 2.5, dash: [7, 5] },
      fill: closed ? { token: 'spruce', opacity: 0.08 } : null,
    });
  }
  for (const corner of corners) {
    marks.push({ type: 'glyph', at: plane.toPlane(corner), turnDeg: 0, shapes: SHAPES.vertex });
  }
  if (crosshair) marks.push(cross(plane.toPlane(crosshair)));
  return marks;
}

const arm = (from: Px, to: Px): PxShape => ({
  type: 'line',
  points: [from, to],
  closed: false,
  stroke: { token: 'ink', width: 2, casing: { token: 'paper', width: 6 } },
  fill: null,
});

const cross = (at: Vec): Mark => ({
  type: 'glyph',
  at,
  turnDeg: 0,
  shapes: [
    arm({ x: -22, y: 0 }, { x: -5, y: 0 }),
    arm({ x: 5, y: 0 }, { x: 22, y: 0 }),
    arm({ x: 0, y: -22 }, { x: 0, y: -5 }),
    arm({ x: 0, y: 5 }, { x: 0, y: 22 }),
  ],
});

const RING_STEPS = 72;

/** The ground where a rod may stand as far as its jumpers go: a ring round each rod joined to it. */
export function jumperBand(sheet: Sheet, rod: Rod, plane: LocalPlane, limits: Limits): DisplayList {
  const joined = piecesOf(sheet.layout.pieces, 'jumper').flatMap((jumper) => {
    const other = jumper.from === rod.id ? jumper.to : jumper.to === rod.id ? jumper.from : null;
    return other ? piecesOf(sheet.layout.pieces, 'rod').filter(({ id }) => id === other) : [];
  });
  const { rods_apart_min_ft: least, rods_apart_max_ft: most } = limits.values;
  const marks = joined.map((other): Mark => {
    const at = placeOf(plane, other);
    return {
      type: 'path',
      lines: [ring(at, feetToMetres(most)), ring(at, feetToMetres(least))],
      closed: true,
      stroke: { token: 'spruce', width: 1.5 },
      fill: { token: 'spruce', opacity: 0.2 },
    };
  });
  return { groups: marks.length > 0 ? [{ id: '~band', layer: 'zone', marks }] : [] };
}

const ring = (at: Vec, radius: number): Vec[] =>
  Array.from({ length: RING_STEPS }, (_, i) => {
    const angle = (i / RING_STEPS) * 2 * Math.PI;
    return { x: at.x + radius * Math.cos(angle), y: at.y + radius * Math.sin(angle) };
  });
