import boundaries from 'eslint-plugin-boundaries';
import coreWebVitals from 'eslint-config-next/core-web-vitals';
import typescript from 'eslint-config-next/typescript';

/**
 * What each part of lib/ may import from the other parts. Read top to bottom it is the order of
 * the house: a part sees only parts above it, so that nothing goes round in a circle.
 */
const PURE = {
  geo: [],
  access: [],
  limits: ['geo'],
  liquid: ['geo', 'limits'],
  ground: ['geo', 'limits'],
  layout: ['geo', 'limits', 'liquid', 'ground'],
  edits: ['geo', 'limits', 'liquid', 'ground', 'layout'],
  import: ['geo', 'limits', 'liquid', 'ground', 'layout'],
  checks: ['geo', 'limits', 'liquid', 'ground', 'layout', 'edits'],
  propose: ['geo', 'limits', 'liquid', 'ground', 'layout', 'edits', 'checks'],
  record: ['geo', 'limits', 'liquid', 'ground', 'layout', 'edits', 'checks'],
  draw: ['geo', 'limits', 'liquid', 'ground', 'layout', 'edits', 'checks', 'propose', 'record'],
  api: ['access', 'geo', 'limits', 'liquid', 'ground', 'layout', 'edits', 'checks', 'record'],
};

const pure = Object.keys(PURE);

/** What the parts that touch the world may import: the screen on one side, the database on the other. */
const SHELL = {
  models: ['access', 'limits', 'layout', 'checks'],
  server: [...pure, 'models'],
  client: pure,
  components: [...pure, 'client'],
  app: [...pure, 'models', 'server', 'client', 'components'],
  // A migration must do tomorrow what it did the day it was written, so it leans on nothing that moves.
  migrations: [],
};

const shell = Object.keys(SHELL);
const isPart = (types) => ({ element: { types: { anyOf: types } } });
const isPackage = (names) => ({ module: { origin: ['external', 'core'], source: names } });

/** Packages that neither touch the world nor read the clock. */
const PURE_PACKAGES = ['zod', 'date-fns'];
const GEO_PACKAGES = ['@turf/*', 'mgrs', 'geographiclib-geodesic'];
/** Packages that would drag the server into the browser's bundle. */
const SERVER_PACKAGES = [
  'sequelize',
  'mariadb',
  'umzug',
  'nodemailer',
  'pino',
  'sharp',
  'server-only',
  '@node-rs/*',
];

const policies = [
  ...Object.entries({ ...PURE, ...SHELL })
    .filter(([, seen]) => seen.length > 0)
    .map(([part, seen]) => ({ from: isPart([part]), allow: { to: isPart(seen) } })),
  { from: isPart(pure), allow: { to: isPackage(PURE_PACKAGES) } },
  { from: isPart(['geo']), allow: { to: isPackage(GEO_PACKAGES) } },
  { from: isPart(shell), allow: { to: { module: { origin: ['external', 'core'] } } } },
  { from: isPart(shell), disallow: { to: isPackage(['@turf/*']) } },
  {
    from: isPart(['client', 'components']),
    disallow: { to: [{ module: { origin: 'core' } }, isPackage(SERVER_PACKAGES)] },
  },
];

/** Globals of the page, of Node and of the clock: a pure part is given what it needs to know. */
const WORLD = ['window', 'document', 'navigator', 'localStorage', 'process', 'Buffer', 'fetch'];

const config = [
  ...coreWebVitals,
  ...typescript,
  { ignores: ['.data/**', 'coverage/**', 'public/**', 'tests/browser/shots/**'] },
  {
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/no-unused-expressions': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
    },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
  },
  {
    files: ['{app,components,lib,models}/**/*.{ts,tsx}', 'proxy.ts'],
    rules: { 'no-console': 'error' },
  },
  {
    // Signing in and out loads a page whole on purpose: nothing of a person's may stay in memory.
    files: ['components/{shell,sign-in}/**/*.tsx'],
    rules: { '@next/next/no-location-assign-relative-destination': 'off' },
  },
  {
    files: ['{app,components,lib,models,migrations}/**/*.{ts,tsx}', 'proxy.ts'],
    plugins: { boundaries },
    settings: {
      'import/resolver': { typescript: { project: './tsconfig.json' } },
      'boundaries/legacy-warnings': false,
      // A path of ours that leads nowhere is a breach, not somebody else's package.
      'boundaries/flag-as-external': { unresolvableAlias: false },
      'boundaries/elements': [
        ...pure.map((part) => ({ type: part, pattern: `lib/${part}` })),
        { type: 'server', pattern: 'lib/server' },
        { type: 'client', pattern: 'lib/client' },
        ...['models', 'migrations', 'components', 'app'].map((part) => ({
          type: part,
          pattern: part,
        })),
        { type: 'app', pattern: 'proxy.ts', mode: 'full' },
      ],
      'boundaries/dependency-nodes': ['import', 'export', 'dynamic-import', 'require'],
      'boundaries/additional-dependency-nodes': [
        { selector: 'TSImportType Literal', kind: 'type', name: 'import-type' },
      ],
    },
    rules: {
      'boundaries/dependencies': [
        'error',
        { default: 'disallow', checkAllOrigins: true, checkUnknownLocals: true, policies },
      ],
      'boundaries/no-unknown-files': 'error',
    },
  },
  {
    files: pure.map((part) => `lib/${part}/**/*.{ts,tsx}`),
    rules: {
      // No React here, so a function called `use` is only a function.
      'react-hooks/rules-of-hooks': 'off',
      'no-restricted-globals': ['error', ...WORLD],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'Take the time as an argument.' },
        { object: 'Math', property: 'random', message: 'Take the number as an argument.' },
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: "NewExpression[callee.name='Date'][arguments.length=0]",
          message: 'Take the time as an argument.',
        },
      ],
    },
  },
];

export default config;
