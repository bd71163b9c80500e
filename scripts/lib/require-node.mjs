// Imported first of all, before anything that an older Node could not read; itself it imports nothing.
const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
if (major < 20 || (major === 20 && minor < 19)) {
  console.error('Halfspeed needs Node 20.19 or newer, and this is Node ' + process.versions.node + ': install a newer Node, then start again.')
  process.exit(1)
}
