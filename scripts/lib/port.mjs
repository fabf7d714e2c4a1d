import { createServer } from 'node:net'
import { pause } from './run-command.mjs'
import { Trouble } from './trouble.mjs'

const attempt = ({ host, port }) =>
  new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', (error) => resolve(error.code))
    probe.listen(port, host, () => probe.close(() => resolve(undefined)))
  })

/**
 * Sees to it before the long work that the server will be able to listen; a server of ours whose start was killed
 * needs a moment to notice and go. Anything else than a port in use is left for the server to tell. @throws Trouble
 */
export async function checkPort({ host, port }) {
  if (port === 0) return
  for (let tries = 10; (await attempt({ host, port })) === 'EADDRINUSE'; tries -= 1) {
    if (tries === 0)
      throw new Trouble(
        `Another program already listens on ${host}:${port}: stop it, or choose another port, for example PORT=${port < 65_535 ? port + 1 : 4600}.`,
      )
    await pause(200)
  }
}
