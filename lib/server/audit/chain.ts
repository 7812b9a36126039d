import { createHash } from 'node:crypto';

export const SUBJECT_KINDS = ['person', 'site', 'layout', 'agency'] as const;
export type SubjectKind = (typeof SUBJECT_KINDS)[number];

/** One event as it is hashed. */
export type Link = {
  readonly agencyId: string;
  readonly subjectKind: string;
  readonly subjectId: string;
  readonly number: number;
  readonly action: string;
  readonly personId: string | null;
  readonly at: Date;
  readonly facts: string;
  readonly previousHash: string;
};

/** What the first event of a subject has before it. */
export const FIRST = '0'.repeat(64);

/** A JSON list keeps the members apart, so that nothing can be moved from one into the next. */
export const hashOf = (link: Link): string =>
  createHash('sha256')
    .update(
      JSON.stringify([
        link.previousHash,
        link.agencyId,
        link.subjectKind,
        link.subjectId,
        link.number,
        link.action,
        link.personId,
        link.at.toISOString(),
        link.facts,
      ]),
    )
    .digest('hex');
