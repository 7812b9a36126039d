import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, onTestFinished, test } from 'vitest';
import { claim, LOCK_FILE } from '@/scripts/bootstrap/claim.mjs';
import { readNote, takeLock } from '@/scripts/bootstrap/folder-lock.mjs';
import { end, identify, isAlive } from '@/scripts/bootstrap/process-identity.mjs';
import { temporaryFolder } from './temporary';

/** A process that does nothing for a long time. */
function sleeper(code = 'setTimeout(() => undefined, 60_000)'): ChildProcess & { pid: number } {
  const child = spawn(process.execPath, ['-e', `${code}; process.stdout.write('up')`], {
    stdio: ['ignore', 'pipe', 'ignore'],
  });
  onTestFinished(() => void child.kill('SIGKILL'));
  if (child.pid === undefined) throw new Error('no process');
  return child as ChildProcess & { pid: number };
}

const up = (child: ChildProcess) => once(child.stdout!, 'data');

function held(file: string) {
  const taken = takeLock(file);
  return 'heldBy' in taken ? taken.heldBy : null;
}

test('a process is known by its number and its beginning', async () => {
  const child = sleeper();
  await up(child);
  const identity = identify(child.pid);
  expect(isAlive(identity)).toBe(true);
  expect(isAlive({ ...identity, started: '1' }), 'the number went to another').toBe(false);
  child.kill('SIGKILL');
  await once(child, 'exit');
  expect(isAlive(identity)).toBe(false);
});

test('a process that will not end is ended only where that is allowed', async () => {
  const child = sleeper(
    "process.on('SIGTERM', () => undefined); setTimeout(() => undefined, 60_000)",
  );
  await up(child);
  const identity = identify(child.pid);
  expect(await end(identity, { patienceMs: 300, insist: false })).toBe(false);
  expect(isAlive(identity)).toBe(true);
  expect(await end(identity, { patienceMs: 300, insist: true })).toBe(true);
});

test('a folder is taken once, and free again when let go', () => {
  const file = join(temporaryFolder(), LOCK_FILE);
  const first = takeLock(file);
  if (!('lock' in first)) throw new Error('not taken');
  first.lock.note({ address: 'http://localhost:3000' });
  expect(held(file)).toMatchObject({
    holder: { pid: process.pid },
    address: 'http://localhost:3000',
  });
  first.lock.release();
  expect(held(file)).toBeNull();
});

test('a lock whose holder was killed is taken over, and what it had running is told', async () => {
  const file = join(temporaryFolder(), LOCK_FILE);
  const holder = sleeper();
  await up(holder);
  const children = [{ name: 'database', ...identify(process.pid) }];
  const note = { holder: identify(holder.pid), address: null, children };
  writeFileSync(file, JSON.stringify(note));
  expect(held(file)?.holder.pid).toBe(holder.pid);
  holder.kill('SIGKILL');
  await once(holder, 'exit');
  const taken = takeLock(file);
  expect('lock' in taken && taken.lock.left?.children).toEqual(children);
  expect(readNote(file)?.holder.pid).toBe(process.pid);
});

test('half a note is nobody’s', () => {
  const file = join(temporaryFolder(), LOCK_FILE);
  writeFileSync(file, '{"holder":');
  expect(held(file)).toBeNull();
});

test('of many that come at once exactly one gets in', async () => {
  const folder = temporaryFolder();
  const lockModule = JSON.stringify(join(process.cwd(), 'scripts/bootstrap/folder-lock.mjs'));
  const file = join(folder, LOCK_FILE);
  writeFileSync(file, JSON.stringify({ holder: { pid: 999_999_999, started: '1' }, children: [] }));
  const code = `import(${lockModule}).then(({ takeLock }) => {
    process.stdout.write('lock' in takeLock(${JSON.stringify(file)}) ? 'in' : 'out');
    setTimeout(() => undefined, 60_000);
  })`;
  const answers = await Promise.all(
    Array.from({ length: 6 }, async () => {
      const child = spawn(process.execPath, ['-e', code], { stdio: ['ignore', 'pipe', 'inherit'] });
      onTestFinished(() => void child.kill('SIGKILL'));
      const [answer] = (await once(child.stdout, 'data')) as [Buffer];
      return String(answer);
    }),
  );
  expect(answers.filter((answer) => answer === 'in')).toHaveLength(1);
});

test('claiming a folder ends what a killed run left, database last', async () => {
  const folder = temporaryFolder();
  const log = join(folder, 'order');
  const noting = (name: string) => `
    process.on('SIGTERM', () => {
      require('node:fs').appendFileSync(${JSON.stringify(log)}, '${name} ');
      process.exit();
    });
    setTimeout(() => undefined, 60_000)`;
  const database = sleeper(noting('database'));
  const web = sleeper(noting('web'));
  await Promise.all([up(database), up(web)]);
  const note = {
    holder: { pid: 999_999_999, started: '1' },
    address: null,
    children: [
      { name: 'database', ...identify(database.pid) },
      { name: 'web server', ...identify(web.pid) },
    ],
  };
  writeFileSync(join(folder, LOCK_FILE), JSON.stringify(note));
  await claim(folder, 'npm start');
  expect(readFileSync(log, 'utf8')).toBe('web database ');
  await expect(claim(folder, 'npm start')).rejects.toThrow(
    /^`npm start` is already going on in this folder \(process \d+\); stop that one first/,
  );
});
