'use client';

import { useMemo } from 'react';
import { useDrawing } from '@/lib/client/use-drawing';
import { groundItems } from './ground-items';
import { KitChoice } from './kit-choice';
import { PumpChoice } from './pump-choice';
import { ShelfButton } from './shelf-button';
import { alongItems, shelfItems } from './shelf-items';
import { useRoving } from './use-roving';

/** The kit as it lies in the case, and what comes from no kit, in the bottom margin. */
export function KitShelf() {
  const canDraw = useDrawing((s) => s.canDraw);
  const putDown = useDrawing((s) => s.putDown);
  if (!canDraw) return null;
  return (
    <section
      aria-label="Kit shelf"
      className="grid gap-x-5 gap-y-2 px-3 py-2 lg:grid-cols-[11rem_minmax(0,1fr)]"
      onKeyDown={(event) => {
        if (event.key === 'Escape') putDown();
      }}
    >
      <div className="grid grid-cols-2 gap-2 lg:grid-cols-1 lg:gap-1 [&_label]:text-sm">
        <KitChoice />
        <PumpChoice />
      </div>
      <div className="min-w-0">
        <FromTheKit />
        <OnTheGround />
      </div>
    </section>
  );
}

const ROW =
  'flex gap-x-1 overflow-x-auto overscroll-x-contain [scrollbar-width:thin] lg:flex-wrap lg:overflow-visible';

function FromTheKit() {
  const layout = useDrawing((s) => s.sheet.layout);
  const findings = useDrawing((s) => s.findings);
  const items = useMemo(() => shelfItems(layout, findings), [layout, findings]);
  const along = useMemo(() => alongItems(layout), [layout]);
  const { tabIndexOf, onFocus, onKeyDown } = useRoving(items.length);
  return (
    <div role="toolbar" aria-label="From the kit" className={ROW} onKeyDown={onKeyDown}>
      {items.map((item, place) => (
        <ShelfButton
          key={item.key}
          inHand={item.inHand}
          words={item.words}
          note={<Left left={item.left} />}
          dim={item.left !== null && item.left <= 0}
          tabIndex={tabIndexOf(place)}
          onFocus={() => onFocus(place)}
        />
      ))}
      {along.length > 0 && (
        <p className="shrink-0 self-center px-2 text-sm leading-tight text-ink-soft">
          Also in the kit: {along.map(({ words, count }) => `${count} ${words}`).join(', ')}
        </p>
      )}
    </div>
  );
}

function Left({ left }: { left: number | null }) {
  const words =
    left === null
      ? 'as many as needed'
      : left > 0
        ? `${left} left`
        : left === 0
          ? 'none left'
          : `${-left} short`;
  const alarm = left !== null && left <= 0;
  return (
    <span className={`block whitespace-nowrap text-sm ${alarm ? 'font-semibold text-alarm' : ''}`}>
      {words}
    </span>
  );
}

function OnTheGround() {
  const layout = useDrawing((s) => s.sheet.layout);
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  const items = useMemo(() => groundItems(layout, canChangeSite), [layout, canChangeSite]);
  const { tabIndexOf, onFocus, onKeyDown } = useRoving(items.length);
  return (
    <div
      role="toolbar"
      aria-label="On the ground"
      className={`${ROW} mt-1 border-t border-rule-faint pt-1`}
      onKeyDown={onKeyDown}
    >
      {items.map((item, place) => (
        <ShelfButton
          key={item.key}
          small
          inHand={item.inHand}
          words={item.words}
          note={item.drawn && <span className="text-sm"> drawn</span>}
          disabled={item.drawn}
          tabIndex={tabIndexOf(place)}
          onFocus={() => onFocus(place)}
        />
      ))}
    </div>
  );
}
