// @ts-check
import { dirname, join } from 'node:path';
import { checkIdentity, createDatabase, databaseIn } from './database-folder.mjs';
import { startDatabase } from './database-server.mjs';
import { DATABASE_PACKAGES, findCommand } from './debian-packages.mjs';
import { Refusal } from './refusal.mjs';
import { step } from './say.mjs';
import { keptSecrets } from './secrets.mjs';
import { ensureSocketFolder, socketPath } from './socket-folder.mjs';

/**
 * The private database of a data folder, made at the first start, running and answering.
 * @param {string} dataFolder there already, and private
 * @param {{ port?: number, began?: (identity: import('./process-identity.mjs').ProcessIdentity) => void }} [options]
 */
export async function openPrivateDatabase(dataFolder, { port, began } = {}) {
  const folder = join(dataFolder, 'mariadb');
  const found = databaseIn(folder);
  const secrets = keptSecrets(dataFolder, found ?? undefined);
  checkIdentity(folder, found, secrets.databaseId);
  const socket = socketPath(folder);
  ensureSocketFolder(socket);
  if (found === null) {
    await step('Making the private database', () =>
      createDatabase(folder, secrets.databaseId, {
        installer: commandPath('mariadb-install-db'),
        plainFolder: dirname(socket),
      }),
    );
  }
  return step('Starting the database', () =>
    startDatabase({
      folder,
      socket,
      log: join(dataFolder, 'mariadb.log'),
      commands: { server: commandPath('mariadbd'), client: commandPath('mariadb') },
      secrets,
      port,
      began,
    }),
  );
}

/** @param {string} command */
function commandPath(command) {
  const found = findCommand(command);
  if (!found) {
    const names = DATABASE_PACKAGES.map(({ name }) => name).join(' and ');
    throw new Refusal(`${command} is not installed; it comes with the packages ${names}.`);
  }
  return found;
}
