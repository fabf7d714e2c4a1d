// No import here: an old Node must get as far as the sentence.
const [major, minor] = process.versions.node.split('.').map(Number)

if (major < 20 || (major === 20 && minor < 19)) {
  process.stderr.write(
    `Tautbook needs Node 20.19 or newer; this is ${process.versions.node}: install Node 20, then start again.\n`,
  )
  process.exit(1)
}
