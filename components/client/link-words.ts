/** What a person reads whose link does not open. */
export type ClosedLink = 'unknown' | 'expired' | 'revoked'

export const CLOSED_LINK_WORDS: Record<ClosedLink, string> = {
  unknown: 'This link does not lead anywhere. Check that it was copied whole, or ask your designer for a new one.',
  expired: 'This link is past its time. Ask your designer for a new one.',
  revoked: 'This link has been withdrawn. Ask your designer for a new one.',
}
