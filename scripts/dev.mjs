// npm run dev: Vite with reload for the client, the server restarted at every change, on the same database as npm start.
import './lib/node-version.mjs'

const { runScript, say } = await import('./lib/script.mjs')
const { readSettings } = await import('./lib/settings.mjs')
const { checkPort } = await import('./lib/port.mjs')
const { installPackages } = await import('./lib/packages.mjs')
const { withDatabase } = await import('./lib/serve.mjs')
const { runInForeground } = await import('./lib/child.mjs')
const { stopAll } = await import('./lib/run-command.mjs')
const { inRoot } = await import('./lib/root.mjs')

await runScript(async () => {
  const settings = readSettings(process.env)
  const { host, port } = settings
  // The client's address is the usual one; the server stands on the next port and Vite passes requests on to it.
  const behind = { host: '127.0.0.1', port: port + 1 }
  await checkPort(settings)
  await checkPort(behind)
  await installPackages({ say })
  return withDatabase({ settings, say }, async (env) => {
    const common = { ...env, NODE_ENV: 'development', TAUTBOOK_API: `http://${behind.host}:${behind.port}` }
    const address = process.env.PUBLIC_URL || `http://${host}:${port}`
    const server = { ...common, HOST: behind.host, PORT: String(behind.port), PUBLIC_URL: address }
    const vite = [
      inRoot('node_modules/vite/bin/vite.js'),
      '--host',
      host,
      '--port',
      String(port),
      '--strictPort',
    ]
    const watch = [inRoot('node_modules/tsx/dist/cli.mjs'), 'watch', '--clear-screen=false', 'server/main.ts']
    const results = await Promise.all(
      [runInForeground(process.execPath, vite, common), runInForeground(process.execPath, watch, server)].map(
        // One is of no use without the other.
        (running) => running.finally(stopAll),
      ),
    )
    return results.every(({ told }) => told) ? 0 : 1
  })
})
