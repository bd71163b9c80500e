import { defineConfig } from '@playwright/test'

const port = Number(process.env.E2E_PORT ?? 3100)

/** Browser tests against a built server. scripts/test.mjs sets DATABASE_URL to a seeded database of its own. */
export default defineConfig({
  testDir: './tests/e2e',
  outputDir: '.data/playwright',
  fullyParallel: false,
  workers: 1,
  timeout: 60_000,
  forbidOnly: Boolean(process.env.CI),
  reporter: [['line'], ['json', { outputFile: '.data/e2e.json' }]],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    browserName: 'chromium',
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
      args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
    },
  },
  webServer: {
    command: `node_modules/.bin/next start -H 127.0.0.1 -p ${port}`,
    url: `http://127.0.0.1:${port}/sign-in`,
    reuseExistingServer: false,
    timeout: 60_000,
    env: { DATABASE_URL: process.env.DATABASE_URL ?? '', NEXT_TELEMETRY_DISABLED: '1' },
  },
})
