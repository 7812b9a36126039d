import type { GroundSave, LayoutSave, SavedAnswer, StaleGround, StaleLayout } from '../../api';
import type { Problem } from '../api/problem';
import type { SaveStatus } from './save-state';

/** What the queue needs of the world. Each `put` throws `Problem` where it is refused. */
export type Sending = {
  putLayout(version: number, body: LayoutSave): Promise<SavedAnswer>;
  putGround(version: number, body: GroundSave): Promise<SavedAnswer>;
  /** Runs `work` later. Returns how to call it off. */
  later(work: () => void, ms: number): () => void;
};

/** The other version that a refused save ran into. */
export type Stale =
  | { readonly what: 'layout'; readonly theirs: StaleLayout }
  | { readonly what: 'ground'; readonly theirs: StaleGround };

/** What a refusal means for the margin, and whether trying again by itself can help. */
export function refusal(problem: Problem): { status: SaveStatus; why: string; again: boolean } {
  const why = problem.message;
  switch (problem.code) {
    case 'offline':
      return { status: 'offline', why, again: true };
    case 'signed-out':
      return { status: 'signed-out', why, again: true };
    case 'database-away':
    case 'too-many-tries':
    case 'unknown':
      return { status: 'failed', why, again: true };
    default:
      // The same would be refused the same way; the next change asks anew.
      return { status: 'failed', why, again: false };
  }
}
