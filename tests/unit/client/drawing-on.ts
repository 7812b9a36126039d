import type { LayoutAnswer } from '@/lib/api';
import { createDrawingStore, type DrawingStore, type Frame } from '@/lib/client/drawing-store';
import { emptyLayout, EMPTY_GROUND } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';

export const ORIGIN = [-100, 40] as const;

export function answerOf(more: Partial<LayoutAnswer> = {}): LayoutAnswer {
  return {
    id: 'layout-1',
    version: 1,
    layout: emptyLayout(ORIGIN, 'Plan A'),
    site: { id: 'site-1', name: 'Siding', ground: EMPTY_GROUND, ground_version: 1 },
    limits: limitsFrom(),
    limits_number: 1,
    kits: [],
    base_map: null,
    agency: { name: 'A county' },
    me: {
      id: 'me',
      name: 'P. Lanner',
      role: 'planner',
      can: ['agency.see', 'layout.draw', 'site.change'],
    },
    drawn_by: null,
    saved_by: null,
    saved_at: '2031-05-04T14:00:00.000Z',
    ...more,
  };
}

/** Frames run at once: a test has no screen to wait for. */
const atOnce: Frame = (work) => {
  work();
  return () => {};
};

export const drawingOn = (answer: LayoutAnswer = answerOf(), frame: Frame = atOnce): DrawingStore =>
  createDrawingStore(answer, { asOf: '2031-05-04T14:00:00Z', frame });
