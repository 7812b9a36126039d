'use client';

import { useState } from 'react';
import type { LayoutAnswer } from '@/lib/api';
import { createDrawingStore } from '@/lib/client/drawing-store';
import { DrawingContext } from '@/lib/client/use-drawing';
import { Announcements } from './announcements';
import { createViewStore, ViewContext } from './map/view-store';
import { OverDrawing } from './over-drawing';
import { KeepSaved } from './saving/keep-saved';
import { Sheet } from './sheet/sheet';
import { useClock } from './use-clock';
import { useForethought } from './use-forethought';
import { useShortcuts } from './use-shortcuts';

export function DrawingScreen({ answer }: { answer: LayoutAnswer }) {
  const [store] = useState(() => createDrawingStore(answer, { asOf: new Date().toISOString() }));
  const [views] = useState(createViewStore);
  return (
    <DrawingContext value={store}>
      <ViewContext value={views}>
        <KeepSaved>
          <Running />
          <Sheet />
          <Announcements />
          <OverDrawing />
        </KeepSaved>
      </ViewContext>
    </DrawingContext>
  );
}

/** What goes on while the drawing is open, apart from what is seen of it. */
function Running() {
  useClock();
  useShortcuts();
  useForethought();
  return null;
}
