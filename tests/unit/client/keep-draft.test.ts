import { expect, test } from 'vitest';
import type { Draft, DraftShelf } from '@/lib/client/saving/draft-shelf';
import { DRAFT_AFTER_MS, keepDraft } from '@/lib/client/saving/keep-draft';
import { drawingOn } from './drawing-on';

function kept({ refuse = false } = {}) {
  const store = drawingOn();
  const shelf = { draft: null as Draft | null, refuse };
  const troubles: unknown[] = [];
  const timers: (() => void)[] = [];
  const memory: DraftShelf = {
    read: async () => shelf.draft,
    write: async (draft) => {
      if (shelf.refuse) throw new Error('no room');
      shelf.draft = draft;
    },
    remove: async () => {
      shelf.draft = null;
    },
  };
  const keeper = keepDraft(store, memory, {
    later: (work, ms) => {
      expect(ms).toBe(DRAFT_AFTER_MS);
      timers.push(work);
      return () => timers.splice(timers.indexOf(work), 1);
    },
    now: () => '2031-05-04T14:00:00.000Z',
    onTrouble: (error) => troubles.push(error),
  });
  const tick = async (): Promise<void> => {
    timers.splice(0).forEach((work) => work());
    await new Promise((done) => setTimeout(done, 0));
  };
  return { store, shelf, keeper, tick, troubles, timers };
}

const named = (name: string) => ({ type: 'set-layout', members: { name } }) as const;

test('unsaved changes are in the browser within a second, with the versions they came from', async () => {
  const { store, shelf, keeper, tick, timers } = kept();
  expect(DRAFT_AFTER_MS).toBeLessThanOrEqual(1000);
  store.getState().apply(named('B'), 'Set name');
  store.getState().apply(named('C'), 'Set name');
  expect(timers).toHaveLength(1);
  expect(keeper.isKept()).toBe(false);
  await tick();
  expect(keeper.isKept()).toBe(true);
  expect(shelf.draft).toMatchObject({
    layoutId: 'layout-1',
    personId: 'me',
    layoutVersion: 1,
    sheet: { layout: { name: 'C' } },
  });
});

test('a confirmed save takes the draft away', async () => {
  const { store, shelf, tick } = kept();
  store.getState().apply(named('B'), 'Set name');
  await tick();
  const { history, base, setBase } = store.getState();
  setBase({ ...base, layoutVersion: 2, sheet: history.present });
  await tick();
  expect(shelf.draft).toBeNull();
});

test('a browser that can’t keep the draft says so once, and the page may not be closed', async () => {
  const { store, shelf, keeper, tick, troubles } = kept({ refuse: true });
  store.getState().apply(named('B'), 'Set name');
  await tick();
  store.getState().apply(named('C'), 'Set name');
  await tick();
  expect(troubles).toHaveLength(1);
  expect(keeper.isKept()).toBe(false);
  shelf.refuse = false;
  store.getState().apply(named('D'), 'Set name');
  await tick();
  expect(keeper.isKept()).toBe(true);
  expect(shelf.draft?.sheet.layout.name).toBe('D');
});
