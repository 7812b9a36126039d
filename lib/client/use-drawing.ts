'use client';

import { createContext, useContext } from 'react';
import { useStore } from 'zustand';
import type { DrawingState, DrawingStore } from './drawing-store';

export const DrawingContext = createContext<DrawingStore | null>(null);

/** The store itself, for handlers that read it when called rather than when drawn. */
export function useDrawingStore(): DrawingStore {
  const store = useContext(DrawingContext);
  if (!store) throw new Error('useDrawing is only for what lies on the drawing sheet');
  return store;
}

export const useDrawing = <T>(selector: (state: DrawingState) => T): T =>
  useStore(useDrawingStore(), selector);
