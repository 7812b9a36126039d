'use client';

import { useEffect, useId, useRef, useState } from 'react';
import { MoreList } from './after-plan';

/** Opens what is wanted now and then. */
export function More() {
  const [open, setOpen] = useState(false);
  const box = useRef<HTMLDivElement>(null);
  const listId = useId();

  useEffect(() => {
    if (!open) return;
    const close = (event: PointerEvent | FocusEvent): void => {
      if (!box.current?.contains(event.target as Node)) setOpen(false);
    };
    document.addEventListener('pointerdown', close);
    document.addEventListener('focusin', close);
    return () => {
      document.removeEventListener('pointerdown', close);
      document.removeEventListener('focusin', close);
    };
  }, [open]);

  return (
    <div
      ref={box}
      className="relative shrink-0"
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || !open) return;
        event.stopPropagation();
        setOpen(false);
        box.current?.querySelector('button')?.focus();
      }}
    >
      <button
        type="button"
        aria-expanded={open}
        aria-controls={listId}
        className="min-h-11 cursor-pointer border-l border-rule pl-3 font-semibold underline-offset-4 hover:underline"
        onClick={() => setOpen(!open)}
      >
        More
      </button>
      <ul
        id={listId}
        hidden={!open}
        className="absolute right-0 top-full z-[900] w-64 border-[1.5px] border-ink bg-paper py-1"
      >
        <MoreList onDone={() => setOpen(false)} />
      </ul>
    </div>
  );
}
