import 'server-only';
import { Op } from 'sequelize';
import { db } from '../database';
import { FIRST, hashOf } from './chain';

/** A subject whose trail doesn't hold, and the first event at which that shows. */
export type Break = {
  readonly subjectKind: string;
  readonly subjectId: string;
  readonly number: number;
  readonly why: 'changed' | 'out of order' | 'missing';
};

const BATCH = 1000;

/**
 * Walks an agency's whole trail. A row changed, taken out of the middle or put in breaks its
 * subject's chain. A chain cut off at its end shows for layouts, whose versions count along.
 */
export async function verifyAudit(agencyId: string): Promise<Break[]> {
  const breaks: Break[] = [];
  const last = new Map<string, { number: number; hash: string }>();
  const broken = new Set<string>();
  for await (const event of eventsOf(agencyId)) {
    const key = `${event.subject_kind} ${event.subject_id}`;
    const before = last.get(key) ?? { number: 0, hash: FIRST };
    last.set(key, { number: event.number, hash: event.hash });
    if (broken.has(key)) continue;
    const why = flawOf(event, before);
    if (!why) continue;
    broken.add(key);
    breaks.push({
      subjectKind: event.subject_kind,
      subjectId: event.subject_id,
      number: event.number,
      why,
    });
  }
  return [...breaks, ...(await cutOff(agencyId, last))];
}

function flawOf(event: db.AuditEvent, before: { number: number; hash: string }) {
  if (event.number !== before.number + 1) return 'missing' as const;
  if (event.previous_hash !== before.hash) return 'out of order' as const;
  const hash = hashOf({
    agencyId: event.agency_id,
    subjectKind: event.subject_kind,
    subjectId: event.subject_id,
    number: event.number,
    action: event.action,
    personId: event.person_id,
    at: event.at,
    facts: event.facts,
    previousHash: event.previous_hash,
  });
  return hash === event.hash ? null : ('changed' as const);
}

/** Every version of a layout has its event; a layout with fewer has lost its newest ones. */
async function cutOff(agencyId: string, last: ReadonlyMap<string, { number: number }>) {
  const layouts = await db.Layout.findAll({
    where: { agency_id: agencyId },
    attributes: ['id', 'version'],
    raw: true,
  });
  return layouts
    .filter(({ id, version }) => (last.get(`layout ${id}`)?.number ?? 0) < version)
    .map(({ id }) => ({
      subjectKind: 'layout',
      subjectId: id,
      number: (last.get(`layout ${id}`)?.number ?? 0) + 1,
      why: 'missing' as const,
    }));
}

async function* eventsOf(agencyId: string): AsyncGenerator<db.AuditEvent> {
  let after: db.AuditEvent | undefined;
  for (;;) {
    const events: db.AuditEvent[] = await db.AuditEvent.findAll({
      where: { agency_id: agencyId, ...(after && { [Op.or]: laterThan(after) }) },
      order: ['subject_kind', 'subject_id', 'number'],
      limit: BATCH,
      raw: true,
    });
    yield* events;
    if (events.length < BATCH) return;
    after = events.at(-1);
  }
}

const laterThan = (event: db.AuditEvent) => [
  { subject_kind: { [Op.gt]: event.subject_kind } },
  { subject_kind: event.subject_kind, subject_id: { [Op.gt]: event.subject_id } },
  {
    subject_kind: event.subject_kind,
    subject_id: event.subject_id,
    number: { [Op.gt]: event.number },
  },
];
