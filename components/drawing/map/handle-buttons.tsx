'use client';

import type { Handle } from '@/lib/client/handles';
import type { PlanView } from './plan-view';

const HALF_PX = 12;

/** The selected piece's corners, ends and turning as buttons: arrows move them, Delete takes out. */
export function HandleButtons({
  handles,
  name,
  view,
}: {
  handles: readonly Handle[];
  /** The piece they belong to. */
  name: string;
  view: PlanView;
}) {
  const seen = handles
    .map((handle) => ({ handle, at: view.toPx(handle.at) }))
    .filter(({ at }) => at.x >= 0 && at.y >= 0 && at.x <= view.size.x && at.y <= view.size.y);
  if (seen.length === 0) return null;
  return (
    <div role="group" aria-label={`Corners and ends of ${name}`}>
      {seen.map(({ handle, at }) => (
        <button
          key={JSON.stringify(handle.under)}
          type="button"
          data-under={JSON.stringify(handle.under)}
          aria-label={`${handle.words} ${name}`}
          style={{ left: at.x - HALF_PX, top: at.y - HALF_PX }}
          className="absolute size-6"
        />
      ))}
    </div>
  );
}
