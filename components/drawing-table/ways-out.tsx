'use client'
/** Ways out of the finding in hand: looked for when it is opened, each applied by one tap, taken back by undo. */
import { useEffect, useState } from 'react'
import type { Plant } from '@/lib/plants'
import { describeRemedy, NO_WAY_OUT, waysOut, type Finding, type Remedy, type Sheet } from '@/lib/spacing'
import { useDesk, useEditorState } from './desk-context'
import { useLibrary } from './library'
import { PLAIN } from './parts'

interface Looked {
  sheet: Sheet
  key: string
  remedies: Remedy[]
}

/** The search may take a good part of a second: the page is painted first, and a finding left early is not looked at. */
function useWaysOut(finding: Finding, sheet: Sheet, library: readonly Plant[] | null): Remedy[] | null {
  const [looked, setLooked] = useState<Looked | null>(null)
  useEffect(() => {
    if (!library) return
    const timer = setTimeout(() => setLooked({ sheet, key: finding.key, remedies: waysOut(sheet, finding, { library }) }), 30)
    return () => clearTimeout(timer)
  }, [sheet, finding, library])
  return looked?.sheet === sheet && looked.key === finding.key ? looked.remedies : null
}

export function WaysOut({ finding }: { finding: Finding }) {
  const { editor } = useDesk()
  const { sheet } = useEditorState()
  const library = useLibrary()
  // Without the library there is still moving and clipping, and the sheet's own plants to swap in.
  const plants = library.data?.plants ?? (library.isError ? sheet.plants : null)
  const remedies = useWaysOut(finding, sheet, plants)
  if (!editor.canEdit || (finding.kind !== 'conflict' && finding.kind !== 'risk')) return null
  if (finding.placements.length === 0) return <p className="mt-2 text-ink-soft">This is about the house and its ground: no plant mends it.</p>
  if (!remedies) return <p role="status" className="mt-2 text-ink-soft">Looking for a way out</p>
  if (remedies.length === 0) return <p role="status" className="mt-2">{NO_WAY_OUT}</p>
  return (
    <div className="mt-3">
      <p id="ways-out" className="font-bold">Ways out</p>
      <ul aria-labelledby="ways-out" className="mt-1 grid gap-2">
        {remedies.map((remedy) => {
          const words = describeRemedy(remedy, finding, sheet, plants ?? [])
          const plant = remedy.kind === 'swap' ? plants?.find(({ id }) => id === remedy.plant) : undefined
          return (
            <li key={words}>
              <button type="button" className={`${PLAIN} w-full justify-start py-2 text-left leading-snug`} onClick={() => editor.applyRemedy(remedy, words.replace(/\.$/, ''), plant)}>{words}</button>
            </li>
          )
        })}
      </ul>
      {library.isError ? <p className="mt-2 text-ink-soft">The library cannot be reached: only plants of this drawing were tried.</p> : null}
    </div>
  )
}
