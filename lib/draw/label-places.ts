import type { Ring, Vec } from '../geo';
import type { Frame } from './frame';
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
  /** True outline of a unit; its label stands beside it. */
  readonly ring: Ring | null;
};

type Box = { readonly x: number; readonly y: number; readonly w: number; readonly h: number };

/** Where labels go, best first: beside, then above and below. */
const SIDES: readonly Px[] = [
  { x: 1, y: 0 },
  { x: 0.8, y: -0.8 },
  { x: 0.8, y: 0.8 },
  { x: -1, y: 0 },
  { x: -0.8, y: -0.8 },
  { x: -0.8, y: 0.8 },
  { x: 0, y: -1 },
  { x: 0, y: 1 },
];
const GAP_PX = 5;

/** Tries eight places round each piece and takes the one that covers least. */
export function placeLabels(
  frame: Frame,
  wanted: readonly Wanted[],
): { id: string; mark: TextMark }[] {
  const taken: Box[] = wanted.filter((w) => w.ring === null).map((w) => symbolBox(frame, w));
  return wanted.map((label) => {
    const width = textWidth(label.text, label.size, 600);
    const height = label.size * 1.2;
    let best: { offset: Px; box: Box; cost: number } | null = null;
    SIDES.forEach((side, rank) => {
      const offset = offsetFor(frame, label, side, width, height);
      const box = {
        x: label.at.x / frame.view.metresPerPx + offset.x - width / 2,
        y: -label.at.y / frame.view.metresPerPx + offset.y - height / 2,
        w: width,
        h: height,
      };
      const cost = rank + taken.reduce((sum, other) => sum + overlap(box, other), 0);
      if (!best || cost < best.cost) best = { offset, box, cost };
    });
    const { offset, box } = best!;
    taken.push(box);
    return {
      id: label.id,
      mark: words(label.at, label.text, label.size, { token: label.token, offset }),
    };
  });
}

function offsetFor(frame: Frame, label: Wanted, side: Px, width: number, height: number): Px {
  const reach = label.ring ? ringReach(frame, label, side) : label.reach;
  const out = reach + GAP_PX;
  return {
    x: side.x === 0 ? 0 : Math.sign(side.x) * (out * Math.abs(side.x) + width / 2),
    y: side.y === 0 ? 0 : Math.sign(side.y) * (out * Math.abs(side.y) + height / 2),
  };
}

/** How far the unit's outline reaches from its centre towards that side, px. */
function ringReach(frame: Frame, label: Wanted, side: Px): number {
  return Math.max(
    ...label.ring!.map(
      (v) => ((v.x - label.at.x) * side.x - (v.y - label.at.y) * side.y) / frame.view.metresPerPx,
    ),
  );
}

const symbolBox = (frame: Frame, { at, reach }: Wanted): Box => ({
  x: at.x / frame.view.metresPerPx - reach,
  y: -at.y / frame.view.metresPerPx - reach,
  w: reach * 2,
  h: reach * 2,
});

function overlap(a: Box, b: Box): number {
  const w = Math.min(a.x + a.w, b.x + b.w) - Math.max(a.x, b.x);
  const h = Math.min(a.y + a.h, b.y + b.h) - Math.max(a.y, b.y);
  return w > 0 && h > 0 ? w * h : 0;
}
