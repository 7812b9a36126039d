'use client';

import type { ReactNode } from 'react';
import type { InHand } from '@/lib/client/in-hand';
import { useDrawing } from '@/lib/client/use-drawing';
import { KitSymbol } from './kit-symbol';

/** Two of a kind and size are the same thing in hand. */
const sameInHand = (a: InHand | null, b: InHand): boolean =>
  a !== null && a.kind === b.kind && JSON.stringify(a.members) === JSON.stringify(b.members);

/** Picks the item; pressed again it is put down. */
export function ShelfButton({
  inHand,
  words,
  note,
  dim = false,
  disabled = false,
  small = false,
  tabIndex,
  onFocus,
}: {
  inHand: InHand;
  words: string;
  /** How many are left, or that it is drawn. */
  note: ReactNode;
  dim?: boolean;
  disabled?: boolean;
  small?: boolean;
  tabIndex: 0 | -1;
  onFocus: () => void;
}) {
  const held = useDrawing((s) => sameInHand(s.inHand, inHand));
  const take = useDrawing((s) => s.take);
  const putDown = useDrawing((s) => s.putDown);
  return (
    <button
      type="button"
      data-stop
      aria-pressed={held}
      aria-disabled={disabled || undefined}
      tabIndex={tabIndex}
      onFocus={onFocus}
      onClick={() => {
        if (held) putDown();
        else if (!disabled) take(inHand);
      }}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && held) putDown();
      }}
      className={`pointer-coarse:min-h-11 inline-flex shrink-0 cursor-pointer items-center gap-1 border-[1.5px] px-1 text-left leading-tight ${
        small ? 'min-h-7' : 'min-h-11 py-1'
      } ${
        held
          ? 'border-action bg-action text-on-action [&_.stroke-margin]:stroke-[var(--action)]'
          : 'border-transparent hover:border-ink'
      } ${(dim || disabled) && !held ? 'text-ink-soft' : ''} ${disabled ? '!cursor-default' : ''}`}
    >
      <KitSymbol kind={inHand.kind} size={small ? 22 : 32} />
      <span>
        <span
          className={`whitespace-nowrap ${small ? 'text-[15px]' : 'block text-[15px] font-semibold'}`}
        >
          {words}
        </span>
        {note}
      </span>
    </button>
  );
}
