import react from '@vitejs/plugin-react'
import path from 'node:path'
import { defineConfig } from 'vitest/config'

const here = import.meta.dirname

export default defineConfig({
  resolve: { alias: { '@': here, 'server-only': path.join(here, 'tests/stubs/server-only.ts') } },
  test: {
    maxWorkers: 2,
    projects: [
      { extends: true, test: { name: 'calc', environment: 'node', include: ['tests/calc/**/*.test.ts', 'tests/units/**/*.test.ts', 'tests/schemas/**/*.test.ts', 'tests/scripts/**/*.test.ts'], testTimeout: 30_000 } },
      { extends: true, test: { name: 'published', environment: 'node', include: ['tests/published/**/*.test.ts'], testTimeout: 30_000 } },
      {
        extends: true,
        test: {
          name: 'data', environment: 'node', include: ['tests/data/**/*.test.ts'],
          globalSetup: ['tests/data/support/global-setup.ts'], testTimeout: 30_000, hookTimeout: 60_000,
        },
      },
      {
        extends: true, plugins: [react()],
        test: { name: 'components', environment: 'jsdom', include: ['tests/components/**/*.test.tsx'], setupFiles: ['tests/components/support/setup.ts'], testTimeout: 20_000 },
      },
    ],
  },
})
