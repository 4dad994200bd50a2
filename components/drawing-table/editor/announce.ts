/** What is said aloud when findings come and go: at most one sentence a second, the latest facts, nothing twice. */
import type { Finding } from '@/lib/spacing'
import type { Clock } from './save-calls'

const PAUSE_MS = 1_000
const COUNTS = { conflict: 'conflict', risk: 'risk', held: 'held plant', note: 'note' } as const

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`

function listed(findings: readonly Finding[]): string {
  const kinds = Object.keys(COUNTS) as (keyof typeof COUNTS)[]
  return kinds.flatMap((kind) => {
    const count = findings.filter((finding) => finding.kind === kind).length
    return count > 0 ? [counted(count, COUNTS[kind])] : []
  }).join(', ')
}

/** What changed between two lists of findings, in words; '' when nothing did. A single new finding is told in full. */
export function changeInWords(before: readonly Finding[], after: readonly Finding[], tell: (finding: Finding) => string): string {
  const facts = (finding: Finding) => `${finding.key} ${finding.kind}`
  const [old, now] = [new Set(before.map(facts)), new Set(after.map(facts))]
  const fresh = after.filter((finding) => !old.has(facts(finding)))
  const gone = before.filter((finding) => !now.has(facts(finding)))
  const first = fresh.length === 1 ? `New ${fresh[0]!.kind}: ${tell(fresh[0]!)}` : fresh.length > 1 ? `New: ${listed(fresh)}.` : ''
  return [first, gone.length > 0 ? `Cleared: ${listed(gone)}.` : ''].filter(Boolean).join(' ')
}

/** Holds what is to be said until a second has passed since the last sentence. Newer words take the place of older ones not yet said. */
export class Announcer {
  private next: string | null = null
  private spokeAt = -Infinity
  private callOff: (() => void) | null = null

  constructor(
    private readonly clock: Clock,
    private readonly speak: (words: string) => void,
  ) {}

  say(words: string): void {
    if (words === '') return
    this.next = words
    if (this.callOff) return
    const wait = this.spokeAt + PAUSE_MS - this.clock.now()
    if (wait <= 0) this.flush()
    else this.callOff = this.clock.after(wait, () => this.flush())
  }

  stop(): void {
    this.callOff?.()
    this.callOff = null
  }

  private flush(): void {
    this.callOff = null
    if (this.next === null) return
    this.spokeAt = this.clock.now()
    this.speak(this.next)
    this.next = null
  }
}
