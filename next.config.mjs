import path from 'node:path'
import { fileURLToPath } from 'node:url'

const root = path.dirname(fileURLToPath(import.meta.url))

/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  turbopack: { root },
  // Types are a step of npm test; a fault in a test file must not keep a shop from starting.
  typescript: { ignoreBuildErrors: true },
  experimental: {
    // forbidden() and its page: a role that may not open a page is told so, with 403.
    authInterrupts: true,
    // A larger body is refused by proxy.ts with a sentence; this is the second wall behind it.
    serverActions: { bodySizeLimit: '1mb' },
  },
  serverExternalPackages: [
    '@mikro-orm/core', '@mikro-orm/knex', '@mikro-orm/migrations', '@mikro-orm/postgresql',
    '@node-rs/argon2', 'knex', 'pg', 'rate-limiter-flexible',
  ],
}
export default config
