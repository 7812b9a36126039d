import type { StaleGround, StaleLayout } from '../../api';
import type { Layout, Sheet, SiteGround } from '../../layout';
import { Problem } from '../api/problem';
import type { DrawingStore } from '../drawing-store';
import { changeLabel } from './change-label';
import { isDirty, ontoTheirs, rebase, type Confirmed } from './saved-base';
import { sameDocument } from './same-document';
import { refusal, type Sending, type Stale } from './sending';
import { saveState, type SaveStatus } from './save-state';

/** A change is sent at most this long after it was made, while the server answers. */
export const SAVE_AFTER_MS = 800;
export const BACK_OFF_MS = [1_000, 2_000, 5_000, 10_000, 20_000] as const;

export type SaveQueue = {
  /** Tries now: the network is back, someone signed in again, the page is about to be hidden. */
  retry(): Promise<void>;
  /** The other version that a save ran into; null unless the person has to choose. */
  stale(): Stale | null;
  /** Called when `stale()` has changed. Returns how to stop listening. */
  onStale(listener: () => void): () => void;
  /** Saves the drawing as it stands over theirs, which stays in the history. */
  keepMine(): Promise<void>;
  /** Puts theirs under the drawing. What was drawn here must have been kept elsewhere before. */
  takeTheirs(): void;
  stop(): void;
};

/** Sends changes one at a time, in order, each against the version the server confirmed last. */
export function startSaving(store: DrawingStore, sending: Sending): SaveQueue {
  const { getState } = store;
  const listeners = new Set<() => void>();
  let inFlight: Promise<void> | null = null;
  let callOff: (() => void) | null = null;
  let failures = 0;
  let stopped = false;
  let held: Stale | null = null;
  /** Sent, and no answer came: the server may hold any of these although we were not told. */
  const unanswered = { layouts: new Set<Layout>(), sites: new Set<SiteGround>() };

  const dirty = (): boolean => isDirty(getState().history.present, getState().base);
  const tell = (status: SaveStatus, at = getState().save.at, why: string | null = null): void =>
    getState().setSave(saveState(status, at, why));

  const hold = (next: Stale | null): void => {
    held = next;
    listeners.forEach((listener) => listener());
  };
  const dropPlan = (): void => {
    callOff?.();
    callOff = null;
  };
  const plan = (ms: number): void => {
    if (callOff || stopped) return;
    callOff = sending.later(() => {
      callOff = null;
      void send();
    }, ms);
  };

  function send(): Promise<void> {
    if (inFlight) return inFlight;
    if (stopped || held || !dirty()) return Promise.resolve();
    dropPlan();
    tell('saving');
    inFlight = sendChanges()
      .catch(refused)
      .finally(() => {
        inFlight = null;
        if (getState().save.status === 'unsaved') plan(SAVE_AFTER_MS);
      });
    return inFlight;
  }

  async function sendChanges(): Promise<void> {
    const { history, base } = getState();
    const { layout, site } = history.present;
    const label = changeLabel(history, base.sheet);
    if (layout !== base.sheet.layout) {
      unanswered.layouts.add(layout);
      const saved = await sending.putLayout(base.layoutVersion, { layout, label });
      confirm({ layout, layoutVersion: saved.version }, saved.saved_at);
    }
    if (site !== base.sheet.site) {
      unanswered.sites.add(site);
      const saved = await sending.putGround(base.groundVersion, { ground: site, label });
      confirm({ site, groundVersion: saved.version }, saved.saved_at);
    }
  }

  function confirm(part: Confirmed, at: string): void {
    const { base, setBase } = getState();
    if (part.layout) unanswered.layouts.clear();
    if (part.site) unanswered.sites.clear();
    setBase(rebase(base, part));
    failures = 0;
    tell(dirty() ? 'unsaved' : 'saved', at);
  }

  function refused(error: unknown): void {
    if (!(error instanceof Problem)) throw error;
    if (error.code === 'stale') {
      ranInto(error.current as StaleLayout | StaleGround);
      return;
    }
    const { status, why, again } = refusal(error);
    // A refusal is an answer. Only silence, or a server that broke, leaves it open what is held.
    if (status !== 'offline' && error.status < 500) forgetUnanswered();
    tell(status, undefined, why);
    if (again) plan(BACK_OFF_MS[Math.min(failures++, BACK_OFF_MS.length - 1)]!);
  }

  function ranInto(current: StaleLayout | StaleGround): void {
    const stale: Stale =
      'layout' in current
        ? { what: 'layout', theirs: current }
        : { what: 'ground', theirs: current };
    const ours = findOurs(stale);
    if (ours) {
      confirm(ours, current.saved_at);
      return;
    }
    hold(stale);
    tell('stale');
  }

  /** Our own earlier save, where it had arrived and only its answer was lost: nothing to ask. */
  function findOurs({ what, theirs }: Stale): Confirmed | null {
    if (what === 'layout') {
      const layout = [...unanswered.layouts].find((sent) => sameDocument(sent, theirs.layout));
      return layout ? { layout, layoutVersion: theirs.version } : null;
    }
    const site = [...unanswered.sites].find((sent) => sameDocument(sent, theirs.ground));
    return site ? { site, groundVersion: theirs.version } : null;
  }

  function forgetUnanswered(): void {
    unanswered.layouts.clear();
    unanswered.sites.clear();
  }

  const unsubscribe = store.subscribe((now, before) => {
    if (now.history.present === before.history.present) return;
    const { status } = now.save;
    if (!dirty()) {
      if (!held && status !== 'saving' && status !== 'read-only') tell('saved');
      return;
    }
    if (status === 'saved') tell('unsaved');
    if (status !== 'stale') plan(SAVE_AFTER_MS);
  });

  if (dirty()) {
    tell('unsaved');
    plan(SAVE_AFTER_MS);
  }

  return {
    retry: () => {
      dropPlan();
      return send();
    },
    stale: () => held,
    onStale(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    keepMine() {
      if (!held) return Promise.resolve();
      getState().setBase(ontoTheirs(getState().base, held));
      hold(null);
      return send();
    },
    takeTheirs() {
      if (!held) return;
      const base = ontoTheirs(getState().base, held);
      const { present } = getState().history;
      const sheet: Sheet =
        held.what === 'layout'
          ? { layout: base.sheet.layout, site: present.site }
          : { layout: present.layout, site: base.sheet.site };
      const at = held.theirs.saved_at;
      hold(null);
      forgetUnanswered();
      getState().load(sheet, base);
      tell(dirty() ? 'unsaved' : 'saved', at);
      if (dirty()) plan(SAVE_AFTER_MS);
    },
    stop() {
      stopped = true;
      dropPlan();
      unsubscribe();
    },
  };
}
