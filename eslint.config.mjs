import nextVitals from 'eslint-config-next/core-web-vitals'
import nextTypescript from 'eslint-config-next/typescript'
import prettier from 'eslint-config-prettier'
import boundaries from 'eslint-plugin-boundaries'
import { defineConfig, globalIgnores } from 'eslint/config'

import { governed, importTable, zones } from './eslint.boundaries.mjs'
import { sqlPlugin } from './eslint.sql.mjs'

const ENVIRONMENT = 'Only lib/env.ts reads the environment: use env() of @/lib/env.'
const IMPURE =
  'lib/color and lib/naming are pure: the same input gives the same output, on any machine, at any time.'

const SHIPPED = [...governed, 'worker.ts', 'seeders/**/*.ts', 'migrations/**/*.ts']
const HTML = 'What people see is written as elements: React escapes it, a string of HTML does not.'

export default defineConfig([
  globalIgnores([
    '.next/**',
    '.local/**',
    'uploads/**',
    'coverage/**',
    'playwright-report/**',
    'test-results/**',
    'next-env.d.ts',
  ]),
  ...nextVitals,
  ...nextTypescript,
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/consistent-type-imports': ['error', { disallowTypeAnnotations: false }],
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
    },
  },
  {
    files: governed,
    plugins: { boundaries },
    settings: {
      'boundaries/root-path': import.meta.dirname,
      'boundaries/files': zones,
      'import/resolver': { typescript: { project: `${import.meta.dirname}/tsconfig.json` } },
    },
    rules: { 'boundaries/dependencies': ['error', importTable] },
  },
  {
    files: SHIPPED,
    plugins: { sql: sqlPlugin },
    rules: {
      'sql/fixed': 'error',
      'no-eval': 'error',
      'no-implied-eval': 'error',
      'no-new-func': 'error',
      'no-script-url': 'error',
      'no-restricted-syntax': [
        'error',
        {
          selector:
            ':matches(Identifier, JSXIdentifier)[name=/^(dangerouslySetInnerHTML|innerHTML|outerHTML|insertAdjacentHTML|srcDoc)$/]',
          message: HTML,
        },
        {
          selector: 'Literal[value=/^(dangerouslySetInnerHTML|innerHTML|outerHTML|srcDoc)$/]',
          message: HTML,
        },
      ],
    },
  },
  {
    files: SHIPPED,
    ignores: ['lib/env.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: ENVIRONMENT },
      ],
      'no-restricted-imports': [
        'error',
        {
          paths: ['process', 'node:process'].map((name) => ({
            name,
            importNames: ['env', 'default'],
            message: ENVIRONMENT,
          })),
        },
      ],
    },
  },
  {
    files: ['lib/color/**', 'lib/naming/**'],
    rules: {
      'no-restricted-globals': [
        'error',
        ...['Date', 'performance', 'process', 'crypto', 'fetch', 'window', 'document'].map(
          (name) => ({ name, message: IMPURE }),
        ),
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: IMPURE },
      ],
    },
  },
  {
    files: ['*.config.mjs'],
    rules: { 'import/no-anonymous-default-export': 'off' },
  },
  prettier,
])
