import { mkdirSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { describe, expect, onTestFinished, test } from 'vitest';
import { isBuilt, sourcesHash } from '@/scripts/bootstrap/build.mjs';
import {
  DATABASE_PACKAGES,
  findCommand,
  installCommand,
  missingPackages,
} from '@/scripts/bootstrap/debian-packages.mjs';
import { patience } from '@/scripts/bootstrap/keep-going.mjs';
import { modulesFault } from '@/scripts/bootstrap/node-modules.mjs';
import { anyFreePort, choosePort, isFree } from '@/scripts/bootstrap/ports.mjs';
import { run } from '@/scripts/bootstrap/run.mjs';
import { exitCode, lastLine, sum, tallyReport } from '@/scripts/bootstrap/test-tally.mjs';
import { welcome } from '@/scripts/bootstrap/welcome.mjs';
import { temporaryFolder } from './temporary';

describe('Debian packages', () => {
  test('one is missing when any of its commands is', () => {
    expect(missingPackages(DATABASE_PACKAGES, () => '/usr/bin/it')).toEqual([]);
    expect(missingPackages(DATABASE_PACKAGES, () => null)).toEqual([
      'mariadb-server-core',
      'mariadb-client-core',
    ]);
    const noInstaller = (command: string) => (command === 'mariadb-install-db' ? null : '/x');
    expect(missingPackages(DATABASE_PACKAGES, noInstaller)).toEqual(['mariadb-server-core']);
  });

  test('a command is found on the path, and only if it may be run', () => {
    const folder = temporaryFolder();
    writeFileSync(join(folder, 'a-tool'), '', { mode: 0o755 });
    writeFileSync(join(folder, 'a-text'), '', { mode: 0o644 });
    expect(findCommand('a-tool', folder)).toBe(join(folder, 'a-tool'));
    expect(findCommand('a-text', folder)).toBeNull();
  });

  test('what to type is given to the letter', () => {
    expect(installCommand(['one', 'two'])).toBe(
      'sudo apt-get update && sudo apt-get install -y --no-install-recommends one two',
    );
  });
});

describe('Node packages', () => {
  const LOCKED = {
    '': { version: '0.1.0' },
    'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
    'node_modules/other-machine': { version: '1.0.0', integrity: 'sha512-o', optional: true },
  };
  function copyWith(installed: object | null): string {
    const root = temporaryFolder();
    writeFileSync(join(root, 'package-lock.json'), JSON.stringify({ packages: LOCKED }));
    mkdirSync(join(root, 'node_modules'));
    const file = join(root, 'node_modules', '.package-lock.json');
    if (installed) writeFileSync(file, JSON.stringify({ packages: installed }));
    return root;
  }

  test('that agree with the lock are left alone', async () => {
    expect(await modulesFault(copyWith({ 'node_modules/a': LOCKED['node_modules/a'] }))).toBeNull();
  });

  test.each([
    [null, 'nothing is installed'],
    [{}, 'node_modules/a is missing'],
    [
      { 'node_modules/a': { version: '1.0.1', integrity: 'sha512-a' } },
      'node_modules/a is not the version in the lock',
    ],
    [
      { 'node_modules/a': { version: '1.0.0', integrity: 'sha512-b' } },
      'node_modules/a is not the version in the lock',
    ],
  ])('that are %j call for an installation', async (installed, fault) => {
    expect(await modulesFault(copyWith(installed))).toBe(fault);
  });

  test('those of this very copy agree with its lock', async () => {
    expect(await modulesFault(process.cwd())).toBeNull();
  });
});

describe('the build', () => {
  function copy(): string {
    const root = temporaryFolder();
    mkdirSync(join(root, 'app'));
    mkdirSync(join(root, '.next'));
    writeFileSync(join(root, 'app', 'page.tsx'), 'one');
    return root;
  }
  function stamp(root: string, build = 'b1'): void {
    writeFileSync(join(root, '.next', 'BUILD_ID'), 'b1');
    const text = JSON.stringify({ sources: sourcesHash(root), build });
    writeFileSync(join(root, '.next', 'stillground-build.json'), text);
  }

  test('holds while the sources are the same, and not a change longer', () => {
    const root = copy();
    expect(isBuilt(root)).toBe(false);
    stamp(root);
    expect(isBuilt(root)).toBe(true);
    writeFileSync(join(root, 'README.md'), 'not a source');
    expect(isBuilt(root)).toBe(true);
    writeFileSync(join(root, 'app', 'page.tsx'), 'two');
    expect(isBuilt(root)).toBe(false);
  });

  test('sees a file that moved, came or went', () => {
    const root = copy();
    const before = sourcesHash(root);
    writeFileSync(join(root, 'proxy.ts'), '');
    expect(sourcesHash(root)).not.toBe(before);
  });

  test('made by other hands or cut short does not count', () => {
    const root = copy();
    stamp(root, 'another');
    expect(isBuilt(root)).toBe(false);
    writeFileSync(join(root, '.next', 'stillground-build.json'), '{');
    expect(isBuilt(root)).toBe(false);
  });
});

describe('ports', () => {
  async function taken(host: string): Promise<number> {
    const server = createServer();
    await new Promise<void>((ready) => server.listen({ port: 0, host }, ready));
    onTestFinished(() => void server.close());
    const address = server.address();
    return typeof address === 'object' && address ? address.port : 0;
  }

  test.each(['127.0.0.1', '0.0.0.0', '::'])('one that is taken on %s is not free', async (host) => {
    expect(await isFree(await taken(host))).toBe(false);
  });

  test('asked for by number and taken, it is refused by name', async () => {
    await expect(choosePort(await taken('0.0.0.0'))).rejects.toThrow(/^PORT \d+ is taken/);
  });

  test('not asked for, the next free one is taken', async () => {
    const first = await taken('0.0.0.0');
    // Above the range that is searched there is nothing to find.
    if (first >= 3999) await expect(choosePort(null, first)).rejects.toThrow(/No port from/);
    else expect(await choosePort(null, first)).toBeGreaterThan(first);
    expect(await choosePort(null, 3000)).toBeGreaterThanOrEqual(3000);
  });

  test('a free one can be listened on', async () => {
    expect(await isFree(await anyFreePort())).toBe(true);
  });
});

describe('commands', () => {
  test('tell their code and all they wrote', async () => {
    const code = "process.stdout.write('out'); process.stderr.write('err'); process.exitCode = 3";
    const ran = await run(process.execPath, ['-e', code]);
    expect(ran).toMatchObject({ code: 3, signal: null });
    expect([...ran.output].sort().join('')).toBe([...'outerr'].sort().join(''));
  });

  test('that are not there are an error', async () => {
    await expect(run('/no/such/command', [])).rejects.toThrow(/ENOENT/);
  });
});

test('something that keeps falling is not put up for ever', () => {
  let now = 0;
  const again = patience(() => now);
  expect(Array.from({ length: 6 }, again)).toEqual([true, true, true, true, true, false]);
  now += 5 * 60_000;
  expect(again()).toBe(true);
});

describe('the count of a test run', () => {
  const file = (status: string, ...statuses: string[]) => ({
    status,
    assertionResults: statuses.map((of) => ({ status: of })),
  });

  test.each([
    ['all passed', [file('passed', 'passed', 'passed')], { passed: 2, failed: 0 }],
    ['one failed', [file('failed', 'passed', 'failed')], { passed: 1, failed: 1 }],
    ['a file that did not load', [file('failed')], { passed: 0, failed: 1 }],
    ['a hook that broke', [file('failed', 'passed')], { passed: 1, failed: 1 }],
    ['a skipped test', [file('passed', 'passed', 'pending')], { passed: 1, failed: 1 }],
    ['a test yet to be written', [file('passed', 'todo')], { passed: 0, failed: 1 }],
  ])('%s', (_, testResults, tally) => {
    expect(tallyReport({ testResults })).toEqual(tally);
  });

  test('ends in one line and one code', () => {
    const good = sum([
      { passed: 1, failed: 0 },
      { passed: 40, failed: 0 },
    ]);
    expect(lastLine(good)).toBe('41 passed, 0 failed');
    expect(exitCode(good)).toBe(0);
    expect(exitCode({ passed: 40, failed: 1 })).toBe(1);
    expect(exitCode({ passed: 0, failed: 0 })).toBe(1);
  });
});

test('the welcome tells where to go and who to be', () => {
  const text = welcome('http://localhost:3000', [
    { name: 'A', email: 'a@team.example', role: 'planner', password: 'one two' },
    { name: 'B', email: 'bb@team.example', role: 'crew', password: 'three four' },
  ]);
  expect(text).toContain('Stillground is ready at http://localhost:3000');
  expect(text).toContain('  planner  a@team.example   one two');
  expect(text).toContain('  crew     bb@team.example  three four');
  expect(welcome('http://localhost:3000', [])).not.toContain('sign-ins');
});
