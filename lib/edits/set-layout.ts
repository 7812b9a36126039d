import * as z from 'zod/mini';
import { layoutSchema, type Sheet } from '../layout';
import { same } from './same';
import { EditError, type EditOf } from './types';

const SETTABLE = z.pick(layoutSchema, {
  name: true,
  planned_at: true,
  pump: true,
  liquid: true,
  kit: true,
});

/** Sets what the title block says of the layout; null is "not entered". */
export function setLayout(sheet: Sheet, { members }: EditOf<'set-layout'>): Sheet {
  const given = Object.entries(members).filter(([, value]) => value !== undefined);
  const unknown = given.find(([name]) => !(name in SETTABLE.shape));
  if (unknown) throw new EditError(`The ${unknown[0]} of a layout can't be set.`);
  const answer = z.partial(SETTABLE).safeParse(Object.fromEntries(given));
  if (!answer.success) {
    const faults = new Set(answer.error.issues.map((issue) => issue.message));
    throw new EditError(`${[...faults].join('; ')}.`);
  }
  const layout = { ...sheet.layout, ...answer.data };
  return same(layout, sheet.layout) ? sheet : { ...sheet, layout };
}
