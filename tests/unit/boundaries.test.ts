import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { ESLint } from 'eslint';
import { describe, expect, test } from 'vitest';

const root = join(import.meta.dirname, '../..');
const eslint = new ESLint({ cwd: root });

/** The rules a made-up file at this path breaks. */
async function breaches(path: string, code: string): Promise<string[]> {
  const [result] = await eslint.lintText(code, { filePath: join(root, path) });
  return (result?.messages ?? []).map(
    (message) => message.ruleId ?? `unreadable: ${message.message}`,
  );
}

/** A module that exists in a part, so that the import under test leads somewhere. */
function moduleOf(part: string): string | undefined {
  if (!existsSync(join(root, part))) return undefined;
  const files = readdirSync(join(root, part), { recursive: true, encoding: 'utf8' });
  const found = files.filter((name) => /\.tsx?$/.test(name)).sort()[0];
  return found && `@/${part}/${found.replace(/\.tsx?$/, '').replaceAll('\\', '/')}`;
}

const importing = (module: string) => `export { something } from '${module}';\n`;
const importingType = (module: string) => `export type { Something } from '${module}';\n`;

describe('the order of the house', () => {
  const ORDER = [
    'lib/geo',
    'lib/limits',
    'lib/layout',
    'lib/edits',
    'lib/checks',
    'lib/draw',
    'lib/client',
    'components',
    'app',
  ];
  const built = ORDER.filter((part) => moduleOf(part));
  const pairs = built.flatMap((early, i) => built.slice(i + 1).map((late) => [early, late]));

  test('enough of the house stands for this to mean something', () => {
    expect(built.length).toBeGreaterThanOrEqual(5);
  });

  test.each(pairs)('%s never imports %s, which may import it', async (early = '', late = '') => {
    const breach = ['boundaries/dependencies'];
    expect(await breaches(`${early}/breach.ts`, importing(moduleOf(late) ?? ''))).toEqual(breach);
    expect(await breaches(`${early}/breach.ts`, importingType(moduleOf(late) ?? ''))).toEqual(
      breach,
    );
    expect(await breaches(`${late}/fine.ts`, importing(moduleOf(early) ?? ''))).toEqual([]);
  });
});

describe('the screen and the database never meet', () => {
  test.each(
    ['components', 'lib/client'].flatMap((screen) =>
      ['models', 'lib/server', 'app', 'migrations'].map((far) => [screen, far]),
    ),
  )('%s does not import %s, not even for a type', async (screen, far) => {
    // A folder that is still empty is refused as well: its path leads nowhere.
    const target = moduleOf(far ?? '') ?? `@/${far}/thing`;
    for (const code of [importing(target), importingType(target), `import("${target}");\n`]) {
      expect(await breaches(`${screen}/breach.ts`, code)).toContain('boundaries/dependencies');
    }
  });

  test.each(['sequelize', 'mariadb', '@node-rs/argon2', 'sharp', 'node:fs'])(
    'components do not import %s',
    async (name) => {
      expect(await breaches('components/breach.tsx', importing(name))).toEqual([
        'boundaries/dependencies',
      ]);
    },
  );
});

describe('pure parts stay pure', () => {
  const FOREIGN = ['react', 'next/navigation', 'leaflet', 'konva', 'sequelize', 'node:fs', 'fs'];
  const PURE = ['geo', 'limits', 'layout', 'edits', 'checks', 'draw', 'access', 'api'];

  test.each(PURE.flatMap((part) => FOREIGN.map((name) => [part, name])))(
    'lib/%s does not import %s',
    async (part, name) => {
      for (const code of [importing(name ?? ''), importingType(name ?? '')]) {
        expect(await breaches(`lib/${part}/breach.ts`, code)).toEqual(['boundaries/dependencies']);
      }
      expect(await breaches(`lib/${part}/breach.ts`, `import('${name}');\n`)).toContain(
        'boundaries/dependencies',
      );
    },
  );

  test.each([
    ['no-restricted-globals', 'export const width = window.innerWidth;'],
    ['no-restricted-globals', 'export const home = process.env.HOME;'],
    ['no-restricted-properties', 'export const now = Date.now();'],
    ['no-restricted-properties', 'export const chance = Math.random();'],
    ['no-restricted-syntax', 'export const now = new Date();'],
  ])('%s catches: %s', async (rule, code) => {
    expect(await breaches('lib/checks/breach.ts', code)).toEqual([rule]);
    expect(await breaches('lib/server/fine.ts', code)).toEqual([]);
  });

  test('a given time is not the clock', async () => {
    expect(
      await breaches('lib/checks/fine.ts', 'export const at = (t: string) => new Date(t);'),
    ).toEqual([]);
  });
});

describe('geometry by library goes through one door', () => {
  test('lib/geo imports Turf', async () => {
    expect(await breaches('lib/geo/fine.ts', importing('@turf/turf'))).toEqual([]);
  });

  test.each(['lib/checks', 'lib/draw', 'lib/server', 'lib/client', 'components', 'models', 'app'])(
    '%s does not import Turf',
    async (part) => {
      expect(await breaches(`${part}/breach.ts`, importing('@turf/turf'))).toEqual([
        'boundaries/dependencies',
      ]);
    },
  );
});

test('a new part of lib/ has to be given its place', async () => {
  expect(await breaches('lib/elsewhere/breach.ts', 'export const one = 1;\n')).toEqual([
    'boundaries/no-unknown-files',
  ]);
});

test('a migration leans on nothing that moves', async () => {
  expect(await breaches('migrations/0001-breach.ts', importing('@/lib/limits'))).toEqual([
    'boundaries/dependencies',
  ]);
  expect(await breaches('migrations/0001-fine.ts', importing('sequelize'))).toEqual([]);
});

test('nothing is written to the console', async () => {
  expect(await breaches('components/breach.tsx', "console.log('here');\n")).toEqual(['no-console']);
});
