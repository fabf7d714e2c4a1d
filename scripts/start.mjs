// npm start: everything from a fresh clone to a running server. Plain JavaScript without packages, since it installs them.
import './lib/node-version.mjs'

const { runScript, say } = await import('./lib/script.mjs')
const { readSettings } = await import('./lib/settings.mjs')
const { checkPort } = await import('./lib/port.mjs')
const { installPackages } = await import('./lib/packages.mjs')
const { buildWhatIsOld } = await import('./lib/build.mjs')
const { withDatabase } = await import('./lib/serve.mjs')
const { runInForeground } = await import('./lib/child.mjs')
const { inRoot } = await import('./lib/root.mjs')

await runScript(async () => {
  const settings = readSettings(process.env)
  await checkPort(settings)
  await installPackages({ say })
  await buildWhatIsOld({ say })
  return withDatabase({ settings, say }, async (env) => {
    const { status, signal, told } = await runInForeground(
      process.execPath,
      ['--enable-source-maps', inRoot('dist', 'server', 'main.js')],
      {
        ...env,
        NODE_ENV: 'production',
      },
    )
    if (told) say('Stopped.')
    else if (status === null)
      process.stderr.write(`The server was ended from outside (${signal}): start it again with npm start.\n`)
    return told ? 0 : (status ?? 1)
  })
})
