/** The page's colours and fonts, for a canvas that cannot use CSS. */
import { INKS, PALETTES, type Face, type Ink } from '@/lib/drawing'
import type { Pen } from './paint'

const FALLBACK: Record<Face, string> = { text: 'sans-serif', mono: 'monospace', heading: 'serif' }

/** Tokens as they stand on the page now; the paper palette where the page names none. */
export function readTheme(element: Element): Pick<Pen, 'colours' | 'faces'> {
  const style = getComputedStyle(element)
  const token = (name: string) => style.getPropertyValue(name).trim()
  const colours = Object.fromEntries(INKS.map((ink) => [ink, token(`--color-${ink}`) || PALETTES.paper[ink]])) as Record<Ink, string>
  const face = (name: Face) => [token(`--font-${name}`), FALLBACK[name]].filter(Boolean).join(', ')
  return { colours, faces: { text: face('text'), mono: face('mono'), heading: face('heading') } }
}

/** Calls back when the theme changes and when the fonts have come. Answers how to stop. */
export function onThemeChange(callback: () => void): () => void {
  const observer = new MutationObserver(callback)
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['class', 'data-theme', 'style'] })
  let isOver = false
  void document.fonts.ready.then(() => {
    if (!isOver) callback()
  })
  return () => {
    isOver = true
    observer.disconnect()
  }
}
