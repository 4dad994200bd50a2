/** Classes the plant pages share. */
export const CARD = 'rounded-sm border border-rule bg-sheet p-4'
export const HEADING = 'font-heading text-2xl'
