// What the two commands share. Plain Node: it runs before anything is installed.
import { spawn, spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { copyFileSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { homedir } from 'node:os'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = dirname(dirname(fileURLToPath(import.meta.url)))
const bin = (name) => join(root, 'node_modules', '.bin', name)
const quiet = { NEXT_TELEMETRY_DISABLED: '1', npm_config_update_notifier: 'false' }

export const say = (line) => console.log(line)

/** Runs a command to its end with its output shown; answers whether it went well. */
export function run(command, args, { env = {}, cwd = root } = {}) {
  const { status } = spawnSync(command, args, { cwd, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, ...quiet, ...env } })
  return status === 0
}

/** Runs an installed tool. */
export const tool = (name, args, options) => run(bin(name), args, options)

/** Starts a long-running Node program. */
export function start(args, env) {
  return spawn(process.execPath, args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, ...quiet, ...env } })
}

export function stop(message) {
  console.error(message)
  process.exit(1)
}

function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number)
  if (major !== 20 || minor < 19) stop(`Node 20.19 or a later 20 is needed; this is ${process.versions.node}.`)
}

const lockHash = () => createHash('sha256').update(readFileSync(join(root, 'package-lock.json'))).digest('hex')

const addonWorks = () =>
  spawnSync(process.execPath, ['-e', "new (require('better-sqlite3'))(':memory:').prepare('select 1').get()"], { cwd: root, stdio: 'ignore' }).status === 0

/** Where Node's own headers stand beside it, they are built against: nothing is fetched for it. */
function ownHeaders() {
  const place = dirname(dirname(process.execPath))
  return existsSync(join(place, 'include/node/node.h')) ? { npm_config_nodedir: place } : {}
}

/** The compiled SQLite addon takes a minute to build: it is kept between installs of one version on one machine. */
function bringAddon() {
  const lock = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8'))
  const { version } = lock.packages['node_modules/better-sqlite3']
  const key = `better-sqlite3-${version}-abi${process.versions.modules}-${process.platform}-${process.arch}`
  const kept = join(process.env.XDG_CACHE_HOME ?? join(homedir(), '.cache'), 'tenth-summer-native', key, 'better_sqlite3.node')
  const place = join(root, 'node_modules/better-sqlite3/build/Release/better_sqlite3.node')
  if (existsSync(kept)) {
    mkdirSync(dirname(place), { recursive: true })
    copyFileSync(kept, place)
    if (addonWorks()) return
  }
  say('Compiling the SQLite addon (about a minute, once on this machine).')
  if (!run('npm', ['rebuild', 'better-sqlite3'], { env: ownHeaders() }) || !addonWorks()) {
    stop('The SQLite addon did not compile: python3, make and g++ are needed (on Debian: apt-get install python3 make g++).')
  }
  mkdirSync(dirname(kept), { recursive: true })
  copyFileSync(place, kept)
}

/** Installs exactly what the lock file names, unless that stands already. */
export function install() {
  checkNode()
  const stamp = join(root, 'node_modules', '.tenth-summer-installed')
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lockHash() && addonWorks()) return
  say('Installing packages.')
  if (!run('npm', ['ci', '--ignore-scripts', '--no-audit', '--no-fund'])) stop('npm could not install the packages: see above.')
  bringAddon()
  writeFileSync(stamp, lockHash())
}

/** Waits until the server answers its health check; false when it ended or took too long. */
export async function untilHealthy(port, child, seconds = 60) {
  for (let tries = 0; tries < seconds * 5; tries++) {
    if (child.exitCode !== null) return false
    const answer = await fetch(`http://127.0.0.1:${port}/api/health`).catch(() => null)
    if (answer?.ok) return true
    await new Promise((done) => setTimeout(done, 200))
  }
  return false
}
