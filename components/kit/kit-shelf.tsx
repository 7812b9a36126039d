'use client';

import { useMemo } from 'react';
import { useAtRest } from '@/components/pieces/use-at-rest';
import type { DrawingState } from '@/lib/client/drawing-store';
import { useDrawing } from '@/lib/client/use-drawing';
import { groundItems } from './ground-items';
import { KitChoice } from './kit-choice';
import { PumpChoice } from './pump-choice';
import { ShelfButton } from './shelf-button';
import { alongItems, shelfItems } from './shelf-items';
import { useRoving } from './use-roving';

const pickLayout = (state: DrawingState) => state.sheet.layout;
const pickFindings = (state: DrawingState) => state.findings;

/** The kit as it lies in the case, and what comes from no kit, in the bottom margin. */
export function KitShelf() {
  const canDraw = useDrawing((s) => s.canDraw);
  const putDown = useDrawing((s) => s.putDown);
  if (!canDraw) return null;
  return (
    <section
      aria-label="Kit shelf"
      className="px-3 py-1.5"
      onKeyDown={(event) => {
        if (event.key === 'Escape') putDown();
      }}
    >
      <FromTheKit />
      <OnTheGround />
    </section>
  );
}

const ROW =
  'relative flex items-center gap-x-1 overflow-x-auto overscroll-x-contain [scrollbar-width:thin] max-sm:flex-wrap';

function FromTheKit() {
  const layout = useAtRest(pickLayout);
  const findings = useAtRest(pickFindings);
  const items = useMemo(() => shelfItems(layout, findings), [layout, findings]);
  const along = useMemo(() => alongItems(layout), [layout]);
  const { tabIndexOf, onFocus, onKeyDown } = useRoving(items.length);
  return (
    <div className={ROW}>
      <KitChoice className="mr-1 w-36 shrink-0" />
      <div
        role="toolbar"
        aria-label="From the kit"
        className="flex shrink-0 gap-x-1 max-sm:shrink max-sm:flex-wrap"
        onKeyDown={onKeyDown}
      >
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
      </div>
      {along.length > 0 && (
        <p className="w-32 shrink-0 px-2 text-sm leading-tight text-ink-soft">
          Also {along.map(({ words, count }) => `${count} ${words}`).join(', ')}
        </p>
      )}
    </div>
  );
}

function Left({ left }: { left: number | null }) {
  if (left === null) return null;
  const words = left > 0 ? `${left} left` : left === 0 ? 'none left' : `${-left} short`;
  return (
    <span
      className={`block whitespace-nowrap text-sm ${left <= 0 ? 'font-semibold text-alarm' : ''}`}
    >
      {words}
    </span>
  );
}

function OnTheGround() {
  const layout = useAtRest(pickLayout);
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  const items = useMemo(() => groundItems(layout, canChangeSite), [layout, canChangeSite]);
  const { tabIndexOf, onFocus, onKeyDown } = useRoving(items.length);
  return (
    <div
      role="toolbar"
      aria-label="On the ground"
      className={`${ROW} mt-0.5 !gap-x-0.5 border-t border-rule-faint pt-0.5 lg:flex-wrap lg:overflow-visible`}
      onKeyDown={onKeyDown}
    >
      {items.map((item, place) => (
        <ShelfButton
          key={item.key}
          small
          inHand={item.inHand}
          words={item.words}
          note={item.drawn && <span className="sr-only"> drawn</span>}
          disabled={item.drawn}
          tabIndex={tabIndexOf(place)}
          onFocus={() => onFocus(place)}
        />
      ))}
      <PumpChoice className="ml-auto w-52 shrink-0" />
    </div>
  );
}
