import type { Edit, End } from '../../edits';
import type { LonLat } from '../../geo';
import type { LimitValues } from '../../limits';
import type { Sheet } from '../../layout';
import type { InHand } from '../in-hand';

/**
 * The pointer tools are machines without a screen: (state, event, scene) → step. Whoever owns the
 * screen finds what lies under the pointer, hands in events, and does what the step says.
 */

/** What lies under a pointer, or has the keyboard's focus: the smallest thing that can be taken. */
export type Under =
  | { readonly type: 'piece'; readonly id: string }
  /** A corner of the selected line or area; `part` and `vertex` as in the reshape edit. */
  | { readonly type: 'vertex'; readonly id: string; readonly part: number; readonly vertex: number }
  /** The middle between two corners: a corner put there goes in before `vertex`. */
  | { readonly type: 'middle'; readonly id: string; readonly part: number; readonly vertex: number }
  | { readonly type: 'turn'; readonly id: string }
  | { readonly type: 'end'; readonly id: string; readonly end: End }
  | null;

export type Px = { readonly x: number; readonly y: number };

type PointerFacts = {
  readonly pointerId: number;
  readonly pointer: 'mouse' | 'touch' | 'pen';
  readonly at: LonLat;
  readonly px: Px;
  readonly under: Under;
  /** How much ground one pixel shows, for what "near" means to a finger. */
  readonly metresPerPx: number;
  /** Shift: finer steps. */
  readonly fine: boolean;
};

export type ToolEvent =
  /** `clicks` as the browser counts them: 2 at the second press of a double click. */
  | (PointerFacts & { readonly type: 'down'; readonly clicks: number })
  | (PointerFacts & { readonly type: 'move' })
  | (PointerFacts & { readonly type: 'up' })
  | { readonly type: 'cancel' | 'lost-capture' | 'leave'; readonly pointerId: number }
  | {
      readonly type: 'key';
      readonly key: string;
      /** Shift: a tenth of the step. */
      readonly fine: boolean;
      /** Ctrl: ten times the step. */
      readonly far: boolean;
      /** True while a key is held down and repeats. */
      readonly repeat: boolean;
      /** What has the focus; null for the plan itself. */
      readonly under: Under;
      readonly middleOfView: LonLat;
      readonly metresPerPx: number;
    };

export type PointerEvent = Extract<ToolEvent, { type: 'down' | 'move' | 'up' }>;
export type KeyEvent = Extract<ToolEvent, { type: 'key' }>;

/** What the tools look at; they change none of it. */
export type Scene = {
  /** The sheet as it stands in the history, without any preview. */
  readonly sheet: Sheet;
  readonly selection: string | null;
  readonly inHand: InHand | null;
  readonly limits: LimitValues;
  readonly newId: () => string;
  readonly canDraw: boolean;
  readonly canChangeSite: boolean;
};

/** A press that may yet turn out a click, a drag, or a pan of the map. */
export type Press = {
  readonly pointerId: number;
  readonly from: LonLat;
  readonly fromPx: Px;
  readonly under: Under;
  readonly clicks: number;
  /** Past the threshold. */
  readonly dragging: boolean;
  /** True where the tool has taken the press and the map must lie still. */
  readonly held: boolean;
  /** Called off: what it does from here on counts for nothing. */
  readonly dead: boolean;
};

/** Corners put down so far of the line, area or run in hand. */
export type Outline = {
  readonly corners: readonly LonLat[];
  /** For a run: the piece it starts on. */
  readonly startsOn: string | null;
};

export type ToolState = {
  /** Pointers that are down on the plan. */
  readonly pointers: readonly number[];
  /** From the second finger until the last is lifted the map has them all. */
  readonly pinching: boolean;
  readonly press: Press | null;
  readonly outline: Outline | null;
  /** What the last click was on: only a double click on one corner takes that corner out. */
  readonly lastClick: Under;
  /** Where the pointer is, for the line that follows it. Null when it is off the plan. */
  readonly cursor: LonLat | null;
  /** The keyboard's pointer, while it is in use. */
  readonly crosshair: LonLat | null;
  /** Whether the crosshair has moved since it last put something down. */
  readonly crosshairMoved: boolean;
  /** Counts presses of keys, so that a held key makes one entry. */
  readonly keyPresses: number;
};

export const IDLE: ToolState = {
  pointers: [],
  pinching: false,
  press: null,
  outline: null,
  lastClick: null,
  cursor: null,
  crosshair: null,
  crosshairMoved: false,
  keyPresses: 0,
};

/** What to do now. A member left out changes nothing. */
export type Step = {
  readonly state: ToolState;
  /** One gesture, one entry in the history, under `label`. */
  readonly edits?: readonly Edit[];
  readonly label?: string;
  /** Steps with the same gesture share an entry. */
  readonly gesture?: string;
  /** What to show as if it were done; null shows the sheet as it stands. */
  readonly preview?: readonly Edit[] | null;
  readonly select?: string | null;
  readonly putDown?: boolean;
  readonly announce?: string;
  /** True where the event is used up: the map and the page must not act on it too. */
  readonly taken?: boolean;
};
