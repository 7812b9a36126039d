import type { Ring, Vec } from '../geo';
import type { Box, Clutter } from './clutter';
import { leastCost } from './least-cost';
import { words } from './marks';
import { textWidth } from './text-width';
import type { Token } from './themes';
import type { Px, TextMark } from './types';

export type Wanted = {
  readonly id: string;
  readonly text: string;
  readonly size: number;
  readonly at: Vec;
  /** How far the symbol reaches from its place, px. */
  readonly reach: number;
  readonly token: Token;
  /** True outline of a unit; its label stands beside one of its sides. */
  readonly ring: Ring | null;
};

/** Eight places round a symbol, the ones a reader expects first. */
const SIDES: readonly Px[] = [
  { x: 1, y: 0 },
  { x: 0.75, y: -0.75 },
  { x: 0.75, y: 0.75 },
  { x: -1, y: 0 },
  { x: -0.75, y: -0.75 },
  { x: -0.75, y: 0.75 },
  { x: 0, y: -1 },
  { x: 0, y: 1 },
];
const GAP_PX = 4;
/** A place further down the list must spare this much of what it would cover. */
const RANK_COST = 4;

type Place = { readonly offset: Px; readonly box: Box; readonly cost: number };

/** Puts each label, in the order given, where it covers least, and counts it as clutter then. */
export function placeLabels(
  clutter: Clutter,
  wanted: readonly Wanted[],
): { id: string; mark: TextMark }[] {
  return wanted.map((label) => {
    const size = { x: textWidth(label.text, label.size, 600), y: label.size * 1.15 };
    const at = clutter.toPx(label.at);
    const offsets = label.ring
      ? besideRing(clutter, label.ring, at, size)
      : besideSymbol(label, size);
    const { offset, box } = leastCost(offsets, RANK_COST, (candidate): Place => {
      const box = {
        x: at.x + candidate.x - size.x / 2,
        y: at.y + candidate.y - size.y / 2,
        w: size.x,
        h: size.y,
      };
      return { offset: candidate, box, cost: clutter.cost(box) };
    });
    clutter.addBox(box);
    return {
      id: label.id,
      mark: words(label.at, label.text, label.size, { token: label.token, offset }),
    };
  });
}

/** Close to the symbol, then once more a little further out. */
const besideSymbol = ({ reach }: Wanted, size: Px): Px[] =>
  [GAP_PX, GAP_PX + 12].flatMap((gap) =>
    SIDES.map(({ x, y }) => ({
      x: x * (reach + gap) + (Math.sign(x) * size.x) / 2,
      y: y * (reach + gap) + (Math.sign(y) * size.y) / 2,
    })),
  );

/** Along the two long sides from the middle outwards, then at the ends. */
function besideRing(clutter: Clutter, ring: Ring, at: Px, size: Px): Px[] {
  const [fl, fr, rr, rl] = ring.map((v) => clutter.toPx(v));
  if (!fl || !fr || !rr || !rl) return [{ x: 0, y: 0 }];
  const long = [0.5, 0.35, 0.65, 0.2, 0.8, 0.05];
  const sides: readonly (readonly [Px, Px, readonly number[]])[] = [
    [fr, rr, long],
    [rl, fl, long],
    [rr, rl, [0.5]],
    [fl, fr, [0.5]],
  ];
  return sides.flatMap(([a, b, parts]) => {
    const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
    // The ring runs clockwise, so its outside lies to the left of each side: y counts down here.
    const out = { x: (b.y - a.y) / length, y: -(b.x - a.x) / length };
    const reach = GAP_PX + 2 + (Math.abs(out.x) * size.x + Math.abs(out.y) * size.y) / 2;
    return parts.map((part) => ({
      x: a.x + (b.x - a.x) * part + out.x * reach - at.x,
      y: a.y + (b.y - a.y) * part + out.y * reach - at.y,
    }));
  });
}
