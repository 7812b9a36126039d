import type { Finding, Remedy } from '../checks';
import { distance, type Vec } from '../geo';
import type { Frame } from './frame';
import { movesOf } from './remedy-moves';
import { fill, glyph, line, pxDisc, stroke } from './marks';
import type { Group, Mark, Stroke } from './types';
import { add, leftOf, subtract, times, unitVector } from './vectors';

/** A glow beneath the piece in hand and, fainter, beneath the one under the pointer. */
export function drawFocus(
  groups: readonly Group[],
  selection: string | null,
  hovered: string | null,
): Group[] {
  return groups.flatMap((group): Group[] => {
    const chosen = group.id === selection;
    if (!group.hit || (!chosen && group.id !== hovered)) return [];
    return [{ id: `~focus-${group.id}`, layer: 'run', marks: glow(group, chosen ? 0.34 : 0.18) }];
  });
}

function glow({ hit }: Group, opacity: number): Mark[] {
  const wide = (width: number): Stroke => stroke('spruce', width, { opacity, cap: 'round' });
  if (hit?.type === 'spot') {
    return [glyph(hit.at, [pxDisc(hit.radiusPx + 7, null, fill('spruce', opacity))])];
  }
  if (hit?.type === 'lines') return [line(hit.lines, wide(14))];
  return hit ? [line(hit.rings, wide(16), true)] : [];
}

/** Where the piece in hand would go if its remedy were taken: an arrow to an open ring. */
export function drawRemedies(
  frame: Frame,
  findings: readonly Finding[],
  focus: readonly string[],
): Group[] {
  return findings
    .filter((finding) => finding.status === 'not-met' && focus.some((id) => moves(finding, id)))
    .flatMap(({ id, remedy }) => {
      const marks = remedy ? moveMarks(frame, remedy) : [];
      return marks.length > 0 ? [{ id: `~remedy-${id}`, layer: 'dimension' as const, marks }] : [];
    })
    .slice(0, 1);
}

const moves = ({ remedy }: Finding, id: string): boolean =>
  remedy !== null && movesOf(remedy).some((move) => move.id === id);

function moveMarks(frame: Frame, remedy: Remedy): Mark[] {
  return movesOf(remedy).flatMap(({ id, to }) => {
    const piece = frame.sheet.layout.pieces.find((p) => p.id === id);
    if (!piece || !('at' in piece)) return [];
    const [from, target] = [frame.vec(piece.at), frame.vec(to)];
    const ring = glyph(target, [pxDisc(9, stroke('spruce', 2.5, { dash: [4, 3] }))]);
    return [...arrow(frame, from, target), ring];
  });
}

function arrow(frame: Frame, from: Vec, to: Vec): Mark[] {
  const direction = unitVector(from, to);
  if (!direction || distance(from, to) < frame.metres(24)) return [];
  const tip = subtract(to, times(direction, frame.metres(10)));
  const back = subtract(tip, times(direction, frame.metres(9)));
  const barb = times(leftOf(direction), frame.metres(5));
  return [
    line([[add(from, times(direction, frame.metres(10))), back]], stroke('spruce', 2.5)),
    line(
      [[add(back, barb), tip, subtract(back, barb)]],
      stroke('spruce', 2.5),
      true,
      fill('spruce'),
    ),
  ];
}
