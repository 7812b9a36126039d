'use client';

import { useEffect, useState } from 'react';
import type { LayoutAnswer } from '@/lib/api';
import { createDrawingStore } from '@/lib/client/drawing-store';
import { DrawingContext } from '@/lib/client/use-drawing';
import { createViewStore, ViewContext } from './map/view-store';
import { DrawingSheet } from './sheet/drawing-sheet';

export function DrawingScreen({ answer }: { answer: LayoutAnswer }) {
  const [store] = useState(() => createDrawingStore(answer, { asOf: new Date().toISOString() }));
  const [views] = useState(createViewStore);
  return (
    <DrawingContext value={store}>
      <ViewContext value={views}>
        <DrawingSheet />
      </ViewContext>
    </DrawingContext>
  );
}
