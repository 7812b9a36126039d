import 'server-only';
import type { Transaction } from 'sequelize';
import type { AnswerClass, SiteGround } from '@/lib/layout';
import { db } from '../database';
import { featureChanges, type FeatureChanges } from './feature-changes';

/** A statement stays well under MariaDB's packet limit of 16 MB. */
const ROWS = 500;
const CHARACTERS = 4_000_000;

type Owner = { readonly site_id: string; readonly agency_id: string };

/** Makes the site's rows say `ground`. The caller's transaction holds the site's row. */
export async function writeGround(
  owner: Owner,
  ground: SiteGround,
  transaction: Transaction,
): Promise<FeatureChanges> {
  const stored = await db.SiteFeature.findAll({
    where: owner,
    attributes: ['feature_id', 'place', 'feature'],
    raw: true,
    transaction,
  });
  const changes = featureChanges(stored, ground.features);
  if (changes.remove.length > 0) {
    await db.SiteFeature.destroy({
      where: { ...owner, feature_id: [...changes.remove] },
      transaction,
    });
  }
  for (const rows of batches(
    changes.put.map(({ feature, place }) => ({
      ...owner,
      feature_id: feature.id,
      kind: feature.kind,
      place,
      feature,
    })),
  )) {
    await db.SiteFeature.bulkCreate(rows, {
      transaction,
      updateOnDuplicate: ['kind', 'place', 'feature'],
    });
  }
  await writeAnswers(owner, ground, transaction);
  await writeLocates(owner, ground, transaction);
  return changes;
}

async function writeAnswers(owner: Owner, ground: SiteGround, transaction: Transaction) {
  await db.OwnersAnswer.destroy({ where: owner, transaction });
  await db.OwnersAnswer.bulkCreate(
    Object.entries(ground.answers).flatMap(([name, entry]) =>
      entry ? [{ ...owner, class: name as AnswerClass, answer: entry.answer, entry }] : [],
    ),
    { transaction },
  );
}

async function writeLocates(owner: Owner, ground: SiteGround, transaction: Transaction) {
  await db.Locate.destroy({ where: owner, transaction });
  await db.Locate.bulkCreate(
    ground.locates.map((entry, place) => ({ ...owner, place, ticket: entry.ticket, entry })),
    { transaction },
  );
}

function* batches<Row>(rows: readonly Row[]): Generator<Row[]> {
  let batch: Row[] = [];
  let characters = 0;
  for (const row of rows) {
    const size = JSON.stringify(row).length;
    if (batch.length > 0 && (batch.length >= ROWS || characters + size > CHARACTERS)) {
      yield batch;
      batch = [];
      characters = 0;
    }
    batch.push(row);
    characters += size;
  }
  if (batch.length > 0) yield batch;
}
