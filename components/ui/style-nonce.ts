import { setNonce } from 'get-nonce'

let isDone = false

/**
 * Gives this nonce to the styles that overlays put into the page. The document keeps the policy of its first load:
 * only the first nonce counts, a later refresh of the layout carries another one. Does nothing on the server.
 */
export function initStyleNonce(nonce: string | undefined): void {
  if (isDone || typeof window === 'undefined' || !nonce) return
  setNonce(nonce)
  isDone = true
}
