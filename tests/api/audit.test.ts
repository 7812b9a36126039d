import { beforeEach, describe, expect, test } from 'vitest';
import { emptyLayout } from '@/lib/layout';
import { verifyAudit } from '@/lib/server/audit';
import { db, database } from '@/lib/server/database';
import { saveLayout } from '@/lib/server/layouts/save-layout';
import { makeAgency, makeLayout, makeSite, type TestAgency } from './support/agency';

let agency: TestAgency;
let layoutId: string;

beforeEach(async () => {
  agency = await makeAgency();
  const { planner } = agency.people;
  layoutId = await makeLayout(planner, await makeSite(planner));
  for (const version of [1, 2, 3, 4]) {
    const layout = emptyLayout([-98.3, 41.2], `Plan ${version}`);
    await saveLayout(planner, layoutId, version, { layout, label: `Step ${version}` });
  }
});

test('a trail that nobody touched holds', async () => {
  expect(await verifyAudit(agency.id)).toEqual([]);
  const events = await db.AuditEvent.findAll({
    where: { subject_id: layoutId },
    order: ['number'],
    raw: true,
  });
  expect(events.map((event) => event.action)).toEqual([
    'created',
    'saved',
    'saved',
    'saved',
    'saved',
  ]);
  expect(events[0]!.previous_hash).toBe('0'.repeat(64));
});

test('the database refuses to change or drop an event', async () => {
  const where = { subject_id: layoutId };
  await expect(db.AuditEvent.update({ action: 'x' }, { where })).rejects.toThrow('history');
  await expect(db.AuditEvent.destroy({ where })).rejects.toThrow('history');
});

/** What someone with the run of the database could do, its triggers out of the way. */
async function tamper(statement: string): Promise<void> {
  const triggers = ['audit_events_no_update', 'audit_events_no_delete'];
  for (const trigger of triggers) await database.query(`DROP TRIGGER IF EXISTS ${trigger}`);
  await database.query(statement, { replacements: { layoutId, agency: agency.id } });
}

describe('tampering shows', () => {
  const where = 'WHERE subject_id = :layoutId AND number';
  test.each([
    ['facts rewritten', `UPDATE audit_events SET facts = '{}' ${where} = 3`, 3, 'changed'],
    ['another person named', `UPDATE audit_events SET person_id = NULL ${where} = 2`, 2, 'changed'],
    [
      'the time moved',
      `UPDATE audit_events SET at = at + INTERVAL 1 HOUR ${where} = 4`,
      4,
      'changed',
    ],
    ['one taken out of the middle', `DELETE FROM audit_events ${where} = 3`, 4, 'missing'],
    ['the newest cut off', `DELETE FROM audit_events ${where} >= 4`, 4, 'missing'],
    ['the first cut off', `DELETE FROM audit_events ${where} = 1`, 2, 'missing'],
    [
      'one taken out and the rest renumbered',
      `DELETE FROM audit_events ${where} = 3; UPDATE audit_events SET number = number - 1 ${where} > 3 ORDER BY number`,
      3,
      'out of order',
    ],
  ])('%s', async (_, statement, number, why) => {
    for (const one of statement.split('; ')) await tamper(one);
    expect(await verifyAudit(agency.id)).toContainEqual({
      subjectKind: 'layout',
      subjectId: layoutId,
      number,
      why,
    });
  });
});
