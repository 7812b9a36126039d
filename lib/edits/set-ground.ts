import * as z from 'zod/mini';
import { siteGroundSchema, type SiteGround, type Sheet } from '../layout';
import { same } from './same';
import { EditError, type EditOf } from './types';

/** Records owners' answers (those given; null takes one back), tickets and overhead lines. */
export function setGround(sheet: Sheet, edit: EditOf<'set-ground'>): Sheet {
  const { site } = sheet;
  const draft: Record<keyof SiteGround, unknown> = {
    ...site,
    answers: edit.answers ? mergedAnswers(site.answers, edit.answers) : site.answers,
    locates: edit.locates ?? site.locates,
    overhead_none_known_as_of:
      edit.overhead_none_known_as_of === undefined
        ? site.overhead_none_known_as_of
        : edit.overhead_none_known_as_of,
  };
  if (same(draft, site)) return sheet;
  const answer = RECORDED.safeParse(draft);
  if (!answer.success) {
    const faults = new Set(answer.error.issues.map((issue) => issue.message));
    throw new EditError(`${[...faults].join('; ')}.`);
  }
  return { ...sheet, site: { ...site, ...answer.data } };
}

/** Features have edits of their own, and checking thousands of them here would be felt. */
const RECORDED = z.pick(siteGroundSchema, {
  answers: true,
  locates: true,
  overhead_none_known_as_of: true,
});

function mergedAnswers(
  before: SiteGround['answers'],
  given: Partial<SiteGround['answers']>,
): Record<string, unknown> {
  const answers: Record<string, unknown> = { ...before };
  for (const [name, value] of Object.entries(given)) {
    if (value === null) delete answers[name];
    else if (value !== undefined) answers[name] = value;
  }
  return answers;
}
