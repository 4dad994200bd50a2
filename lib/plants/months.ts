/** Months of the year as lists of 1-12, and as people write them: "6-9", "11-2" over the turn of the year, "4-5|9". */

const NAMES = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const

/** Short name of a month 1-12. */
export const monthName = (month: number): string => NAMES[month - 1] ?? ''

const isMonth = (month: number) => month >= 1 && month <= 12

/**
 * Reads "6-9" as [6, 7, 8, 9], "11-2" as [11, 12, 1, 2], "5" as [5], several spans parted by "|", and an empty text
 * as []. Months keep the order in which they come. Null when it cannot be read.
 */
export function parseMonths(text: string): number[] | null {
  const months = new Set<number>()
  for (const part of text.split('|').map((piece) => piece.trim()).filter(Boolean)) {
    const found = /^(\d{1,2})(?:\s*[-–]\s*(\d{1,2}))?$/.exec(part)
    if (!found) return null
    const from = Number(found[1])
    const to = Number(found[2] ?? found[1])
    if (!isMonth(from) || !isMonth(to)) return null
    for (let month = from; ; month = (month % 12) + 1) {
      months.add(month)
      if (month === to) break
    }
  }
  return [...months]
}

/** Runs of months that follow each other, the year taken as a ring. */
function spansOf(months: readonly number[]): [number, number][] {
  const has = new Set(months)
  if (has.size === 12) return [[1, 12]]
  const starts = [...has].filter((month) => !has.has(month === 1 ? 12 : month - 1))
  return starts.map((start) => {
    let end = start
    while (has.has((end % 12) + 1)) end = (end % 12) + 1
    return [start, end]
  })
}

/** Writes months so that `parseMonths` reads the same months back. */
export const formatMonths = (months: readonly number[]): string =>
  spansOf(months).map(([from, to]) => (from === to ? `${from}` : `${from}-${to}`)).join('|')

/** Months in words: "Jun to Sep", "May", "Apr to May and Sep"; '' for none. */
export const monthsInWords = (months: readonly number[]): string =>
  spansOf(months)
    .map(([from, to]) => (from === to ? monthName(from) : `${monthName(from)} to ${monthName(to)}`))
    .join(' and ')
