import type { DrawingStore } from '../drawing-store';
import type { DraftKey, DraftShelf } from './draft-shelf';
import { isDirty } from './saved-base';

/** The draft is never older than this, whatever befalls the page. */
export const DRAFT_AFTER_MS = 400;

export type DraftKeeper = {
  /** True where everything unsaved is also in the draft, so that the page may be closed. */
  isKept(): boolean;
  stop(): void;
};

/**
 * Writes the drawing into this browser while it has unsaved changes, and takes the draft away once
 * the server has them. `onTrouble` is told once when the browser refuses to keep it.
 */
export function keepDraft(
  store: DrawingStore,
  shelf: DraftShelf,
  {
    later,
    now,
    onTrouble,
  }: {
    later: (work: () => void, ms: number) => () => void;
    now: () => string;
    onTrouble: (error: unknown) => void;
  },
): DraftKeeper {
  const { meta } = store.getState();
  const key: DraftKey = { layoutId: meta.layoutId, personId: meta.me.id };
  let kept = store.getState().history.present;
  let callOff: (() => void) | null = null;
  let busy: Promise<void> = Promise.resolve();
  let troubled = false;

  async function write(): Promise<void> {
    const { history, base } = store.getState();
    const { present } = history;
    try {
      if (isDirty(present, base)) {
        const { layoutVersion, groundVersion } = base;
        const changed = {
          layout: present.layout !== base.sheet.layout,
          site: present.site !== base.sheet.site,
        };
        const versions = { layoutVersion, groundVersion };
        await shelf.write({ ...key, at: now(), sheet: present, changed, ...versions });
      } else {
        await shelf.remove(key);
      }
      kept = present;
      troubled = false;
    } catch (error) {
      if (!troubled) onTrouble(error);
      troubled = true;
    }
  }

  const plan = (): void => {
    callOff ??= later(() => {
      callOff = null;
      // One after the other: an older write that ends late must not undo a newer one.
      busy = busy.then(write);
    }, DRAFT_AFTER_MS);
  };

  const unsubscribe = store.subscribe((state, before) => {
    if (state.history.present !== before.history.present || state.base !== before.base) plan();
  });

  return {
    isKept() {
      const { history, base } = store.getState();
      return !isDirty(history.present, base) || kept === history.present;
    },
    stop() {
      unsubscribe();
      if (!callOff) return;
      callOff();
      busy = busy.then(write);
    },
  };
}
