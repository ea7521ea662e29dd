import { existsSync, lstatSync, mkdirSync, symlinkSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

import { CLIENT, findPostgres } from './postgres-binaries.mjs'
import { Refusal, say } from './say.mjs'

/** The proxy's program. */
export const NGINX = '/usr/sbin/nginx'

/** What Woadmap and its tests need from Debian, and how to tell that it is there. */
export const DEBIAN = {
  postgresql: { name: 'postgresql', isPresent: () => findPostgres().length > 0 },
  postgresqlClient: {
    name: 'postgresql-client',
    isPresent: () => findPostgres(undefined, undefined, CLIENT).length > 0,
  },
  nginx: { name: 'nginx', isPresent: () => existsSync(NGINX) },
  chromium: { name: 'chromium', isPresent: () => existsSync('/usr/bin/chromium') },
  // Photographs to measure the match on; too large to be kept in the repository.
  backgrounds: {
    name: 'mate-backgrounds',
    isPresent: () => existsSync('/usr/share/backgrounds/mate'),
  },
  // Lies to one process about the time.
  faketime: { name: 'libfaketime', isPresent: () => findFaketime() !== undefined },
}

/** Where Debian's libfaketime is, to be preloaded; undefined when it is not installed. */
export function findFaketime() {
  const machine = { x64: 'x86_64', arm64: 'aarch64' }[process.arch] ?? process.arch
  const path = `/usr/lib/${machine}-linux-gnu/faketime/libfaketimeMT.so.1`
  return existsSync(path) ? path : undefined
}

const NO_MAIN_CLUSTER = '/etc/postgresql-common/createcluster.d/no-main.conf'
const SETTING = 'create_main_cluster = false'
const NGINX_SERVICE = '/etc/systemd/system/nginx.service'

/**
 * Installs the Debian packages that are missing: as root by itself, otherwise by telling the exact
 * command.
 * @param {{name: string, isPresent: () => boolean}[]} wanted
 * @throws {Refusal} when the person has to do it, or when apt fails
 */
export async function ensureDebianPackages(fleet, wanted, env) {
  const missing = wanted.filter((each) => !each.isPresent()).map((each) => each.name)
  if (missing.length === 0) return
  if (process.getuid() !== 0) throw new Refusal(sudoSentence(missing))
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Refusal(
      `Not found on this system: ${missing.join(', ')}. Install them, then start again.`,
    )
  }
  say(`Installing from Debian: ${missing.join(', ')}`)
  if (missing.includes('postgresql')) preventMainCluster()
  if (missing.includes('nginx')) preventNginxService()
  const aptEnv = { ...env, DEBIAN_FRONTEND: 'noninteractive' }
  // A list that could not be refreshed may still be good enough; the installation decides.
  await fleet.run({ command: 'apt-get', args: ['update', '-qq'], env: aptEnv })
  const code = await fleet.run({
    command: 'apt-get',
    args: ['install', '-y', '-qq', '--no-install-recommends', ...missing],
    env: aptEnv,
  })
  const absent = wanted.filter((each) => !each.isPresent()).map((each) => each.name)
  if (code !== 0 || absent.length > 0) {
    throw new Refusal(`apt-get could not install ${missing.join(', ')}; what it said is above.`)
  }
}

/** The sentence that tells an ordinary user what to run. */
export function sudoSentence(missing) {
  const steps = [
    ...(missing.includes('postgresql')
      ? [`mkdir -p ${dirname(NO_MAIN_CLUSTER)}`, `echo "${SETTING}" > ${NO_MAIN_CLUSTER}`]
      : []),
    ...(missing.includes('nginx') ? [`ln -s /dev/null ${NGINX_SERVICE}`] : []),
    'apt-get update',
    `apt-get install -y --no-install-recommends ${missing.join(' ')}`,
  ]
  return (
    `Debian's ${missing.join(', ')} must be installed, which needs an administrator. Run\n\n` +
    `    sudo sh -c '${steps.join(' && ')}'\n\nand start again.`
  )
}

// Debian would otherwise make and start a second cluster of its own on port 5432.
function preventMainCluster() {
  if (existsSync(NO_MAIN_CLUSTER)) return
  mkdirSync(dirname(NO_MAIN_CLUSTER), { recursive: true })
  writeFileSync(NO_MAIN_CLUSTER, `${SETTING}\n`)
}

// Debian would otherwise start a web server of its own on port 80, for everybody.
function preventNginxService() {
  const folder = dirname(NGINX_SERVICE)
  if (!existsSync(folder) || lstatSync(NGINX_SERVICE, { throwIfNoEntry: false })) return
  symlinkSync('/dev/null', NGINX_SERVICE)
}
