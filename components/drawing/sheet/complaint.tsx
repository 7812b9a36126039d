'use client';

import { Notice } from '@/components/ui/notice';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';

/** What could not be done, until it is put away or something else is done. */
export function Complaint() {
  const store = useDrawingStore();
  const words = useDrawing((state) => state.complaint);
  const status = useDrawing((state) => state.save.status);
  const layoutId = useDrawing((state) => state.meta.layoutId);
  return (
    <>
      {status === 'signed-out' && (
        <Notice
          kind="failed"
          title="You are signed out. What you draw is kept in this browser."
          className="mx-2 my-1 !py-1.5"
        >
          <a
            href={`/sign-in?callbackUrl=${encodeURIComponent(`/layouts/${layoutId}`)}`}
            target="_blank"
            rel="noreferrer"
            className="underline underline-offset-4"
          >
            Sign in in another tab
          </a>
          , then come back: it saves by itself.
        </Notice>
      )}
      {words && (
        <div className="mx-2 my-1 flex items-start gap-3">
          <Notice kind="caution" title={words} className="grow !py-1.5" />
          <button
            type="button"
            className="pointer-coarse:min-h-11 min-h-9 shrink-0 cursor-pointer px-2 underline underline-offset-4"
            onClick={() => store.getState().complain(null)}
          >
            Put away
          </button>
        </div>
      )}
    </>
  );
}
