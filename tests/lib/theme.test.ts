/** The style sheet and the palette say the same colours, and text can be read on them. */
import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { INKS, OUTDOORS, PAPER, contrast } from '@/lib/drawing/palette'

const css = readFileSync(new URL('../../app/globals.css', import.meta.url), 'utf8')

/** The colours named in the block that opens with this text. */
function colours(opening: string): Record<string, string> {
  const block = css.slice(css.indexOf(opening)).split('}')[0] ?? ''
  return Object.fromEntries([...block.matchAll(/--color-([a-z-]+):\s*(#[0-9a-f]{6});/g)].map(([, name, hex]) => [name, hex]))
}

const paper = colours('@theme static {')
const outdoors = { ...paper, ...colours("[data-theme='outdoors'] {") }

describe('the style sheet', () => {
  test('names every ink of the paper palette, and no other colour', () => expect(paper).toEqual(PAPER))
  test('names every ink of the outdoors palette', () => expect(outdoors).toEqual(OUTDOORS))
  test('has all inks', () => expect(Object.keys(paper).sort()).toEqual([...INKS].sort()))
})

const GROUNDS = ['paper', 'sheet'] as const
const pairs = (['ink', 'ink-soft', 'leaf', 'conflict', 'held'] as const).flatMap((ink) => GROUNDS.map((ground) => [ink, ground] as const))

describe('text', () => {
  test.each(pairs)('%s on %s: 4.5 on paper, 7 outdoors', (ink, ground) => {
    expect(contrast(PAPER[ink], PAPER[ground])).toBeGreaterThanOrEqual(4.5)
    expect(contrast(OUTDOORS[ink], OUTDOORS[ground])).toBeGreaterThanOrEqual(7)
  })
})
