// Sets up and runs the product with its demonstration: install, migrate, seed, build, serve. Run again, it keeps the data.
import { mkdirSync } from 'node:fs'
import { install, root, say, start, stop, tool, untilHealthy } from './lib.mjs'

const port = Number(process.env.PORT ?? 3000)
if (!Number.isInteger(port) || port < 1 || port > 65535) stop(`PORT must be a number from 1 to 65535; it is "${process.env.PORT}".`)

install()
mkdirSync(`${root}/.data`, { recursive: true })
const env = { DATABASE_FILE: process.env.DATABASE_FILE ?? './.data/demo.db', TENTH_SUMMER_DEMO: '1', NODE_ENV: 'production' }

say('Preparing the database.')
if (!tool('tsx', ['scripts/migrate.ts'], { env })) stop('The database could not be brought up to date: see above. Nothing else was done.')
if (!tool('tsx', ['seed/run.ts', '--demo'], { env })) stop('The demonstration could not be put in: see above.')
say('Building.')
if (!tool('next', ['build'], { env })) stop('The product did not build: see above.')

const server = start(['node_modules/next/dist/bin/next', 'start', '-p', String(port)], env)
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal))
server.on('exit', (code) => process.exit(code ?? 0))
if (!(await untilHealthy(port, server))) {
  server.kill()
  stop(`The server did not come up on port ${port}. Is something else using it? PORT=3001 npm run demo takes another.`)
}
say(`\nTenth Summer is ready: http://localhost:${port}\n`)
tool('tsx', ['seed/sign-ins.ts'], { env })
say('\nStop it with Ctrl+C. The data stays in .data/demo.db.')
