import { KIND_WORDS, mayJoin } from '../../edits';
import { findPiece, isRun, type Kind, type Piece, type Run } from '../../layout';
import { ENDS } from '../../layout/exchange/references';
import { targetAt } from './lead-end';
import type { Spot } from './outline-tool';
import type { Scene } from './types';

export const isRunKind = (kind: Kind): kind is Run['kind'] => kind in ENDS;

/** The piece there on which a run of the kind can start, or end when it starts on `start`. */
export function whereItFits(
  scene: Scene,
  kind: Run['kind'],
  start: Piece | null,
  { at, metresPerPx, on }: Spot,
): Piece | null {
  const fits = (piece: Piece): boolean =>
    start === null
      ? mayJoin(kind, 'from', piece) || mayJoin(kind, 'to', piece)
      : piece.id !== start.id &&
        ((mayJoin(kind, 'from', start) && mayJoin(kind, 'to', piece)) ||
          (mayJoin(kind, 'from', piece) && mayJoin(kind, 'to', start)));
  const pressed = on === null ? null : findPiece(scene.sheet, on);
  if (pressed && !isRun(pressed) && fits(pressed)) return pressed;
  return targetAt(scene, fits, at, metresPerPx);
}

/** What to press first, for a reader who pressed elsewhere. */
export function startWords(kind: Run['kind']): string {
  const { from, to } = ENDS[kind];
  const kinds = [...new Set([...from, ...to])].map((other) => KIND_WORDS[other]);
  const list = kinds.length > 1 ? `${kinds.slice(0, -1).join(', ')} or ${kinds.at(-1)}` : kinds[0];
  return `A ${KIND_WORDS[kind]} starts on a ${list}.`;
}
