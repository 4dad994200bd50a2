/** The built server killed outright during a stream of edits, started again on the same file: what it called saved is there. */
import { spawn, type ChildProcess } from 'node:child_process'
import { copyFileSync, rmSync } from 'node:fs'
import { expect, request, test, type APIRequestContext } from '@playwright/test'
import Database from 'better-sqlite3'
import { EMAILS, facadeOf, PASSWORD } from './support/demo'

const PORT = Number(process.env.E2E_PORT ?? 3112) + 1
const ORIGIN = `http://127.0.0.1:${PORT}`
const FILE = './.data/e2e-kill.db'

async function startServer(): Promise<ChildProcess> {
  const env = { ...process.env, DATABASE_FILE: FILE, NODE_ENV: 'production' as const }
  const server = spawn(process.execPath, ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(PORT)], { env, stdio: 'ignore' })
  for (let tries = 0; tries < 150; tries++) {
    const answer = await fetch(`${ORIGIN}/api/health`).catch(() => null)
    if (answer?.ok) return server
    await new Promise((done) => setTimeout(done, 200))
  }
  throw new Error('The server did not come up')
}

/** Kills the process that serves, and the one that started it, with no chance to tidy up. */
async function kill(server: ChildProcess) {
  const gone = new Promise((ended) => server.on('exit', ended))
  server.kill('SIGKILL')
  await gone
}

test('every edit whose answer was heard stands after a kill', async ({ page }) => {
  test.setTimeout(120_000)
  // A file of its own, made from the demonstration as it stands.
  for (const end of ['', '-wal', '-shm']) rmSync(`${FILE}${end}`, { force: true })
  const source = new Database(process.env.DATABASE_FILE ?? './.data/e2e.db', { readonly: true })
  await source.backup(`${FILE}.copy`)
  source.close()
  copyFileSync(`${FILE}.copy`, FILE)

  const first = await startServer()
  await page.goto(`${ORIGIN}/sign-in`)
  await page.getByLabel('E-mail address').fill(EMAILS.designer)
  await page.getByLabel('Password', { exact: true }).fill(PASSWORD)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL('**/projects')
  const client: APIRequestContext = await request.newContext({ baseURL: ORIGIN, storageState: await page.context().storageState(), extraHTTPHeaders: { origin: ORIGIN } })

  const { facadeId } = facadeOf('Kiln Lane')
  const opened = await (await client.get(`/api/facades/${facadeId}/sheet`)).json()
  const [one] = opened.sheet.placements
  const heard: number[] = []
  let base: number = opened.seq
  let killing: Promise<void> | null = null
  for (let n = 1; n <= 5_000; n++) {
    const edit = { id: crypto.randomUUID(), op: 'put', kind: 'placement', value: { ...one, x: one.x + n / 64 } }
    const answer = await client.post(`/api/facades/${facadeId}/edits`, { data: { base, editor: 'kill-test', edits: [edit] } }).catch(() => null)
    if (!answer) break
    expect(answer.status(), await answer.text()).toBe(200)
    base = (await answer.json()).seq
    heard.push(n)
    // In the middle of the stream, at no special moment of an edit.
    if (n === 5) killing = new Promise((done) => setTimeout(() => void kill(first).then(done), 50 + Math.random() * 400))
  }
  await killing!
  expect(heard.length).toBeGreaterThan(3)

  const second = await startServer()
  try {
    const after = await (await client.get(`/api/facades/${facadeId}/sheet`)).json()
    // One more may have been kept whose answer nobody heard; never one less.
    const kept = (after.sheet.placements[0].x - one.x) * 64
    expect([heard.length, heard.length + 1]).toContain(Math.round(kept))
    expect(after.seq).toBe(opened.seq + Math.round(kept))
  } finally {
    await kill(second)
    await client.dispose()
  }
})
