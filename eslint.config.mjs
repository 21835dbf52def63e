import { defineConfig } from 'eslint/config'
import expo from 'eslint-config-expo/flat.js'
import prettier from 'eslint-config-prettier'

import { noCycle } from './scripts/lint-no-cycle.mjs'

// Who may import whom (DEVELOPERS.md). Layer rules are errors from the first commit.
const mayImport = {
  shared: [],
  constants: [],
  db: ['shared'],
  payments: ['shared'],
  server: ['db', 'payments', 'shared'],
  hooks: ['shared', 'constants'],
  components: ['hooks', 'shared', 'constants', 'assets'],
  app: ['components', 'hooks', 'shared', 'constants', 'assets'],
  // The demo is played by real commands, photos go through the real upload: product over convenience.
  seed: ['db', 'payments', 'server', 'shared', 'assets'],
}
const folders = [...Object.keys(mayImport), 'assets', 'tests']
const layers = Object.entries(mayImport).map(([layer, ok]) => ({
  target: `./${layer}`,
  from: folders.filter((f) => f !== layer && !ok.includes(f)).map((f) => `./${f}`),
  message: `${layer}/ may import ${ok.join(', ') || 'nothing of ours'}`,
}))
const inner = [
  {
    target: './server/**/!(*-store|*.test|main|auth).ts',
    from: './db',
    except: ['./transaction.ts'],
    message: 'only *-store.ts files query the database',
  },
  {
    target: './server/**/*-routes.ts',
    from: './payments',
    message: 'routes call a use case; the use case pays',
  },
  {
    target: './components/ui',
    from: ['./hooks', './shared/contracts', './shared/api'],
    message: 'ui primitives do not know the trade',
  },
  {
    target: './shared/domain',
    from: ['./shared/contracts', './shared/api'],
    message: 'the domain does not know the wire',
  },
  {
    target: './payments/!(*.test|*-for-tests).ts',
    from: './payments/fake',
    message: 'the product does not know the practice processor',
  },
  {
    target: './payments/fake',
    from: ['./payments', './shared', './server', './db'],
    except: ['./fake'],
    message: 'the fake processor shares no module with the product',
  },
  {
    target: ['./server/!(forecast)/**', './server/*.ts', './server/forecast/!(*.test).ts'],
    from: './server/forecast/fake',
    message: 'the product does not know the practice forecast',
  },
  {
    target: './server/forecast/fake',
    from: ['./server', './shared', './db', './payments'],
    except: ['./forecast/fake'],
    message: 'the practice forecast shares no module with the product',
  },
]
const noBarrels = {
  selector: 'ExportAllDeclaration',
  message: 'no barrels: import from the file that defines the thing',
}
const envOnlyIn = {
  object: 'process',
  property: 'env',
  message: 'server/env.ts is the only reader of the environment',
}

export default defineConfig([
  { ignores: ['node_modules', 'dist', '.data', '.expo', 'expo-env.d.ts', 'db/migrations', 'public'] },
  ...expo,
  {
    plugins: { ours: { rules: { 'no-cycle': noCycle } } },
    rules: {
      'import/no-restricted-paths': ['error', { zones: [...layers, ...inner] }],
      'ours/no-cycle': 'error',
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
      'max-params': ['error', 3],
      'no-console': 'error',
      'no-restricted-syntax': ['error', noBarrels],
      'no-restricted-properties': ['error', envOnlyIn],
    },
  },
  {
    files: [
      'server/env.ts',
      'hooks/api.ts',
      '*.config.ts',
      '**/*.mjs',
      'tests/**',
      'payments/fake/**',
      'seed/run.ts',
    ],
    rules: { 'no-restricted-properties': 'off' },
  },
  {
    files: ['**/*.ts', '**/*.tsx'],
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    },
  },
  // Express tells an error handler by its four parameters.
  { files: ['server/http/problem-handler.ts'], rules: { 'max-params': ['error', 4] } },
  { files: ['seed/**', 'scripts/**', 'tests/**', 'payments/fake/**'], rules: { 'no-console': 'off' } },
  { files: ['**/*.facts.ts', 'tests/**'], rules: { 'max-lines': ['error', { max: 500 }] } },
  // zod and the contracts load with the forms group only: screens take their types (stack: first load).
  {
    files: ['app/**', 'hooks/**', 'components/**'],
    ignores: ['components/forms/**'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['zod', 'zod/*', '@hookform/*', 'react-hook-form'],
              message: 'forms group only',
              allowTypeImports: true,
            },
            {
              group: ['@/shared/contracts/*'],
              message: 'types only outside the forms group',
              allowTypeImports: true,
            },
          ],
        },
      ],
    },
  },
  // The domain block stands last: flat config replaces, it does not merge.
  {
    files: ['shared/domain/**', 'shared/units/**'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-globals': ['error', 'Date', 'fetch', 'process', 'localStorage'],
      'no-restricted-properties': [
        'error',
        envOnlyIn,
        { object: 'Math', property: 'random', message: 'chance is an argument' },
      ],
      '@typescript-eslint/no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['react*', 'expo*', 'node:*', 'zod', 'drizzle-orm*'],
              message: 'the domain is plain functions over numbers',
            },
          ],
        },
      ],
    },
  },
  prettier,
])
