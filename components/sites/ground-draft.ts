import type { AnswerClass, Locate, SiteGround } from '@/lib/layout';

type OwnersAnswer = NonNullable<SiteGround['answers'][AnswerClass]>;

/**
 * What a person has entered and not yet saved, kept apart from the ground as it stands: when
 * someone else saves first, the same entries can be laid on theirs.
 */
export type GroundDraft = {
  readonly answers: Readonly<Partial<Record<AnswerClass, OwnersAnswer | null>>>;
  /** Absent: not touched. */
  readonly overhead?: string | null;
  readonly locates?: readonly Locate[];
};

export const EMPTY_DRAFT: GroundDraft = { answers: {} };

export const isTouched = (draft: GroundDraft): boolean =>
  Object.keys(draft.answers).length > 0 ||
  draft.overhead !== undefined ||
  draft.locates !== undefined;

export function withDraft(ground: SiteGround, draft: GroundDraft): SiteGround {
  return {
    ...ground,
    answers: { ...ground.answers, ...draft.answers },
    overhead_none_known_as_of:
      draft.overhead === undefined ? ground.overhead_none_known_as_of : draft.overhead,
    locates: draft.locates ? draft.locates.map((locate) => ({ ...locate })) : ground.locates,
  };
}

/** Names the change for the history. */
export function draftLabel(draft: GroundDraft): string {
  const parts = [
    Object.keys(draft.answers).length > 0 ? 'owners’ answers' : '',
    draft.locates ? 'locate tickets' : '',
    draft.overhead === undefined ? '' : 'overhead lines',
  ].filter(Boolean);
  return `Enter ${parts.join(', ')}`;
}

/** Why the draft can't be saved yet, or null. */
export function draftComplaint(draft: GroundDraft): string | null {
  if (draft.locates?.some((locate) => locate.ticket.trim() === '')) {
    return 'A locate ticket needs its number. Enter it, or take the ticket out.';
  }
  return null;
}

/**
 * My list of tickets laid on a list that someone else saved meanwhile: what I added, changed or
 * took out since `base` is done to theirs, everything else of theirs stays.
 */
export function rebasedLocates(
  base: readonly Locate[],
  mine: readonly Locate[],
  theirs: readonly Locate[],
): Locate[] {
  const named = (list: readonly Locate[], ticket: string) =>
    list.find((locate) => locate.ticket === ticket);
  const same = (a: Locate | undefined, b: Locate | undefined) =>
    JSON.stringify(a) === JSON.stringify(b);
  const kept = theirs.flatMap((locate) => {
    const [before, now] = [named(base, locate.ticket), named(mine, locate.ticket)];
    if (before && !now) return [];
    return now && !same(before, now) ? [now] : [locate];
  });
  const added = mine.filter(
    (locate) =>
      !named(theirs, locate.ticket) &&
      !(named(base, locate.ticket) && same(named(base, locate.ticket), locate)),
  );
  return [...kept, ...added];
}
