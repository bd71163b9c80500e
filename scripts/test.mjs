#!/usr/bin/env node
// npm test. Nothing here or below needs a package: it installs them.
import './lib/require-node.mjs'

const { testHere } = await import('./lib/test-here.mjs')
process.exit(await testHere())
