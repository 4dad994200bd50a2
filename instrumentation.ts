/** Runs once when the server starts. A server without its database ends at once instead of answering 500 for ever. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { openOrExit } = await import('./lib/server/health/open-or-exit')
  openOrExit()
}
