'use client'
import { useState } from 'react'
import { buttonClass } from '@/components/ui'

type Theme = 'paper' | 'outdoors'
const YEAR_S = 365 * 24 * 60 * 60

/** Paper or outdoors, remembered on this device for a year. */
export function ThemeButton({ theme }: { theme: Theme }) {
  const [current, setCurrent] = useState(theme)
  const isOutdoors = current === 'outdoors'
  const turn = () => {
    const next: Theme = isOutdoors ? 'paper' : 'outdoors'
    document.cookie = `theme=${next}; path=/; max-age=${YEAR_S}; samesite=lax`
    document.documentElement.dataset.theme = next
    setCurrent(next)
  }
  return (
    <button type="button" aria-pressed={isOutdoors} onClick={turn} title="Black on white, for reading in the sun" className={buttonClass('quiet', 'aria-pressed:font-bold')}>
      <svg viewBox="0 0 16 16" aria-hidden="true" className="size-4 fill-none stroke-current" strokeWidth={1.5}>
        <circle cx={8} cy={8} r={3} className={isOutdoors ? 'fill-current' : undefined} />
        <path d="M8 .8v2.4M8 12.8v2.4M.8 8h2.4M12.8 8h2.4M2.9 2.9l1.7 1.7M11.4 11.4l1.7 1.7M2.9 13.1l1.7-1.7M11.4 4.6l1.7-1.7" />
      </svg>
      Outdoors
    </button>
  )
}
