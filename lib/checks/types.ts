import type { Edit } from '../edits';
import type { Backing, Limits, Mark } from '../limits';
import type { Layout, SiteGround } from '../layout';

export type Status = 'meets' | 'caution' | 'not-met' | 'not-known' | 'n/a';

/** What a not-met or not-known takes at approval: nothing clears a stop. */
export type Gate = 'stop' | 'deviation' | 'ack';

export type MeasureUnit = 'ft' | 'deg' | 'ratio' | 'count' | 'min' | 'ohm';

export type Measured = { readonly value: number; readonly unit: MeasureUnit };
export type Allowed = {
  readonly min: number | null;
  readonly max: number | null;
  readonly unit: MeasureUnit;
};

/** The questions a reader asks of a layout, in the order in which the checks are shown. */
export const QUESTIONS = [
  'Are the systems complete?',
  'Are they apart?',
  'Is everything in the right place?',
  'Will the test line read true?',
  'What is under and over us?',
  'Does the kit reach?',
] as const;
export type Question = (typeof QUESTIONS)[number];

/** What to enter where something is not known, so that the field can stand in the line. */
export type Missing =
  | 'wind'
  | 'slope'
  | 'source'
  | 'hot-zone'
  | 'vent'
  | 'liquid'
  | 'acceptance'
  | 'kit'
  | 'owner-answer'
  | 'locate'
  | 'overhead'
  | 'voltage'
  | 'buried-lines'
  | 'test-line'
  | 'rods';

/** One rule's answer for one subject. Plain data: it can be saved, sent and printed. */
export type Finding = {
  /** `rule|subject,subject`, unique in one run. */
  readonly id: string;
  readonly rule: string;
  readonly status: Status;
  readonly gate: Gate;
  /** Systems, classes, item kinds and tickets by name, everything else by piece id. */
  readonly subjects: readonly string[];
  readonly measured: Measured | null;
  readonly allowed: Allowed | null;
  readonly message: string;
  readonly mark: Mark;
  readonly source: string;
  readonly remedy: Remedy | null;
  readonly missing: readonly Missing[];
};

/** An edit that clears the finding, with the words for its button ("Move R2 1.4 ft south-east"). */
export type Remedy = Edit & { readonly words: string };

export type CheckInput = {
  readonly layout: Layout;
  readonly site: SiteGround;
  readonly limits: Limits;
  /** The instant the answer is for, ISO 8601; null when neither asked for nor planned. */
  readonly asOf: string | null;
};

export type Check = {
  readonly id: string;
  readonly question: Question;
  /** A short line for lists: "Systems apart". */
  readonly title: string;
  readonly backing: Backing;
  check(input: CheckInput): Finding[];
};
