/**
 * The words of a question as an FTS5 expression that finds each as the beginning of a word, in any order; null when
 * there is no word in it (marks alone ask for nothing). Marks part words as the tokenizer does; a lone x is the
 * hybrid sign, which is no word. At most eight words count. Whatever is typed, the expression is sound.
 * @example searchExpression("ilex 'gla") // '"ilex"* "gla"*'
 */
export function searchExpression(question: string): string | null {
  const words = question.normalize('NFC').match(/[\p{L}\p{N}][\p{L}\p{N}\p{M}]*/gu) ?? []
  const counted = words.filter((word, i) => !(/^x$/i.test(word) && i > 0)).slice(0, 8)
  return counted.length === 0 ? null : counted.map((word) => `"${word}"*`).join(' ')
}
