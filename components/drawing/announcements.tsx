'use client';

import { useDrawing } from '@/lib/client/use-drawing';

/** Read out by assistive technology when a change has come to rest. */
export function Announcements() {
  const words = useDrawing((state) => state.announcement);
  return (
    <p role="status" aria-live="polite" className="sr-only" data-announcement>
      {words}
    </p>
  );
}
