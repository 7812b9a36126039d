import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { CreatedLayout, newLayout } from '@/lib/api';
import { emptyLayout, type Layout } from '@/lib/layout';
import { parseExchange } from '@/lib/layout/exchange';
import { overridesOf, type Limits } from '@/lib/limits';
import { inTransaction, type db } from '../database';
import { Refusal, refuseFaults } from '../problems';
import type { SignedIn } from '../session';
import { findSite } from '../sites/find-site';
import { groundOf } from '../sites/ground';
import { placeOf } from '../sites/rows';
import { saveGroundIn } from '../sites/save-ground';
import { openDocument } from './document';
import { findLayout } from './find-layout';
import { insertLayout } from './insert-layout';
import { groundLeftOut, takeGround, withFreshIds } from './take-file';

type Wanted = z.output<typeof newLayout>;
type Start = { readonly layout: Layout; readonly label: string; readonly notTaken: string[] };

/** A new layout at a site. The whole of it happens or nothing does. */
export async function createLayout(
  person: SignedIn,
  siteId: string,
  wanted: Wanted,
): Promise<CreatedLayout> {
  return inTransaction(async (transaction) => {
    // The site's row is held, because a file may add to its ground.
    const site = await findSite(person, siteId, { transaction, lock: true });
    const start = await startOf(person, site, wanted, transaction);
    const layout = wanted.name ? { ...start.layout, name: wanted.name } : start.layout;
    const id = await insertLayout(person, siteId, layout, start.label, transaction);
    return { id, version: 1, not_taken: start.notTaken };
  });
}

function startOf(person: SignedIn, site: db.Site, wanted: Wanted, transaction: Transaction) {
  const { from } = wanted;
  if (!from) return fromNothing(site, wanted);
  if ('layoutId' in from) return fromLayout(person, site, from.layoutId, transaction);
  return fromFile(person, site, from.file, from.takeGround ?? false, transaction);
}

function fromNothing(site: db.Site, wanted: Wanted): Start {
  const origin = wanted.origin ?? placeOf(site);
  if (!origin) {
    throw refuseFaults([
      {
        path: 'origin',
        message: 'the site has no place of its own yet, so say where the layout starts',
      },
    ]);
  }
  return { layout: emptyLayout(origin), label: 'New layout', notTaken: [] };
}

async function fromLayout(
  person: SignedIn,
  site: db.Site,
  layoutId: string,
  transaction: Transaction,
): Promise<Start> {
  const other = await findLayout(person, layoutId, { transaction });
  if (other.site_id !== site.id) {
    throw refuseFaults([
      { path: 'from.layoutId', message: 'that layout is drawn at another site and would not fit' },
    ]);
  }
  const layout = openDocument(other.document);
  return {
    layout: { ...layout, name: `Copy of ${layout.name ?? 'an unnamed layout'}`.slice(0, 200) },
    label: `Copy ${layout.name ?? 'an unnamed layout'}`.slice(0, 200),
    notTaken: [],
  };
}

async function fromFile(
  person: SignedIn,
  site: db.Site,
  file: unknown,
  take: boolean,
  transaction: Transaction,
): Promise<Start> {
  const parsed = parseExchange(file);
  if (!parsed.ok) {
    throw refuseFaults(
      parsed.faults.map(({ path, message }) => ({
        path: path ? `from.file.${path}` : 'from.file',
        message,
      })),
    );
  }
  const ground = await groundOf(site, transaction);
  const notTaken = limitsLeftOut(parsed.limits);
  let features = ground.features;
  if (take) {
    const taken = takeGround(ground, parsed.sheet.site);
    notTaken.push(...taken.notTaken);
    features = taken.ground.features;
    if (taken.changed) await takeOnto(person, site, taken.ground, transaction);
  } else {
    notTaken.push(...groundLeftOut(parsed.sheet.site));
  }
  const ids = new Set(features.map((feature) => feature.id));
  return {
    layout: withFreshIds(parsed.sheet, ids, randomUUID),
    label: 'Import a file',
    notTaken,
  };
}

async function takeOnto(
  person: SignedIn,
  site: db.Site,
  ground: Parameters<typeof saveGroundIn>[3]['ground'],
  transaction: Transaction,
): Promise<void> {
  const change = { ground, label: 'Import a file', at: new Date() };
  const saved = await saveGroundIn(person, site.id, site.version, change, transaction);
  if (!saved)
    throw new Refusal('stale', 'The site changed in the meantime. Import the file again.');
}

/** Limits and acceptance are the agency's to set; a file can't bring its own. */
function limitsLeftOut(limits: Limits): string[] {
  const own = Object.keys(overridesOf(limits)).length;
  return [
    ...(own > 0
      ? [`${own} ${own === 1 ? 'limit' : 'limits'} of its own: the agency’s limits hold`]
      : []),
    ...(limits.acceptance ? ['its acceptance value: the agency’s holds'] : []),
  ];
}
