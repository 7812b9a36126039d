'use client';

import Link from 'next/link';
import { useEffect, useId, useRef, useState } from 'react';
import { ThemeSwitch } from '@/components/ui/theme-switch';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { downloadSheet } from '../files/download';
import { useScreen } from '../screen-store';

const ITEM =
  'flex min-h-11 w-full cursor-pointer items-center px-3 text-left underline-offset-4 hover:underline';

/** What is wanted now and then: files, history, the keys, the way back to the site. */
export function More() {
  const store = useDrawingStore();
  const { layoutId, siteId, siteName } = useDrawing((state) => state.meta);
  const canDraw = useDrawing((state) => state.canDraw);
  const showKeys = useScreen((state) => state.showKeys);
  const showFile = useScreen((state) => state.showFile);
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

  const doing = (work: () => void) => () => {
    setOpen(false);
    work();
  };

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
        <li>
          <a href="#pieces" className={ITEM} onClick={() => setOpen(false)}>
            Pieces table
          </a>
        </li>
        <li>
          <Link href={`/layouts/${layoutId}/history`} className={ITEM}>
            History of this layout
          </Link>
        </li>
        <li>
          <button
            type="button"
            className={ITEM}
            onClick={doing(() => {
              const { history, limits } = store.getState();
              void downloadSheet(history.present, limits);
            })}
          >
            Save as a file
          </button>
        </li>
        {canDraw && (
          <li>
            <button type="button" className={ITEM} onClick={doing(() => showFile(true))}>
              Bring in a file
            </button>
          </li>
        )}
        <li>
          <button type="button" className={ITEM} onClick={doing(() => showKeys(true))}>
            Keys
          </button>
        </li>
        <li className="border-t border-rule px-3">
          <ThemeSwitch />
        </li>
        <li className="border-t border-rule">
          <Link href={`/sites/${siteId}`} className={ITEM}>
            Site: {siteName}
          </Link>
        </li>
        <li>
          <Link href="/sites" className={ITEM}>
            All sites
          </Link>
        </li>
      </ul>
    </div>
  );
}
