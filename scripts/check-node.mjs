// Imported before anything else: an older Node would fail further down with words that help nobody.
const OLDEST_NODE = [20, 19]
const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
if (major < OLDEST_NODE[0] || (major === OLDEST_NODE[0] && minor < OLDEST_NODE[1])) {
  console.error(`This is Node ${process.versions.node}, but ${OLDEST_NODE.join('.')} or newer is needed.`)
  process.exit(1)
}
