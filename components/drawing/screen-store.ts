'use client';

import { createStore } from 'zustand/vanilla';
import { useStore } from 'zustand';

type Screen = {
  /** The list of keys, the file sheet: at most one lies over the drawing. */
  readonly over: 'keys' | 'file' | null;
  /** True where the selection was made on the plan: a phone then shows the piece, not the checks. */
  readonly tagOpen: boolean;
  openTag(open: boolean): void;
  showKeys(shown: boolean): void;
  showFile(shown: boolean): void;
};

/** What lies over the drawing, apart from what is on it. One drawing is open at a time. */
export const screenStore = createStore<Screen>((set) => ({
  over: null,
  tagOpen: false,
  openTag: (tagOpen) => set({ tagOpen }),
  showKeys: (shown) => set({ over: shown ? 'keys' : null }),
  showFile: (shown) => set({ over: shown ? 'file' : null }),
}));

export const useScreen = <T>(selector: (state: Screen) => T): T => useStore(screenStore, selector);
