import { v7 } from 'uuid'

/** A fresh id: UUID version 7, which sorts by the moment it was made. */
export const newId = (): string => v7()
