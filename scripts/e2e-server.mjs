// The server the browser tests talk to: a fresh database with the demonstration in it, the built product, its own port.
import { mkdirSync, rmSync } from 'node:fs'
import { root, start, stop, tool } from './lib.mjs'

const port = process.env.E2E_PORT ?? '3112'
const file = process.env.DATABASE_FILE ?? './.data/e2e.db'
mkdirSync(`${root}/.data`, { recursive: true })
for (const end of ['', '-wal', '-shm']) rmSync(`${root}/${file}${end}`, { force: true })

const env = { DATABASE_FILE: file, TENTH_SUMMER_DEMO: '1', NODE_ENV: 'production' }
if (!tool('tsx', ['scripts/migrate.ts'], { env })) stop('The test database could not be made.')
if (!tool('tsx', ['seed/run.ts', '--demo'], { env })) stop('The test database could not be seeded.')

const server = start(['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', port], env)
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal))
server.on('exit', (code) => process.exit(code ?? 0))
