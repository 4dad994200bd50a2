'use client'
/** What saving needs a person for: a choice between two versions, or a sentence about what was refused. */
import { formatLength } from '@/lib/measure'
import { wallDistance, type Placement, type Sheet } from '@/lib/spacing'
import { nameOf, type Clash } from './editor'
import { useDesk, useEditorState, useSaveState } from './desk-context'
import { PLAIN, STRONG } from './parts'

function placementWords(sheet: Sheet, value: unknown): string {
  if (!value) return 'removed'
  const { x, y, planted, kept, status } = value as Placement
  return [
    `${formatLength(x)} along, ${formatLength(wallDistance(sheet.facade, x, y))} from the wall`,
    `planted ${formatLength(planted.height)} tall, ${formatLength(planted.spread)} across`,
    kept && `kept to ${[kept.height, kept.spread].map((one) => (one === undefined ? 'free' : formatLength(one))).join(' by ')}`,
    status && status !== 'new' && status,
  ].filter(Boolean).join('; ')
}

function clashWords(sheet: Sheet, clash: Clash): { title: string; mine: string; theirs: string } {
  if (clash.kind === 'placement') {
    return { title: nameOf(sheet, (clash.theirs ?? clash.mine) as Placement), mine: placementWords(sheet, clash.mine), theirs: placementWords(sheet, clash.theirs) }
  }
  const name = ((clash.theirs ?? clash.mine) as { name?: string } | null)?.name ?? 'House front'
  return { title: name, mine: clash.mine ? 'as measured here' : 'removed', theirs: clash.theirs ? 'as measured by them' : 'removed' }
}

function ConflictPanel({ clashes }: { clashes: readonly Clash[] }) {
  const { queue } = useDesk()
  const { sheet } = useEditorState()
  return (
    <section role="alertdialog" aria-labelledby="clash-title" className="max-h-72 overflow-y-auto border-b-2 border-conflict bg-sheet p-4">
      <h2 id="clash-title" className="font-heading text-xl">Someone else changed the same {clashes.length === 1 ? 'thing' : 'things'}</h2>
      <p>Nothing is lost yet. Choose which version stands; everything else you did is kept.</p>
      <table className="my-2 w-full text-left [&_td]:border-t [&_td]:border-rule [&_td]:py-1 [&_td]:pr-3 [&_td]:align-top">
        <thead><tr><th scope="col">What</th><th scope="col">Theirs</th><th scope="col">Mine</th></tr></thead>
        <tbody>
          {clashes.map((clash) => {
            const { title, mine, theirs } = clashWords(sheet, clash)
            return <tr key={clash.kind + clash.target}><td>{title}</td><td>{theirs}</td><td>{mine}</td></tr>
          })}
        </tbody>
      </table>
      <div className="flex gap-2">
        <button type="button" className={PLAIN} onClick={() => queue.settle('theirs')}>Take theirs</button>
        <button type="button" className={STRONG} onClick={() => queue.settle('mine')}>Keep mine</button>
      </div>
    </section>
  )
}

export function SaveNotices() {
  const { queue } = useDesk()
  const { phase, refusals } = useSaveState()
  return (
    <>
      {phase.kind === 'conflict' ? <ConflictPanel clashes={phase.clashes} /> : null}
      {refusals.length > 0 ? (
        <div role="alert" className="flex flex-wrap items-center gap-3 border-b-2 border-conflict bg-sheet px-4 py-2">
          <p className="mr-auto">Taken out again, because the server refused it: {[...new Set(refusals)].join(' ')}</p>
          <button type="button" className={PLAIN} onClick={queue.dismissRefusals}>I have read it</button>
        </div>
      ) : null}
    </>
  )
}
