import { defineConfig, globalIgnores } from 'eslint/config'
import nextVitals from 'eslint-config-next/core-web-vitals'
import nextTs from 'eslint-config-next/typescript'

/** The library is met at its public face alone. */
const face = { group: ['@/lib/calc/*', '**/calc/*', '!@/lib/calc/live', '!@/lib/calc/index', '!**/calc/live', '!**/calc/index'], message: 'Import the calculation library from lib/calc/live (or index, with the formula parser).' }

/** Imports point one way: calc, units <- schemas, words <- data, workbench <- app; components never see data or entities. */
const wall = (files, patterns, message) => ({
  files,
  rules: { 'no-restricted-imports': ['error', { patterns: [{ group: patterns, message }, ...(files[0].startsWith('lib/calc') ? [] : [face])] }] },
})
const orm = ['@mikro-orm/*', 'pg', '@/entities', '@/entities/*', '@/migrations/*', '@/mikro-orm.config']

export default defineConfig([
  ...nextVitals,
  ...nextTs,
  globalIgnores(['.next/**', '.data/**', 'next-env.d.ts', 'docs/**']),
  {
    rules: {
      'import/no-cycle': ['error', { maxDepth: 12 }],
      'no-restricted-syntax': ['error', { selector: "CallExpression[callee.property.name='toBeCloseTo']", message: 'Use expectClose(actual, expected, { rel, abs }).' }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    },
  },
  wall(['lib/calc/**'], ['@/*', 'react*', 'next*', 'zod', 'swr', ...orm, '**/units/*', '**/schemas/*', '**/data/*'], 'lib/calc imports only itself and mathjs.'),
  wall(['lib/units/**'], ['@/*', 'react*', 'next*', 'zod', ...orm], 'lib/units imports only itself and mathjs.'),
  wall(['lib/schemas/**', 'lib/words/**', 'lib/workbench/**', 'lib/compare/**', 'lib/engine/**', 'lib/method/**'], ['@/lib/data/*', '@/lib/auth/*', '@/app/*', '@/components/*', 'react*', 'next*', ...orm], 'These stand on calc, units and each other only.'),
  wall(['lib/data/**', 'lib/auth/**'], ['@/app/*', '@/components/*'], 'data and auth never import pages or components.'),
  wall(['app/**'], [...orm, '@/lib/auth/lucia', '@/lib/data/support/*'], 'Pages, actions and routes go through lib/data and lib/auth/session.'),
  wall(['components/**'], ['@/lib/data/*', '@/lib/auth/session', '@/lib/auth/lucia', '@/lib/auth/passwords', '@/app/*', ...orm], 'Components get plain values; they never import data, entities or pages.'),
])
