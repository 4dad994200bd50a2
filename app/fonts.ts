/** The three faces, served from our own files. Each is two files: Latin, and extended Latin fetched when a letter needs it. */
import localFont from 'next/font/local'

const heading = localFont({
  src: [
    { path: '../fonts/brygada-1918/brygada-1918-latin-wght-normal.woff2', style: 'normal', weight: '400 700' },
    { path: '../fonts/brygada-1918/brygada-1918-latin-wght-italic.woff2', style: 'italic', weight: '400 700' },
  ],
  variable: '--face-heading',
  display: 'swap',
  adjustFontFallback: false,
})

const headingMore = localFont({
  src: [
    { path: '../fonts/brygada-1918/brygada-1918-latin-ext-wght-normal.woff2', style: 'normal', weight: '400 700' },
    { path: '../fonts/brygada-1918/brygada-1918-latin-ext-wght-italic.woff2', style: 'italic', weight: '400 700' },
  ],
  variable: '--face-heading-more',
  display: 'swap',
  preload: false,
  adjustFontFallback: 'Times New Roman',
})

const text = localFont({
  src: '../fonts/atkinson-hyperlegible-next/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  weight: '200 800',
  variable: '--face-text',
  display: 'swap',
  adjustFontFallback: false,
})

const textMore = localFont({
  src: '../fonts/atkinson-hyperlegible-next/atkinson-hyperlegible-next-latin-ext-wght-normal.woff2',
  weight: '200 800',
  variable: '--face-text-more',
  display: 'swap',
  preload: false,
  adjustFontFallback: 'Arial',
})

const mono = localFont({
  src: '../fonts/atkinson-hyperlegible-mono/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  weight: '200 800',
  variable: '--face-mono',
  display: 'swap',
  adjustFontFallback: false,
})

const monoMore = localFont({
  src: '../fonts/atkinson-hyperlegible-mono/atkinson-hyperlegible-mono-latin-ext-wght-normal.woff2',
  weight: '200 800',
  variable: '--face-mono-more',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
})

/** Classes for the root element: they set the variables that globals.css builds --font-heading, --font-text and --font-mono from. */
export const fontVariables = [heading, headingMore, text, textMore, mono, monoMore].map((face) => face.variable).join(' ')
