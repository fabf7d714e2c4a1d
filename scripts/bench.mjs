// npm run bench: one JSON document on standard output with what every module of scripts/bench measured.
import './lib/node-version.mjs'

const { fork } = await import('node:child_process')
const { installPackages } = await import('./lib/packages.mjs')
const { buildWhatIsOld } = await import('./lib/build.mjs')
const { namesIn } = await import('./lib/find-program.mjs')
const { inRoot, root } = await import('./lib/root.mjs')
const { goOn, onStop } = await import('./lib/run-command.mjs')
const { runScript } = await import('./lib/script.mjs')
const { startThrowawayCluster } = await import('./lib/throwaway-cluster.mjs')

/** Standard output belongs to the answer. */
const say = (text) => process.stderr.write(`${text}\n`)

/** One after the other, each in a process of its own, so that none disturbs another's time or memory. */
function runBench(name, env) {
  return new Promise((resolve) => {
    const child = fork(inRoot('scripts/lib/run-bench.ts'), [inRoot('scripts/bench', `${name}.ts`)], {
      cwd: root,
      env,
      execArgv: ['--import', 'tsx'],
      stdio: ['ignore', 2, 2, 'ipc'],
    })
    const takeBack = onStop(() => child.kill('SIGTERM'))
    let found = { error: 'It ended without an answer: see standard error.' }
    child.on('message', (message) => (found = message))
    child.on('exit', (status) => {
      takeBack()
      resolve(status === 0 ? found : { error: `It failed (exit ${status}): see standard error.` })
    })
  })
}

await runScript(async () => {
  const wanted = process.argv.slice(2)
  await installPackages({ say })
  await buildWhatIsOld({ say })
  const cluster = await startThrowawayCluster({ say })
  const results = {}
  try {
    // An empty database that is gone afterwards, for the benches that need one.
    const env = { ...process.env, NODE_ENV: 'production', BENCH_DATABASE_URL: cluster.url() }
    const names = namesIn(inRoot('scripts/bench')).map((name) => name.replace(/\.ts$/, ''))
    for (const name of names.sort()) {
      goOn()
      if (wanted.length > 0 && !wanted.includes(name)) continue
      say(`Measuring ${name} …`)
      const found = await runBench(name, env)
      if (found !== null) results[name] = found
    }
  } finally {
    await cluster.stop()
  }
  process.stdout.write(
    `${JSON.stringify({ node: process.version, at: new Date().toISOString(), ...results }, null, 2)}\n`,
  )
  return Object.values(results).some(({ error }) => error) ? 1 : 0
})
