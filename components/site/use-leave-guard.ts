'use client'
import { useEffect } from 'react'

/**
 * Asks before the page is left while something is not saved: by closing, reloading or a typed address through the
 * browser's own question, by a link on the page through ours.
 */
export function useLeaveGuard(hasUnsaved: () => boolean, onLink: (address: string) => void) {
  useEffect(() => {
    const beforeUnload = (event: BeforeUnloadEvent) => {
      if (hasUnsaved()) event.preventDefault()
    }
    const click = (event: MouseEvent) => {
      const link = event.target instanceof Element ? event.target.closest('a[href]') : null
      const isPlain = event.button === 0 && !event.ctrlKey && !event.metaKey && !event.shiftKey && !event.altKey
      if (!(link instanceof HTMLAnchorElement) || !isPlain || link.target === '_blank' || link.hash) return
      if (!hasUnsaved()) return
      event.preventDefault()
      event.stopPropagation()
      onLink(link.href)
    }
    window.addEventListener('beforeunload', beforeUnload)
    document.addEventListener('click', click, true)
    return () => {
      window.removeEventListener('beforeunload', beforeUnload)
      document.removeEventListener('click', click, true)
    }
  }, [hasUnsaved, onLink])
}
