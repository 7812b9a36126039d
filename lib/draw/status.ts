import type { Finding, Status } from '../checks';
import type { Vec } from '../geo';
import { SYSTEMS, unitOf, type Sheet } from '../layout';
import type { Clutter } from './clutter';
import type { Frame } from './frame';
import { fill, glyph, pxLine, stroke, words } from './marks';
import type { Group, Hit, Mark, Px } from './types';
import { movesOf } from './remedy-moves';
import { walk } from './walk';

type Told = 'not-met' | 'not-known' | 'caution';
const WORST_FIRST: readonly Told[] = ['not-met', 'not-known', 'caution'];

/** What is not known for want of an entry is told once, in the checks, not on every piece. */
const OF_THE_LAYOUT: readonly string[] = ['wind', 'slope', 'source', 'hot-zone', 'vent', 'kit'];

/** The status shape on every piece that something is the matter with, the worst one of each. */
export function drawStatuses(
  frame: Frame,
  groups: readonly Group[],
  findings: readonly Finding[],
  clutter: Clutter,
): Group[] {
  const worst = worstByPiece(frame.sheet, findings);
  return groups.flatMap((group): Group[] => {
    const status = worst.get(group.id);
    if (!status || !group.hit) return [];
    return [
      { id: group.id, layer: 'dimension', marks: statusMarks(frame, group.hit, status, clutter) },
    ];
  });
}

function worstByPiece(sheet: Sheet, findings: readonly Finding[]): Map<string, Told> {
  const worst = new Map<string, Told>();
  for (const finding of findings) {
    const { status } = finding;
    if (!isTold(status) || !isOfThePiece(finding)) continue;
    for (const subject of atFault(finding)) {
      const id = pieceIdOf(sheet, finding.rule, subject);
      const before = id === null ? undefined : worst.get(id);
      if (id === null) continue;
      if (!before || WORST_FIRST.indexOf(status) < WORST_FIRST.indexOf(before)) {
        worst.set(id, status);
      }
    }
  }
  return worst;
}

const isTold = (status: Status): status is Told =>
  (WORST_FIRST as readonly Status[]).includes(status);

/** In calm every piece is cautioned alike and nothing is measured: that too is told once. */
const isOfThePiece = ({ status, measured, missing }: Finding): boolean =>
  status === 'not-met' ||
  (status === 'caution' && measured !== null) ||
  (status === 'not-known' && !missing.some((what) => OF_THE_LAYOUT.includes(what)));

/** Where moving one of the subjects is the remedy, only that one is marked. */
function atFault({ subjects, remedy }: Finding): readonly string[] {
  const moved = remedy ? subjects.filter((id) => movesOf(remedy).some((m) => m.id === id)) : [];
  return moved.length > 0 ? moved : subjects;
}

/** Lines of the ground are never marked: it is the piece that has to move. */
function pieceIdOf({ layout }: Sheet, rule: string, subject: string): string | null {
  if (layout.pieces.some(({ id }) => id === subject)) return subject;
  const system = SYSTEMS.find((letter) => letter === subject);
  return system && rule === 'units-grounded' ? (unitOf(layout, system)?.id ?? null) : null;
}

const FRAME_GAP_PX = 4;
const BADGE_PX = 8;

function statusMarks(frame: Frame, hit: Hit, status: Told, clutter: Clutter): Mark[] {
  if (hit.type === 'spot' && status === 'not-met') {
    const half = hit.radiusPx + FRAME_GAP_PX;
    clutter.addSpot(hit.at, half);
    return [
      glyph(hit.at, [
        pxLine(square(half), stroke('alarm', 3, { casing: { token: 'paper', width: 5 } }), true),
      ]),
    ];
  }
  const { at, offset } = badgePlace(hit);
  const px = clutter.toPx(at);
  const size = BADGE_PX * frame.symbols;
  clutter.addBox({
    x: px.x + offset - size,
    y: px.y - offset - size,
    w: size * 2,
    h: size * 2,
  });
  return badge(at, { x: offset, y: -offset }, status, frame.symbols);
}

function badgePlace(hit: Hit): { at: Vec; offset: number } {
  if (hit.type === 'spot') return { at: hit.at, offset: hit.radiusPx * 0.75 + 3 };
  if (hit.type === 'lines') {
    const way = walk(hit.lines[0] ?? []);
    const middle = way.at(way.metres / 2)?.at ?? hit.lines[0]?.[0];
    return { at: middle ?? { x: 0, y: 0 }, offset: 0 };
  }
  const [fl, , rr] = hit.rings[0] ?? [];
  const centre = fl && rr ? { x: (fl.x + rr.x) / 2, y: (fl.y + rr.y) / 2 } : { x: 0, y: 0 };
  return { at: centre, offset: 0 };
}

const square = (half: number): (readonly [number, number])[] => [
  [-half, -half],
  [half, -half],
  [half, half],
  [-half, half],
];

/** The shape that stands for the status everywhere: square, reversed block with ?, triangle. */
function badge(at: Vec, offset: Px, status: Told, size: number): Mark[] {
  const moved = (points: readonly (readonly [number, number])[]) =>
    points.map(([x, y]): readonly [number, number] => [x * size + offset.x, y * size + offset.y]);
  const edge = stroke('paper', 2);
  if (status === 'caution') {
    const triangle = moved([
      [0, -7.5],
      [8, 6.5],
      [-8, 6.5],
    ]);
    return [
      glyph(at, [
        pxLine(
          triangle,
          stroke('caution', 2, { casing: { token: 'paper', width: 5 } }),
          true,
          fill('paper'),
        ),
      ]),
    ];
  }
  if (status === 'not-met')
    return [glyph(at, [pxLine(moved(square(7)), edge, true, fill('alarm'))])];
  return [
    glyph(at, [pxLine(moved(square(8)), edge, true, fill('ink'))]),
    words(at, '?', 14, { offset, token: 'paper', halo: null, weight: 700 }),
  ];
}
