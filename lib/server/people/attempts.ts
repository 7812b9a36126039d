import 'server-only';
import { createHash } from 'node:crypto';
import { Op } from 'sequelize';
import { db } from '../database';
import { TRIES } from '../session/rules';
import { plainEmail } from './email';

const MINUTE = 60_000;
/** A try that is still being checked counts as one that failed. */
const COUNTED = ['trying', 'failed'] as const;

export const accountKey = (email: string): string =>
  createHash('sha256').update(plainEmail(email)).digest('hex');

export type Attempt = { readonly row: db.SignInAttempt; readonly waitMinutes: number };

/**
 * Writes the try down before anything is checked, then counts: a hundred tries sent at once see
 * each other. `waitMinutes` above 0 means that this one must not be checked at all.
 */
export async function beginAttempt(email: string, address: string): Promise<Attempt> {
  const now = Date.now();
  const row = await db.SignInAttempt.create({
    account: accountKey(email),
    address: address.slice(0, 64),
    agency_id: null,
    outcome: 'trying',
    at: new Date(now),
  });
  const wait = Math.max(
    await waitFor({ account: row.account }, TRIES.perAccount, row.account),
    await waitFor({ address: row.address }, TRIES.perAddress),
  );
  if (wait > 0) await row.update({ outcome: 'refused' });
  return { row, waitMinutes: Math.ceil(wait / MINUTE) };

  /** Milliseconds until the oldest try that matters leaves the window; 0 when under the limit. */
  async function waitFor(
    who: { account: string } | { address: string },
    most: number,
    account?: string,
  ): Promise<number> {
    const since = await windowStart(now, account);
    const recent = await db.SignInAttempt.findAll({
      where: { ...who, at: { [Op.gt]: since }, outcome: { [Op.in]: [...COUNTED] } },
      attributes: ['at'],
      order: [
        ['at', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: most + 1,
      raw: true,
    });
    const oldest = recent[most];
    return oldest ? oldest.at.getTime() + TRIES.windowMinutes * MINUTE - now : 0;
  }
}

/** Signing in wipes the account's slate; an address never gets wiped, or one known password would. */
async function windowStart(now: number, account: string | undefined): Promise<Date> {
  const window = new Date(now - TRIES.windowMinutes * MINUTE);
  if (account === undefined) return window;
  const last = await db.SignInAttempt.findOne({
    where: { account, outcome: 'signed-in', at: { [Op.gt]: window } },
    attributes: ['at'],
    order: [['at', 'DESC']],
    raw: true,
  });
  return last?.at ?? window;
}
