// npm test: all set-up, every stage, one closing line. `npm test -- lint unit` runs only the stages named.
import './lib/node-version.mjs'

const { runScript, say } = await import('./lib/script.mjs')
const { installPackages } = await import('./lib/packages.mjs')
const { groups, stageNames } = await import('./lib/stages.mjs')
const { goOn } = await import('./lib/run-command.mjs')
const { report, Stopped, Trouble } = await import('./lib/trouble.mjs')

const AT_ONCE = 2

function chosenStages(names) {
  const unknown = names.find((name) => !stageNames.includes(name))
  if (unknown) throw new Trouble(`There is no stage ${unknown}: choose from ${stageNames.join(', ')}.`)
  return names.length === 0 ? stageNames : names
}

/** Runs one stage and says what it came to; what it wrote is shown only when something failed. */
async function runStage(name, stage) {
  const began = Date.now()
  const result = await stage({ say }).catch((error) => {
    if (error instanceof Stopped) throw error
    const { message, output = '', stack } = error
    return { passed: 0, failed: 1, faults: [message], output: error instanceof Trouble ? output : stack }
  })
  goOn()
  const { passed, failed, faults, output } = result
  if (failed > 0) say(`\n──── ${name}\n${output.trimEnd()}\n`)
  for (const fault of faults) say(`${name}: ${fault}`)
  say(`${name}: ${passed} passed, ${failed} failed (${((Date.now() - began) / 1000).toFixed(1)} s)`)
  return result
}

async function runGroup(group, names) {
  const waiting = Object.entries(group).filter(([name]) => names.includes(name))
  const results = []
  const work = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) results.push(await runStage(...next))
  }
  await Promise.all(Array.from({ length: AT_ONCE }, work))
  return results
}

/** Without packages nothing can be tested, which is one failure. */
async function runAll(names) {
  const results = []
  try {
    await installPackages({ say })
  } catch (error) {
    if (error instanceof Stopped) throw error
    report(error)
    return [{ passed: 0, failed: 1 }]
  }
  for (const group of groups) results.push(...(await runGroup(group, names)))
  return results
}

await runScript(async () => {
  const names = chosenStages(process.argv.slice(2))
  const results = await runAll(names)
  const sum = (key) => results.reduce((total, result) => total + result[key], 0)
  say(`\n${sum('passed')} passed, ${sum('failed')} failed`)
  return sum('failed') === 0 && results.length > 0 ? 0 : 1
})
