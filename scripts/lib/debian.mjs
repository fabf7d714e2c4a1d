import { run, goOn } from './run-command.mjs'
import { Trouble, troubleOf } from './trouble.mjs'

// Without this the package would start a cluster of its own beside ours.
const NO_CLUSTER = '/etc/postgresql-common/createcluster.d/tautbook.conf'
const script = (name) => `set -e
export DEBIAN_FRONTEND=noninteractive
command -v apt-get >/dev/null
mkdir -p ${NO_CLUSTER.replace(/\/[^/]*$/, '')}
trap 'rm -f ${NO_CLUSTER}' EXIT
echo 'create_main_cluster = false' > ${NO_CLUSTER}
apt-get install -y --no-install-recommends ${name} || { apt-get update && apt-get install -y --no-install-recommends ${name}; }`

/** The words before a command that needs to be root: none as root, sudo where it asks no password, else undefined. */
async function rootPrefix() {
  if (process.getuid?.() === 0) return []
  const { status } = await run('sudo', ['-n', 'true'])
  return status === 0 ? ['sudo', '-n'] : undefined
}

/** Installs one of Debian's packages. @throws Trouble that names the package and how to install it by hand. */
export async function installDebianPackage({ name, what, say }) {
  const byHand = `install Debian’s package ${name} (sudo apt-get install ${name}), then start again.`
  const prefix = await rootPrefix()
  if (!prefix) throw new Trouble(`${what} is not installed, and this user may not install it: ${byHand}`)
  if ((await run('sh', ['-c', 'command -v apt-get'])).status !== 0) {
    throw new Trouble(
      `${what} is not installed, and there is no apt-get here to install it with: install ${what}, then start again.`,
    )
  }
  say(`Installing ${what} (Debian’s package ${name}) …`)
  const [program, ...args] = [...prefix, 'sh', '-c', script(name)]
  const { status, output } = await run(program, args)
  goOn()
  if (status === 0) return
  throw troubleOf({ sentence: `${what} could not be installed: ${byHand}`, folder: '/var/cache/apt', output })
}
