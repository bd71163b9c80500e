#!/usr/bin/env node
// npm start and, with --dev, npm run dev. Nothing here or below needs a package: it installs them.
import './lib/require-node.mjs'

const { sentenceOf } = await import('./lib/failure.mjs')
try {
  const { readStartOptions } = await import('./lib/start-options.mjs')
  const { startHere } = await import('./lib/start-here.mjs')
  process.exit(await startHere(readStartOptions(process.argv.slice(2), process.env)))
} catch (error) {
  console.error(sentenceOf(error))
  process.exit(1)
}
