import type * as z from 'zod/mini';
import { slope, soil, wind, type Conditions, type Sheet } from '../layout';
import { same } from './same';
import { EditError, type EditOf } from './types';

const SCHEMAS = { wind, slope, soil } satisfies Record<string, z.ZodMiniObject>;
type Condition = keyof typeof SCHEMAS;

/**
 * Sets wind, slope or soil whole: a member left out is "not entered" from then on, and so is a
 * condition that is null. Members this version doesn't know stay as they came.
 */
export function setConditions(sheet: Sheet, edit: EditOf<'set-conditions'>): Sheet {
  const conditions: Conditions = { ...sheet.layout.conditions };
  for (const [name, value] of Object.entries(edit.conditions)) {
    if (!isCondition(name)) throw new EditError(`There is no condition called ${name}.`);
    const before = conditions[name] ?? null;
    if (value === undefined || (value === null && before === null)) continue;
    if (value === null) delete conditions[name];
    else conditions[name] = settled(name, before ?? {}, value);
  }
  if (same(conditions, sheet.layout.conditions)) return sheet;
  return { ...sheet, layout: { ...sheet.layout, conditions } };
}

const isCondition = (name: string): name is Condition => name in SCHEMAS;

function settled(name: Condition, before: object, value: object): Record<string, unknown> {
  const known = SCHEMAS[name].shape;
  const kept = Object.entries(before).filter(([member]) => !(member in known));
  const given = Object.entries(value).filter(([, v]) => v !== null && v !== undefined);
  const answer = SCHEMAS[name].safeParse(Object.fromEntries([...kept, ...given]));
  if (answer.success) return answer.data;
  const faults = new Set(answer.error.issues.map((issue) => issue.message));
  throw new EditError(`${name}: ${[...faults].join('; ')}.`);
}
