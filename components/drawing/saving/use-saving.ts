'use client';

import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { saveGround, saveLayout } from '@/lib/client/api';
import { browserShelf, type Draft } from '@/lib/client/saving/draft-shelf';
import { keepDraft } from '@/lib/client/saving/keep-draft';
import { startSaving, type SaveQueue } from '@/lib/client/saving/save-queue';
import type { Stale } from '@/lib/client/saving/sending';
import { draftSheet, takeUpDraft } from '@/lib/client/saving/take-up-draft';
import { useDrawingStore } from '@/lib/client/use-drawing';

export type Saving = {
  /** Changes that an earlier visit left in this browser, to be decided on. */
  readonly draft: Draft | null;
  takeUp(): void;
  leave(): void;
  /** The other version that a save ran into, to be decided on. */
  readonly stale: Stale | null;
  keepMine(): void;
  takeTheirs(): void;
  /** Sends what is not saved; done when the server has answered. */
  saveNow(): Promise<void>;
};

const later = (work: () => void, ms: number): (() => void) => {
  const timer = setTimeout(work, ms);
  return () => clearTimeout(timer);
};

const NOT_KEPT =
  'This browser refuses to keep a copy of what is not saved (private window or no room). Don’t close this page until it says “All saved”.';

/** Keeps the drawing: in this browser at once, on the server as soon as it answers. */
export function useSaving(): Saving {
  const store = useDrawingStore();
  const [shelf] = useState(browserShelf);
  const [draft, setDraft] = useState<Draft | null | 'looking'>('looking');
  const [stale, setStale] = useState<Stale | null>(null);
  const queue = useRef<SaveQueue | null>(null);

  const key = useMemo(() => {
    const { meta } = store.getState();
    return { layoutId: meta.layoutId, personId: meta.me.id };
  }, [store]);

  useEffect(() => {
    let left = false;
    const found = (kept: Draft | null): void => {
      if (left) return;
      const holdsMore = kept !== null && draftSheet(store, kept) !== null;
      if (kept && !holdsMore) void shelf.remove(key);
      setDraft(holdsMore ? kept : null);
    };
    // A browser without storage has no draft to give; that it can't keep one is said when it must.
    shelf.read(key).then(found, () => found(null));
    return () => {
      left = true;
    };
  }, [store, shelf, key]);

  useEffect(() => {
    if (draft !== null) return;
    const { layoutId } = key;
    const { siteId } = store.getState().meta;
    const saving = startSaving(store, {
      putLayout: (version, body) => saveLayout(layoutId, version, body),
      putGround: (version, body) => saveGround(siteId, version, body),
      later,
    });
    queue.current = saving;
    const unlisten = saving.onStale(() => setStale(saving.stale()));
    const keeper = keepDraft(store, shelf, {
      later,
      now: () => new Date().toISOString(),
      onTrouble: () => store.getState().complain(NOT_KEPT),
    });

    const again = (): void => void saving.retry();
    const onVisible = (): void => void saving.retry();
    const onLeave = (event: BeforeUnloadEvent): void => {
      if (!keeper.isKept()) event.preventDefault();
    };
    window.addEventListener('online', again);
    window.addEventListener('focus', again);
    document.addEventListener('visibilitychange', onVisible);
    window.addEventListener('beforeunload', onLeave);
    return () => {
      window.removeEventListener('online', again);
      window.removeEventListener('focus', again);
      document.removeEventListener('visibilitychange', onVisible);
      window.removeEventListener('beforeunload', onLeave);
      unlisten();
      // What the last second brought goes out now; the draft has it should that fail.
      void saving.retry();
      saving.stop();
      keeper.stop();
      queue.current = null;
    };
  }, [store, shelf, key, draft]);

  const takeUp = useCallback(() => {
    if (draft && draft !== 'looking') takeUpDraft(store, draft);
    setDraft(null);
  }, [store, draft]);

  const leave = useCallback(() => {
    void shelf.remove(key);
    setDraft(null);
  }, [shelf, key]);

  return {
    draft: draft === 'looking' ? null : draft,
    takeUp,
    leave,
    stale,
    keepMine: () => void queue.current?.keepMine(),
    takeTheirs: () => queue.current?.takeTheirs(),
    saveNow: async () => queue.current?.retry(),
  };
}
