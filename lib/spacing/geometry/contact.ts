/** A contact of at most this many inches is none, in any direction. */
export const CONTACT = 0.01
