/** From the characters people type, paste or dictate to a short row of tokens. */

export type Token = { kind: 'number'; text: string } | { kind: 'word'; text: string } | { kind: 'sign'; text: '-' | '+' | '/' | ',' } | { kind: 'other'; text: string }

const VULGAR: Record<string, string> = {
  '½': '1/2', '⅓': '1/3', '⅔': '2/3', '¼': '1/4', '¾': '3/4', '⅕': '1/5', '⅖': '2/5', '⅗': '3/5', '⅘': '4/5', '⅙': '1/6',
  '⅚': '5/6', '⅐': '1/7', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8', '⅑': '1/9', '⅒': '1/10', '↉': '0/3',
}

/** One spelling for each mark: straight quotes, plain minus, plain slash, plain spaces. */
function plainText(text: string): string {
  return text
    .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅐⅛⅜⅝⅞⅑⅒↉]/g, (sign) => ` ${VULGAR[sign]}`)
    .replace(/[\u200b-\u200f\u2060\ufeff]/g, '')
    .replace(/\s+/g, ' ')
    .replace(/[\u2010-\u2015\u2212\uff0d\ufe63]/g, '-')
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/[\u2018\u2019\u201a\u201b\u2032\u00b4\u0060\u02b9\uff07]/g, "'")
    .replace(/[\u201c\u201d\u201e\u201f\u2033\u02ba\uff02]|''/g, '"')
    .trim()
}

// A full stop ends a word ("ft."), unless digits follow it; a comma belongs to a number only between digits.
const TOKEN = /\s*(?:(\d+(?:[.,]\d+)*\.?|\.\d+)|([A-Za-z]+)(?:\.(?!\d))?|(['"])|([-+/,])|(\S))/y

/** Splits a text into tokens; [] for nothing but spaces. */
export function tokensOf(text: string): Token[] {
  const plain = plainText(text)
  const tokens: Token[] = []
  TOKEN.lastIndex = 0
  for (let match = TOKEN.exec(plain); match; match = TOKEN.exec(plain)) {
    const [, number, word, mark, sign, other] = match
    if (number !== undefined) tokens.push({ kind: 'number', text: number })
    else if (word !== undefined || mark !== undefined) tokens.push({ kind: 'word', text: (word ?? mark)! })
    else if (sign !== undefined) tokens.push({ kind: 'sign', text: sign as '-' })
    else tokens.push({ kind: 'other', text: other! })
  }
  return tokens
}
