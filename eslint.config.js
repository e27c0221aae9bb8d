import angular from 'angular-eslint';
import boundaries from 'eslint-plugin-boundaries';
import { importX } from 'eslint-plugin-import-x';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import { defineConfig, globalIgnores } from 'eslint/config';
import { builtinRules } from 'eslint/use-at-your-own-risk';
import tseslint from 'typescript-eslint';

/** ESLint marks its own recommended rules; reading the marks spares the package that only lists them. */
const recommended = {
  rules: Object.fromEntries(
    [...builtinRules].filter(([, rule]) => rule.meta.docs.recommended).map(([name]) => [name, 'error']),
  ),
};

const TYPESCRIPT = ['**/*.ts'];
const SPECS = ['**/*.spec.ts', 'tests/**/*.ts'];
const ENGINE = ['packages/engine/src/**/*.ts'];

/** Each layer of the engine may use those of the rows before its own, and no other of its own row but itself. */
const ENGINE_LAYERS = [
  ['units', 'numerics'],
  ['derivation'],
  ['psychrometrics', 'refrigerants'],
  ['methods'],
  ['steadiness', 'diagnosis'],
  ['check'],
  ['field'],
  ['training'],
  ['sources'],
];

const layer = (name) => `engine-${name}`;
const element = (type, pattern) => ({ type, pattern, partialMatch: false });
const allow = (from, to) => ({ from, allow: { to } });
const ofType = (type) => ({ element: { type } });
const inCategory = (category) => ({ file: { categories: category } });

const elements = [
  ...ENGINE_LAYERS.flat().map((name) => element(layer(name), `packages/engine/src/${name}`)),
  element('engine-generators', 'packages/engine/generators'),
  element('engine', 'packages/engine/src'),
  element('wording', 'packages/wording/src'),
  element('contract', 'packages/contract/src'),
  element('api', 'apps/api/src'),
  element('web', 'apps/web/src'),
  element('tests', 'tests'),
];

const files = [
  { category: 'engine-door', pattern: 'packages/engine/src/{index,training/index,sources/index}.ts' },
  { category: 'engine-errors', pattern: 'packages/engine/src/{errors,result}.ts' },
  { category: 'wording-door', pattern: 'packages/wording/src/index.ts' },
  { category: 'contract-door', pattern: 'packages/contract/src/*.ts' },
  { category: 'spec', pattern: '**/*.spec.ts' },
];

const layerPolicies = ENGINE_LAYERS.flatMap((names, row) =>
  names.map((name) =>
    allow(ofType(layer(name)), [
      ...ENGINE_LAYERS.slice(0, row)
        .flat()
        .map((before) => ofType(layer(before))),
      inCategory('engine-errors'),
    ]),
  ),
);

const packagePolicies = [
  allow(ofType('wording'), inCategory('engine-door')),
  allow(ofType('contract'), inCategory('engine-door')),
  ...['api', 'web'].map((application) =>
    allow(ofType(application), ['engine-door', 'wording-door', 'contract-door'].map(inCategory)),
  ),
];

/** A door is for others: inside a package one imports the file, or a cycle is only a question of time. */
const ownDoorPolicies = [
  { from: ofType(['engine', 'engine-*']), disallow: { to: inCategory('engine-door') } },
  { from: ofType('wording'), disallow: { to: inCategory('wording-door') } },
];

const dependencyPolicies = [
  { allow: { dependency: { relationship: { to: 'internal' } } } },
  allow(inCategory('engine-door'), ofType(['engine', 'engine-*'])),
  ...layerPolicies,
  ...packagePolicies,
  ...ownDoorPolicies,
  allow({ element: { type: 'engine*' }, file: { categories: 'spec' } }, ofType(['engine', 'engine-*'])),
  allow(ofType(['tests', 'engine-generators']), { module: { origin: 'local' } }),
];

export default defineConfig(
  globalIgnores(['dist/', '.angular/', '.launch/', 'coverage/', 'test-results/', 'data/']),
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  {
    files: ['**/*.{js,mjs}'],
    extends: [recommended],
    languageOptions: {
      globals: Object.fromEntries(
        [
          'AbortController',
          'URL',
          'clearInterval',
          'clearTimeout',
          'console',
          'performance',
          'process',
          'setInterval',
          'setTimeout',
        ].map((name) => [name, 'readonly']),
      ),
    },
  },
  {
    // Scripts of a service worker.
    files: ['apps/web/public/**/*.js'],
    languageOptions: { sourceType: 'script', globals: { importScripts: 'readonly', self: 'readonly' } },
  },
  {
    files: TYPESCRIPT,
    extends: [recommended, tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    plugins: { boundaries, 'import-x': importX },
    settings: {
      ...importX.flatConfigs.typescript.settings,
      'import-x/resolver-next': [createTypeScriptImportResolver({ project: 'tsconfig.json' })],
      // The boundaries plugin finds files by the older setting.
      'import/resolver': { typescript: { project: 'tsconfig.json' } },
      'boundaries/elements': elements,
      'boundaries/files': files,
    },
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        // `const { dropped: _, ...rest } = whole` is how a field is left out.
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', destructuredArrayIgnorePattern: '^_' },
      ],
      // Validators of Angular are static methods given as values.
      '@typescript-eslint/unbound-method': 'off',
      'import-x/no-cycle': 'error',
      'boundaries/dependencies': ['error', { default: 'disallow', checkInternals: true, policies: dependencyPolicies }],
    },
  },
  {
    files: ['**/*.{ts,js,mjs}'],
    ignores: ['**/*.spec.{ts,mjs}', '**/data/**', '**/generated/**'],
    rules: { 'max-lines': ['error', 400] },
  },
  {
    // Outside the configuration that a project service finds beside them.
    files: ['packages/engine/src/**/*.spec.ts'],
    languageOptions: { parserOptions: { projectService: false, project: 'packages/engine/tsconfig.spec.json' } },
  },
  {
    files: ['packages/engine/generators/**/*.ts'],
    languageOptions: { parserOptions: { projectService: false, project: 'tsconfig.json' } },
  },
  {
    files: ENGINE,
    ignores: ['**/*.spec.ts'],
    rules: {
      'no-restricted-globals': ['error', { name: 'Date', message: 'The engine has no clock: times are passed in.' }],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'The engine is deterministic: chance is passed in.' },
      ],
      'no-restricted-imports': [
        'error',
        { patterns: [{ regex: '^[^.]', message: 'The engine depends on nothing but its own files.' }] },
      ],
    },
  },
  {
    // Tied to a picked name, the bundler takes the door and with it every file behind it into the first download.
    files: ['packages/{engine,wording}/src/index.ts'],
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: "ExportNamedDeclaration[source][exportKind!='type'], ExportAllDeclaration[exported]",
          message: 'A door passes on whole files: export * from.',
        },
      ],
    },
  },
  {
    files: SPECS,
    rules: {
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  {
    files: ['apps/web/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
  },
  {
    files: ['apps/web/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
  },
);
