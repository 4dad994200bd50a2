/**
 * What two spellings of one botanical name share: case, spaces, straight or curly quotes, and the hybrid sign
 * written as × or as a letter x are no difference.
 */
export const nameKey = (botanical: string): string =>
  botanical
    .normalize('NFC')
    .toLowerCase()
    .replace(/[‘’`´]/g, "'")
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/(^| )x(?= )/g, '$1×')
