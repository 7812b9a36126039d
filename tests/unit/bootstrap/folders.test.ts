import {
  chmodSync,
  chownSync,
  lstatSync,
  mkdirSync,
  readFileSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { ensurePrivateFolder } from '@/scripts/bootstrap/data-folder.mjs';
import { checkIdentity, databaseIn } from '@/scripts/bootstrap/database-folder.mjs';
import { keptSecrets } from '@/scripts/bootstrap/secrets.mjs';
import { socketPath } from '@/scripts/bootstrap/socket-folder.mjs';
import { temporaryFolder } from './temporary';

const mode = (path: string) => lstatSync(path).mode & 0o777;

describe('the socket', () => {
  const LONG = `/home/somebody/${'a-very-long-folder-name/'.repeat(12)}.data/mariadb`;

  test('has a path that fits, however long that of the copy is', () => {
    const path = socketPath(LONG);
    expect(Buffer.byteLength(path)).toBeLessThanOrEqual(107);
    expect(path.startsWith(tmpdir())).toBe(true);
  });

  test('is the same for the same copy and another for another', () => {
    expect(socketPath(LONG)).toBe(socketPath(LONG));
    expect(socketPath(LONG)).not.toBe(socketPath(`${LONG}-2`));
  });

  test.each([`/var/${'long/'.repeat(30)}`, '/var/with a space'])(
    'keeps out of a temporary folder that will not do: %s',
    (temporary) => {
      expect(socketPath(LONG, temporary)).toMatch(/^\/tmp\/stillground-[0-9a-f]{16}\/db\.sock$/);
    },
  );
});

describe('a private folder', () => {
  test('is made for its owner alone, and closed if it was open', () => {
    const folder = join(temporaryFolder(), 'data');
    ensurePrivateFolder(folder);
    expect(mode(folder)).toBe(0o700);
    chmodSync(folder, 0o755);
    ensurePrivateFolder(folder);
    expect(mode(folder)).toBe(0o700);
  });

  test('is not a link that leads elsewhere', () => {
    const folder = temporaryFolder();
    symlinkSync(folder, join(folder, 'link'));
    expect(() => ensurePrivateFolder(join(folder, 'link'))).toThrow(/is not a folder/);
  });

  test('is not somebody else’s', () => {
    let folder = '/usr';
    if (process.getuid?.() === 0) {
      folder = join(temporaryFolder(), 'theirs');
      mkdirSync(folder);
      chownSync(folder, 12_345, 12_345);
    }
    expect(() => ensurePrivateFolder(folder)).toThrow(/belongs to another user/);
  });
});

describe('a database folder', () => {
  test('that is absent or empty holds nothing', () => {
    const folder = temporaryFolder();
    expect(databaseIn(join(folder, 'none'))).toBeNull();
    mkdirSync(join(folder, 'empty'));
    expect(databaseIn(join(folder, 'empty'))).toBeNull();
  });

  test('that Stillground did not make is refused and left as it was', () => {
    const folder = temporaryFolder();
    writeFileSync(join(folder, 'ibdata1'), 'somebody’s work');
    expect(() => databaseIn(folder)).toThrow(/did not make; move it away/);
    expect(readFileSync(join(folder, 'ibdata1'), 'utf8')).toBe('somebody’s work');
  });

  test.each(['{', '{}', '{"madeBy":"somebody","id":"1"}', '{"madeBy":"stillground"}'])(
    'with this for a marker is not ours: %s',
    (marker) => {
      const folder = temporaryFolder();
      writeFileSync(join(folder, 'stillground.json'), marker);
      expect(() => databaseIn(folder)).toThrow(/did not make/);
    },
  );

  test('with our marker is known by its identity, and only its own secrets open it', () => {
    const folder = temporaryFolder();
    writeFileSync(join(folder, 'stillground.json'), '{"madeBy":"stillground","id":"one"}');
    expect(databaseIn(folder)).toBe('one');
    expect(() => checkIdentity(folder, 'one', 'one')).not.toThrow();
    expect(() => checkIdentity(folder, null, 'one')).not.toThrow();
    expect(() => checkIdentity(folder, 'one', 'two')).toThrow(/another copy of Stillground/);
  });
});

describe('secrets', () => {
  test('are made once, kept and readable by their owner alone', () => {
    const folder = temporaryFolder();
    const made = keptSecrets(folder);
    expect(keptSecrets(folder)).toEqual(made);
    expect(mode(join(folder, 'secrets.json'))).toBe(0o600);
    expect(new Set(Object.values(made)).size).toBe(4);
    expect(keptSecrets(temporaryFolder()).rootPassword).not.toBe(made.rootPassword);
  });

  test('lost, they are made again for the database that is there', () => {
    const id = '123e4567-e89b-42d3-a456-426614174000';
    expect(keptSecrets(temporaryFolder(), id).databaseId).toBe(id);
  });

  test.each(['{', 'null', '{}', '{"rootPassword":"\'; DROP"}'])(
    'damaged, they are refused rather than replaced: %s',
    (text) => {
      const folder = temporaryFolder();
      writeFileSync(join(folder, 'secrets.json'), text);
      expect(() => keptSecrets(folder)).toThrow(/is damaged; delete it/);
    },
  );
});
