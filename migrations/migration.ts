import type { Sequelize } from 'sequelize';

/**
 * One numbered step of the database's shape. A step that has been released is never edited: a
 * later one corrects it. Statements say IF NOT EXISTS because MariaDB commits each on its own, so
 * that a step which was interrupted half-way can simply run again.
 */
export type Migration = { readonly name: string; up(database: Sequelize): Promise<void> };

export const statements =
  (...sql: readonly string[]) =>
  async (database: Sequelize): Promise<void> => {
    for (const statement of sql) await database.query(statement);
  };

/** Keys of ours are UUIDs in text: ASCII, compared byte by byte. */
export const ID = 'CHAR(36) CHARACTER SET ascii COLLATE ascii_bin';
export const TABLE_OPTIONS = 'ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci';
