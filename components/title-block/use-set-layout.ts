'use client';

import { useDrawingStore } from '@/lib/client/use-drawing';
import type { Liquid } from '@/lib/layout';

/** Sets some members of the liquid, the rest as they were; with none left it is not entered. */
export function useSetLiquid(): (members: Partial<Liquid>, label: string) => void {
  const store = useDrawingStore();
  return (members, label) => {
    const { history, apply } = store.getState();
    const after: Liquid = { ...history.present.layout.liquid, ...members };
    const empty = Object.values(after).every((value) => value === null || value === undefined);
    apply({ type: 'set-layout', members: { liquid: empty ? null : after } }, label);
  };
}
