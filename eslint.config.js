import { defineConfig } from 'eslint/config';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** The two rules that find bugs; the rest of the plugin's set serves React's compiler, which is not used here. */
const HOOKS = { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' };

const TESTS = ['tests/**/*.{ts,tsx}'];

/**
 * STYLE.md's directions of import. ESLint lets a later entry replace an earlier one's option for the same rule,
 * so each folder gets its whole list at once.
 *
 * @param pairs - a pattern of refused imports, and why they are refused.
 */
const refuse = (...pairs) => ({
  '@typescript-eslint/no-restricted-imports': ['error', { patterns: pairs.map(([regex, message]) => ({ regex, message })) }],
});

const FROM_SERVER = ['^(#|(\\.\\./)+)server/', 'The browser and shared code never import the server.'];
const FROM_SRC = ['^(@/|(\\.\\./)+src/)', 'The server and shared code never import the browser.'];
const FROM_TESTS = ['^(\\.\\./)+tests/', 'Product code never imports tests.'];
const FROM_NODE = ['^node:', 'This code runs in the browser.'];
const IN_SRC = [FROM_SERVER, FROM_NODE, FROM_TESTS];
const FROM_ROUTER = ['^(@/|(\\.\\./)+)router$', 'Imports run one way: lib and components, features, routes, router.'];
const FROM_ROUTES = ['^(@/|(\\.\\./)+)routes/', 'Imports run one way: lib and components, features, routes, router.'];
const FROM_FEATURES = ['^(@/|(\\.\\./)+)features/', 'lib and components know no feature.'];

const FEATURE_NAMES = ['session', 'albums', 'prints', 'composer', 'help', 'stash'];

/** A feature reaches its own files, by either spelling, and no other feature's. */
const featureConfig = (name) => ({
  files: [`src/features/${name}/**/*.{ts,tsx}`],
  rules: refuse(
    ...IN_SRC,
    FROM_ROUTER,
    FROM_ROUTES,
    [`features/(?!${name}/)`, 'Features do not import each other; routes join them.'],
    [`^(\\.\\./)+(${FEATURE_NAMES.filter((other) => other !== name).join('|')})/`, 'Features do not import each other; routes join them.'],
  ),
});

export default defineConfig(
  { ignores: ['dist/', 'node_modules/', '.data/', 'coverage/'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-console': 'error',
      'no-restricted-exports': ['error', { restrictDefaultExports: { direct: true, named: true, defaultFrom: true, namedFrom: true } }],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/ban-ts-comment': ['error', { 'ts-expect-error': true }],
    },
  },
  {
    files: ['{shared,server,src}/**/*.{ts,tsx}'],
    // Tables of data may be longer.
    ignores: ['shared/sketches/catalogue*.ts', 'shared/words/**', 'shared/scene/metrics/*.ts'],
    rules: { 'max-lines': ['error', { max: 400, skipBlankLines: false, skipComments: false }] },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      ...refuse(
        FROM_SERVER,
        FROM_SRC,
        FROM_TESTS,
        ['^(?!\\.)(?!zod$|zod/|colorjs\\.io$|colorjs\\.io/)', 'Shared code imports zod, colorjs.io and its own files by relative path.'],
      ),
      'no-restricted-globals': [
        'error',
        ...['process', 'Buffer', 'window', 'document', 'navigator', 'localStorage', 'fetch', 'performance', 'crypto', 'setTimeout', 'setInterval'].map(
          (name) => ({ name, message: 'Shared code is pure: no Node, DOM, clock, random or I/O.' }),
        ),
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'Shared code has no clock: take the time as an argument.' },
        { object: 'Math', property: 'random', message: 'Shared code has no chance: take the value as an argument.' },
      ],
      'no-restricted-syntax': [
        'error',
        { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: 'Shared code has no clock: take the time as an argument.' },
        { selector: 'ImportExpression', message: 'Shared code imports at the top, where the linter sees it.' },
      ],
    },
  },
  { files: ['server/**/*.ts'], rules: refuse(FROM_SRC, FROM_TESTS, ['^#server/', 'Inside the server, import by relative path.']) },
  { files: ['src/**/*.{ts,tsx}'], plugins: { 'react-hooks': reactHooks }, rules: { ...HOOKS, ...refuse(...IN_SRC) } },
  { files: ['src/{lib,components}/**/*.{ts,tsx}'], rules: refuse(...IN_SRC, FROM_ROUTER, FROM_ROUTES, FROM_FEATURES) },
  ...FEATURE_NAMES.map(featureConfig),
  {
    files: ['src/routes/**/*.{ts,tsx}'],
    rules: refuse(...IN_SRC, FROM_ROUTER),
  },
  {
    files: TESTS,
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: "MemberExpression[object.name=/^(it|test|describe)$/][property.name=/^(skip|only|todo|skipIf|runIf)$/]",
          message: 'No test is skipped or run alone.',
        },
      ],
    },
  },
  // Tools expect a default export of these; the set-up and the bench talk to the terminal.
  { files: ['*.config.ts', 'tests/support/test-database-server.ts', 'tests/support/e2e/running-product.ts'], rules: { 'no-restricted-exports': 'off' } },
  { files: ['server/setup/**/*.ts', 'tests/bench/run.ts'], rules: { 'no-console': 'off' } },
);
