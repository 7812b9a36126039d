'use client';

import { useRef, type KeyboardEvent, type PointerEvent, type ReactNode } from 'react';
import { normaliseDegrees } from '@/lib/geo';
import { spokenDegrees } from './condition-words';
import { directionTo } from './dial-geometry';
import type { Turning } from './use-turn';

const STEPS: Record<string, number> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 10,
  PageDown: -10,
};

/**
 * One direction on the dial that can be turned: by drag, by the arrow keys (1°, with Shift 10°),
 * or where it is not known yet by one press where it should point. `children` is its arrow, drawn
 * as pointing north and turned from here.
 */
export function DialHand({
  name,
  degrees,
  turning,
  disabled,
  onClear,
  grip,
  whole,
  children,
}: {
  name: string;
  degrees: number | null;
  turning: Turning;
  disabled: boolean;
  onClear: () => void;
  /** Where the known arrow can be taken, as it points north. */
  grip: ReactNode;
  /** Where a press says which way, while it is not known. */
  whole: ReactNode;
  children: ReactNode;
}) {
  const dragged = useRef(false);
  const shown = degrees ?? 0;

  const directionOf = (event: PointerEvent<SVGGElement>): number | null => {
    const box = event.currentTarget.ownerSVGElement?.getBoundingClientRect();
    if (!box) return null;
    const x = event.clientX - (box.left + box.width / 2);
    const y = event.clientY - (box.top + box.height / 2);
    return Math.hypot(x, y) < 2 ? null : directionTo(x, y);
  };

  const turnTo = (event: PointerEvent<SVGGElement>): void => {
    const direction = directionOf(event);
    if (direction !== null) turning.show(direction);
  };

  const onPointerDown = (event: PointerEvent<SVGGElement>): void => {
    if (disabled || event.button !== 0) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    event.currentTarget.focus();
    event.preventDefault();
    dragged.current = true;
    if (degrees === null) turnTo(event);
  };

  const onKeyDown = (event: KeyboardEvent<SVGGElement>): void => {
    if (disabled) return;
    const step = STEPS[event.key];
    const now = turning.underWay() ?? shown;
    if (step !== undefined) {
      const by = event.shiftKey && Math.abs(step) === 1 ? step * 10 : step;
      turning.step(Math.round(normaliseDegrees(now + by)) % 360);
    } else if (event.key === 'Home') turning.step(0);
    else if (event.key === 'Enter') turning.finish();
    else if (event.key === 'Escape' && turning.underWay() !== null) turning.cancel();
    else if (event.key === 'Delete' || event.key === 'Backspace') onClear();
    else return;
    event.preventDefault();
    event.stopPropagation();
  };

  return (
    <g
      role="slider"
      tabIndex={disabled ? -1 : 0}
      aria-label={name}
      aria-valuemin={0}
      aria-valuemax={359}
      aria-valuenow={Math.round(shown) % 360}
      aria-valuetext={degrees === null ? 'not known' : spokenDegrees(degrees)}
      aria-disabled={disabled || undefined}
      className={`group outline-none ${disabled ? '' : 'cursor-grab active:cursor-grabbing'}`}
      style={{ touchAction: 'none' }}
      onPointerDown={onPointerDown}
      onPointerMove={(event) => dragged.current && turnTo(event)}
      onPointerUp={() => {
        dragged.current = false;
        turning.finish();
      }}
      onPointerCancel={() => {
        dragged.current = false;
        turning.cancel();
      }}
      onKeyDown={onKeyDown}
      onBlur={() => turning.finish()}
    >
      <g transform={`rotate(${shown})`}>
        {children}
        {degrees !== null && grip}
      </g>
      {degrees === null && whole}
    </g>
  );
}
