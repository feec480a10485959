import js from '@eslint/js';
import nextPlugin from '@next/eslint-plugin-next';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/**
 * The direction of dependencies, checked on every import: a file under `target` may not import from `from`.
 * checker <- templates, statistics, domain <- queue <- policies, presenters, queries, services <- jobs, mail, app.
 */
const edge = ['./app', './components', './lib/jobs', './lib/mail'];
const middle = ['./lib/policies', './lib/presenters', './lib/queries', './lib/services'];
const ground = ['./lib/queue', './lib/auth', './lib/db', './lib/uploads', './lib/env.ts', './lib/log.ts', './models'];

const zones = [
  {
    target: './lib/checker',
    from: [...edge, ...middle, ...ground, './lib/templates', './lib/statistics', './lib/domain'],
    message: 'The checker is pure and knows nothing of the service around it.',
  },
  {
    target: ['./lib/templates', './lib/statistics', './lib/domain'],
    from: [...edge, ...middle, ...ground],
    message:
      'Templates, statistics and domain are pure: they may import the checker and each other, nothing of the service.',
  },
  {
    target: ['./lib/queue', './lib/db', './lib/uploads', './models'],
    from: [...edge, ...middle],
    message: 'The queue, the database and the models stand below services.',
  },
  {
    target: middle,
    from: ['./app', './components', './lib/jobs'],
    message: 'Policies, presenters, queries and services are called by jobs and the app, never the other way.',
  },
  {
    target: ['./lib/jobs', './lib/mail'],
    from: ['./app', './components'],
    message: 'Jobs and mail run in the worker: they import nothing of the pages.',
  },
  {
    target: ['./app', './components'],
    from: ['./models'],
    message: 'Pages, actions and routes call services and queries; they touch no model.',
  },
  {
    target: ['./app/(student)', './app/(tools)/reading'],
    from: './lib/checker',
    except: ['./reader.ts', './contract.ts'],
    message:
      "Students' pages may import the checker's reader only: comparison and references must not reach a student's browser.",
  },
  {
    target: './components/math',
    from: './lib/checker',
    except: ['./reader.ts', './diagnostics.ts', './contract.ts'],
    message: "Shared mathematics components reach students' browsers: import lib/checker/reader only.",
  },
];

export default tseslint.config(
  { ignores: ['node_modules/**', '.next/**', '.halfmark/**', 'uploads/**', 'next-env.d.ts'] },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [...tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      'no-console': 'error',
      'max-lines': ['error', { max: 400 }],
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    plugins: { 'import-x': importX },
    settings: { 'import-x/resolver-next': [createTypeScriptImportResolver({ project: './tsconfig.json' })] },
    rules: {
      'import-x/no-restricted-paths': ['error', { zones }],
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
    },
  },
  {
    files: ['lib/checker/**/*.ts', 'lib/templates/**/*.ts', 'lib/statistics/**/*.ts', 'lib/domain/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['next', 'next/*', 'react', 'react-dom', 'sequelize', 'pg', 'node:*', '@/models/*'],
              message: 'This folder is pure.',
            },
          ],
        },
      ],
      'no-restricted-globals': ['error', 'process', 'fetch', 'window', 'document', 'Buffer', 'setTimeout'],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'Pure code takes its seed from outside.' },
        { object: 'Date', property: 'now', message: 'Pure code has no clock.' },
      ],
    },
  },
  {
    files: ['**/*.tsx'],
    plugins: { 'react-hooks': reactHooks, '@next/next': nextPlugin },
    rules: { ...reactHooks.configs.recommended.rules, ...nextPlugin.configs.recommended.rules },
  },
  {
    files: ['scripts/**', 'tests/benchmarks/**'],
    rules: { 'no-console': 'off' },
  },
  {
    files: ['**/*.mjs'],
    languageOptions: {
      globals: Object.fromEntries(
        [
          'process',
          'console',
          'setTimeout',
          'clearTimeout',
          'setInterval',
          'clearInterval',
          'URL',
          'Buffer',
          'fetch',
          'AbortSignal',
          'performance',
        ].map((name) => [name, 'readonly']),
      ),
    },
  },
);
