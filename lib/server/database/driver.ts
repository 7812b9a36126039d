import * as mariadb from 'mariadb';

type Rows = unknown[] & { meta?: unknown };

/**
 * The MariaDB driver as Sequelize 6 expects it. Sequelize deletes `meta` from the rows it is
 * given, and the driver defines it so that it can't be deleted; a copy with a plain member can.
 */
export const driver = {
  ...mariadb,
  async createConnection(options: mariadb.ConnectionConfig) {
    const connection = await mariadb.createConnection(options);
    const query = connection.query.bind(connection);
    connection.query = async <T>(...args: Parameters<typeof query>): Promise<T> => {
      const rows: unknown = await query(...args);
      if (!Array.isArray(rows) || !('meta' in rows)) return rows as T;
      const copy: Rows = rows.slice();
      copy.meta = rows.meta;
      return copy as T;
    };
    return connection;
  },
};
