'use client'
import { formatLength } from '@/lib/measure'
import { useMeasure } from './measure-context'
import { ActionButton } from './parts'
import type { Clash } from '../drawing-table/editor/clashes'

interface Props {
  clashes: readonly Clash[]
  onTheirs: () => void
  onMine: () => void
}

const FIELD_WORDS: Record<string, string> = {
  x: 'Left edge', y: 'Out from base line', z: 'Lower edge', sill: 'Sill', head: 'Head', width: 'Width', depth: 'Depth', height: 'Height', outlet: 'Water leaves',
  gutter: 'Gutter', overhang: 'Overhang', exposed: 'Foundation showing', mulch: 'Mulch', fall: 'Fall', wall: 'Wall line', grade: 'Soil', outline: 'Outline',
  siding: 'Siding', kind: 'Kind', name: 'Name', light: 'Light', facing: 'Looks towards',
}
const PLAIN_NUMBERS = ['facing', 'fall']

function titleOf({ kind, mine, theirs }: Clash): string {
  const thing = (theirs ?? mine) as { name?: string; kind?: string } | null
  if (kind === 'facade') return 'House front'
  if (kind === 'aspect') return 'Facing and light'
  return thing?.name ?? thing?.kind?.replaceAll('-', ' ') ?? kind
}

/** Fields of a thing that differ between the two versions, with both values in words. */
function differences({ mine, theirs }: Clash, write: (field: string, value: unknown) => string): { field: string; mine: string; theirs: string }[] {
  if (!mine || !theirs) return [{ field: 'It', mine: mine ? 'is kept' : 'is removed', theirs: theirs ? 'is kept' : 'is removed' }]
  const [a, b] = [mine as Record<string, unknown>, theirs as Record<string, unknown>]
  return [...new Set([...Object.keys(a), ...Object.keys(b)])]
    .filter((field) => JSON.stringify(a[field]) !== JSON.stringify(b[field]))
    .map((field) => ({ field: FIELD_WORDS[field] ?? field, mine: write(field, a[field]), theirs: write(field, b[field]) }))
}

/** What someone else changed meanwhile, beside what stands here, and the choice between them. */
export function ClashPanel({ clashes, onTheirs, onMine }: Props) {
  const { units } = useMeasure()
  const write = (field: string, value: unknown): string => {
    if (typeof value === 'number') return PLAIN_NUMBERS.includes(field) ? String(value) : formatLength(value, units)
    if (Array.isArray(value)) return `${value.length} points: ${value.map((point) => Object.values(point as object).map((n) => formatLength(Number(n), units)).join(', ')).join(' | ')}`
    return value === undefined ? 'not given' : String(value)
  }
  return (
    <section role="alertdialog" aria-labelledby="clash-title" aria-describedby="clash-lead" className="border-2 border-conflict bg-sheet p-4">
      <h2 id="clash-title" className="font-heading text-xl">Someone else changed the same thing</h2>
      <p id="clash-lead">Nothing is lost yet. Choose which version stands; the other one is dropped.</p>
      <table className="my-3 w-full text-left [&_td]:border-t [&_td]:border-rule [&_td]:py-1 [&_td]:pr-3 [&_td]:align-top [&_th]:pr-3">
        <thead>
          <tr><th scope="col">What</th><th scope="col">Theirs</th><th scope="col">Mine</th></tr>
        </thead>
        <tbody>
          {clashes.flatMap((clash) =>
            differences(clash, write).map((row) => (
              <tr key={clash.kind + clash.target + row.field}>
                <td>{titleOf(clash)}: {row.field.toLowerCase()}</td>
                <td className="font-mono">{row.theirs}</td>
                <td className="font-mono">{row.mine}</td>
              </tr>
            )),
          )}
        </tbody>
      </table>
      <div className="flex gap-2">
        <ActionButton kind="plain" takesFocus onPress={onTheirs}>Take theirs</ActionButton>
        <ActionButton kind="strong" onPress={onMine}>Keep mine</ActionButton>
      </div>
    </section>
  )
}
