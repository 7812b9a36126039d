import { readdirSync } from 'node:fs';
import { QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, test } from 'vitest';
import { db, database } from '@/lib/server/database';
import { MIGRATIONS } from '@/migrations';

type Column = { table_name: string; column_name: string; is_nullable: string };
let columns: Column[];

const select = <Row extends object>(sql: string) =>
  database.query<Row>(sql, { type: QueryTypes.SELECT });

beforeAll(async () => {
  columns = await select<Column>(
    `SELECT TABLE_NAME AS table_name, COLUMN_NAME AS column_name, IS_NULLABLE AS is_nullable
     FROM information_schema.COLUMNS WHERE TABLE_SCHEMA = DATABASE() AND TABLE_NAME <> 'migrations'`,
  );
});

test('every file of a migration is listed, in the order of its number', () => {
  const files = readdirSync('migrations')
    .filter((file) => /^\d{4}-/.test(file))
    .map((file) => file.replace(/\.ts$/, ''));
  expect(MIGRATIONS.map((migration) => migration.name)).toEqual(files.sort());
});

const models = Object.values(database.models);

test('every table has its model', () => {
  const tables = new Set(columns.map((column) => column.table_name));
  expect(models.map((model) => model.tableName).sort()).toEqual([...tables].sort());
});

describe.each(models.map((model) => [model.tableName, model] as const))('%s', (table, model) => {
  const own = () => columns.filter((column) => column.table_name === table);

  test('the model names its columns, no more and no fewer', () => {
    expect(Object.keys(model.getAttributes()).sort()).toEqual(
      own()
        .map((column) => column.column_name)
        .sort(),
    );
  });

  test('what may be empty may be empty in both', () => {
    const nullable = Object.entries(model.getAttributes())
      .filter(([, attribute]) => attribute.allowNull !== false && !attribute.primaryKey)
      .map(([name]) => name);
    expect(nullable.sort()).toEqual(
      own()
        .filter((column) => column.is_nullable === 'YES')
        .map((column) => column.column_name)
        .sort(),
    );
  });

  test('it belongs to an agency', () => {
    const names = own().map((column) => column.column_name);
    expect(names).toContain(table === 'agencies' ? 'id' : 'agency_id');
  });
});

test('text is utf8mb4 or plain ASCII, everywhere', async () => {
  const odd = await select(
    `SELECT TABLE_NAME, COLUMN_NAME, CHARACTER_SET_NAME FROM information_schema.COLUMNS
     WHERE TABLE_SCHEMA = DATABASE() AND TABLE_NAME <> 'migrations'
       AND CHARACTER_SET_NAME NOT IN ('utf8mb4', 'ascii')`,
  );
  expect(odd).toEqual([]);
});

test('the database itself refuses a row that points into another agency', async () => {
  const { makeAgency, makeSite } = await import('./support/agency');
  const [ours, theirs] = [await makeAgency(), await makeAgency()];
  const siteId = await makeSite(ours.people.planner);
  const foreign = {
    site_id: siteId,
    agency_id: theirs.id,
    place: 0,
    ticket: 'X',
    entry: { ticket: 'X' },
  };
  await expect(db.Locate.create(foreign)).rejects.toThrow('foreign key constraint');
});

test('a moment keeps its milliseconds and its zone', async () => {
  const { makeAgency } = await import('./support/agency');
  const { id } = await makeAgency();
  const at = new Date('2031-03-30T01:30:00.123Z');
  await db.Agency.update({ created_at: at }, { where: { id } });
  expect((await db.Agency.findByPk(id, { raw: true }))?.created_at).toEqual(at);
  const [row] = await select<{ text: string }>(
    `SELECT CAST(created_at AS CHAR) AS text FROM agencies WHERE id = '${id}'`,
  );
  expect(row?.text).toBe('2031-03-30 01:30:00.123');
});
