'use client'
/** Says aloud what was done and which findings came and went, at most once a second. */
import { useEffect, useState } from 'react'
import { describe } from '@/lib/spacing'
import { Announcer, changeInWords } from './editor'
import { useDesk } from './desk-context'
import { systemClock } from './system-clock'

export function Announcements() {
  const { editor } = useDesk()
  const [words, setWords] = useState('')
  useEffect(() => {
    const announcer = new Announcer(systemClock, setWords)
    let before = editor.getSnapshot()
    const stop = editor.subscribe(() => {
      const now = editor.getSnapshot()
      const changed = now.report === before.report ? '' : changeInWords(before.report.findings, now.report.findings, (finding) => {
        const { title, sentence } = describe(finding, now.sheet)
        return `${title}. ${sentence}`
      })
      const said = now.said === before.said ? '' : `${now.said}.`.replace(/\.\.$/, '.')
      before = now
      announcer.say([said, changed].filter(Boolean).join(' '))
    })
    return () => {
      stop()
      announcer.stop()
    }
  }, [editor])
  return <p aria-live="polite" data-testid="announcements" className="sr-only">{words}</p>
}
