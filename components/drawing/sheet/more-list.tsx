'use client';

import Link from 'next/link';
import { ThemeSwitch } from '@/components/ui/theme-switch';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { downloadSheet } from '../files/download';
import { useScreen } from '../screen-store';

const ITEM =
  'flex min-h-11 w-full cursor-pointer items-center px-3 text-left underline-offset-4 hover:underline';

/** What is wanted now and then: files, history, the keys, the way back to the site. */
export function MoreList({ onDone }: { onDone: () => void }) {
  const store = useDrawingStore();
  const { layoutId, siteId, siteName } = useDrawing((state) => state.meta);
  const canDraw = useDrawing((state) => state.canDraw);
  const showKeys = useScreen((state) => state.showKeys);
  const showFile = useScreen((state) => state.showFile);

  const doing = (work: () => void) => () => {
    onDone();
    work();
  };
  const download = doing(() => {
    const { history, limits } = store.getState();
    void downloadSheet(history.present, limits);
  });

  return (
    <>
      <li>
        <a href="#pieces" className={ITEM} onClick={onDone}>
          Pieces table
        </a>
      </li>
      <li>
        <Link href={`/layouts/${layoutId}/history`} className={ITEM}>
          History of this layout
        </Link>
      </li>
      <li>
        <button type="button" className={ITEM} onClick={download}>
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
    </>
  );
}
