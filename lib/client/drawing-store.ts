import { createStore, type StoreApi } from 'zustand/vanilla';
import { ROLE_WORDS, whoMay } from '../access';
import type { LayoutAnswer } from '../api';
import { firstToFail, runChecks, standsFor } from '../checks';
import type { Finding, FirstToFail, WindArc } from '../checks';
import {
  applyEdit,
  commit,
  EditError,
  newHistory,
  redo,
  redoLabel,
  undo,
  undoLabel,
} from '../edits';
import type { Edit, History } from '../edits';
import type { Limits } from '../limits';
import type { Sheet } from '../layout';
import type { InHand } from './in-hand';
import { saveState, type SaveState } from './saving/save-state';

/** What surrounds the sheet: whose it is, where it lies, who looks at it. */
export type DrawingMeta = {
  readonly layoutId: string;
  readonly siteId: string;
  readonly siteName: string;
  readonly agencyName: string;
  readonly me: LayoutAnswer['me'];
  readonly drawnBy: string | null;
  readonly kits: LayoutAnswer['kits'];
  readonly baseMap: LayoutAnswer['base_map'];
};

/** What the server confirmed last; saving measures every later change against it. */
export type SavedBase = {
  readonly sheet: Sheet;
  readonly layoutVersion: number;
  readonly groundVersion: number;
};

type Answers = {
  readonly findings: readonly Finding[];
  readonly standsFor: WindArc | null;
  readonly firstToFail: FirstToFail;
};

export type DrawingState = Answers & {
  readonly meta: DrawingMeta;
  readonly base: SavedBase;
  readonly history: History;
  /** What is seen: the history's present, with the preview's edits on it while there are any. */
  readonly sheet: Sheet;
  readonly preview: readonly Edit[] | null;
  readonly limits: Limits;
  /** The instant the checks answer for; a hook moves it on. */
  readonly asOf: string | null;
  readonly selection: string | null;
  readonly hovered: string | null;
  /** Id of the finding pointed at in the strip; the plan shows its dimension. */
  readonly shownFinding: string | null;
  readonly inHand: InHand | null;
  readonly save: SaveState;
  readonly canDraw: boolean;
  readonly canChangeSite: boolean;
  /** Read out once by assistive technology, at rest. */
  readonly announcement: string;
  /** What could not be done, in words, until dismissed. */
  readonly complaint: string | null;

  /**
   * One gesture, one entry of the history; steps that share `gesture` and follow one another are
   * one entry too. False, with a complaint, where it can't be done.
   */
  apply(edits: Edit | readonly Edit[], label: string, gesture?: string): boolean;
  setPreview(edits: readonly Edit[] | null): void;
  undo(): void;
  redo(): void;
  select(id: string | null): void;
  hover(id: string | null): void;
  showFinding(id: string | null): void;
  take(item: InHand): void;
  putDown(): void;
  setAsOf(asOf: string): void;
  setSave(save: SaveState): void;
  setBase(base: SavedBase): void;
  announce(words: string): void;
  complain(words: string | null): void;
  /** Puts another sheet under the drawing (opened again, restored, taken over); history ends. */
  load(sheet: Sheet, base: SavedBase): void;
};

export type DrawingStore = StoreApi<DrawingState>;

/** Runs `work` before the next paint. Returns how to call it off. */
export type Frame = (work: () => void) => () => void;

const animationFrame: Frame = (work) => {
  const handle = requestAnimationFrame(work);
  return () => cancelAnimationFrame(handle);
};

export function createDrawingStore(
  answer: LayoutAnswer,
  { asOf = null, frame = animationFrame }: { asOf?: string | null; frame?: Frame } = {},
): DrawingStore {
  const first: Sheet = { layout: answer.layout, site: answer.site.ground };
  const canDraw = answer.me.can.includes('layout.draw');
  const canChangeSite = answer.me.can.includes('site.change');

  return createStore<DrawingState>((set, get) => {
    const answers = (sheet: Sheet, limits: Limits, at: string | null): Answers => {
      const input = { layout: sheet.layout, site: sheet.site, limits, asOf: at };
      return {
        findings: runChecks(input),
        standsFor: standsFor(input),
        firstToFail: firstToFail(input),
      };
    };

    // A pointer can move more often than the screen is painted; only the last place counts.
    let callOff: (() => void) | null = null;
    const dropFrame = (): void => {
      callOff?.();
      callOff = null;
    };

    const show = (sheet: Sheet, more: Partial<DrawingState> = {}): void => {
      const { limits, asOf: at, sheet: before } = get();
      set(
        sheet === before ? { sheet, ...more } : { sheet, ...more, ...answers(sheet, limits, at) },
      );
    };

    const settle = (history: History, more: Partial<DrawingState> = {}): void => {
      dropFrame();
      show(history.present, { history, preview: null, ...more });
    };

    return {
      meta: {
        layoutId: answer.id,
        siteId: answer.site.id,
        siteName: answer.site.name,
        agencyName: answer.agency.name,
        me: answer.me,
        drawnBy: answer.drawn_by?.name ?? null,
        kits: answer.kits,
        baseMap: answer.base_map,
      },
      base: {
        sheet: first,
        layoutVersion: answer.version,
        groundVersion: answer.site.ground_version,
      },
      history: newHistory(first),
      sheet: first,
      preview: null,
      limits: answer.limits,
      asOf,
      ...answers(first, answer.limits, asOf),
      selection: null,
      hovered: null,
      shownFinding: null,
      inHand: null,
      save: saveState(canDraw || canChangeSite ? 'saved' : 'read-only', answer.saved_at),
      canDraw,
      canChangeSite,
      announcement: '',
      complaint: null,

      apply(edits, label, gesture) {
        const { history } = get();
        try {
          const next = commit(history, edits, label, gesture);
          const refused = refusalOf(history.present, next.present, get());
          settle(refused ? history : next, { complaint: refused });
          return refused === null;
        } catch (error) {
          if (!(error instanceof EditError)) throw error;
          settle(history, { complaint: error.message });
          return false;
        }
      },

      setPreview(edits) {
        dropFrame();
        if (!edits) {
          show(get().history.present, { preview: null });
          return;
        }
        callOff = frame(() => {
          callOff = null;
          try {
            show(edits.reduce(applyEdit, get().history.present), { preview: edits });
          } catch (error) {
            if (!(error instanceof EditError)) throw error;
            // The gesture goes on; where it can't be, the last place that could be stays shown.
          }
        });
      },

      undo() {
        const { history } = get();
        const label = undoLabel(history);
        if (label) settle(undo(history), { announcement: `Undone: ${label}` });
      },

      redo() {
        const { history } = get();
        const label = redoLabel(history);
        if (label) settle(redo(history), { announcement: `Done again: ${label}` });
      },

      select: (selection) => set({ selection }),
      hover: (hovered) => set({ hovered }),
      showFinding: (shownFinding) => set({ shownFinding }),
      take: (inHand) => set({ inHand, announcement: `${inHand.words} in hand` }),
      putDown: () => set({ inHand: null }),
      setAsOf(at) {
        const { sheet, limits } = get();
        set({ asOf: at, ...answers(sheet, limits, at) });
      },
      setSave: (save) => set({ save }),
      setBase: (base) => set({ base }),
      announce: (announcement) => set({ announcement }),
      complain: (complaint) => set({ complaint }),
      load: (sheet, base) => settle(newHistory(sheet), { base, selection: null }),
    };
  });
}

/** Why this person may not make the change, in words; null where they may. */
function refusalOf(
  before: Sheet,
  after: Sheet,
  { canDraw, canChangeSite, meta }: DrawingState,
): string | null {
  const role = ROLE_WORDS[meta.me.role].toLowerCase();
  if (before.layout !== after.layout && !canDraw) {
    return `Nothing was changed: as ${role} you see layouts but do not draw them. Ask ${whoMay('layout.draw')}.`;
  }
  if (before.site !== after.site && !canChangeSite) {
    return `Nothing was changed: as ${role} you do not change the site. Ask ${whoMay('site.change')}.`;
  }
  return null;
}
