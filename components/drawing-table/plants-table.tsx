'use client'
/** Every placement of the drawing in numbers: the same ones, and every one of them can be changed here. */
import { WideTable } from '@/components/ui'
import { plantKeys } from '@/lib/sheet'
import { wallDistance, type Placement, type Sheet } from '@/lib/spacing'
import { alongWall, outFromWall } from './editor'
import { useDesk, useEditorState } from './desk-context'
import { RemoveIcon } from './icons'
import { LengthCell, QUIET, STRONG } from './parts'

interface RowProps {
  sheet: Sheet
  placement: Placement
  keyLetter: string
  isSelected: boolean
}

function PlacementRow({ sheet, placement, keyLetter, isSelected }: RowProps) {
  const { editor } = useDesk()
  const { facade } = sheet
  const plant = sheet.plants.find(({ id }) => id === placement.plant)
  const common = plant?.common || plant?.botanical || 'Unknown plant'
  const name = [common, keyLetter].filter(Boolean).join(' ')
  const put = (change: Partial<Placement>, what: string) => editor.put({ ...placement, ...change }, `${common}: ${what}`)
  const cell = { readOnly: !editor.canEdit }
  const { planted } = placement
  return (
    <tr data-placement={placement.id} data-selected={isSelected || undefined} className="border-b border-rule align-top data-selected:bg-sheet data-selected:shadow-[inset_3px_0_0_var(--color-leaf)]">
      <th scope="row" className="min-w-36 py-1 text-left font-normal">
        <button type="button" aria-pressed={isSelected} onClick={() => editor.select(isSelected ? null : placement.id)} className="flex min-h-11 w-full items-center gap-2 rounded-sm px-1 text-left leading-tight focus-visible:outline-2 focus-visible:outline-leaf">
          <span className="grid size-6 shrink-0 place-items-center rounded-full border border-ink text-sm font-bold">{keyLetter || '-'}</span>
          <span>
            <span className="block">{common}</span>
            <span className="block font-heading text-sm text-ink-soft italic">{plant?.botanical}</span>
            {placement.status === 'goes' ? <span className="block text-sm">goes</span> : placement.status === 'stays' ? <span className="block text-sm">stays</span> : null}
          </span>
        </button>
      </th>
      <td><LengthCell {...cell} className="w-22" label={`${name}, along the wall`} value={placement.x} onCommit={(x) => put({ x }, 'moved along the wall')} /></td>
      <td>
        <LengthCell {...cell} className="w-22" label={`${name}, from the wall`} value={wallDistance(facade, placement.x, placement.y)} onCommit={(out) => put({ y: outFromWall(facade, placement.x, out) }, 'moved from the wall')} />
      </td>
      <td><LengthCell {...cell} className="w-20" label={`${name}, height when planted`} value={planted.height} onCommit={(height) => put({ planted: { ...planted, height } }, 'planted height')} /></td>
      <td><LengthCell {...cell} className="w-20" label={`${name}, spread when planted`} value={planted.spread} onCommit={(spread) => put({ planted: { ...planted, spread } }, 'planted spread')} /></td>
      {editor.canEdit ? <td><button type="button" aria-label={`Remove ${name}`} onClick={() => editor.remove(placement.id)} title={`Remove ${name}`} className={`${QUIET} px-0`}><RemoveIcon /></button></td> : null}
    </tr>
  )
}

/** From left to right along the wall. */
export function PlantsTable() {
  const { editor, page } = useDesk()
  const { sheet, selected } = useEditorState()
  const keys = plantKeys(sheet)
  const rows = alongWall(sheet)
  return (
    <div className="p-3">
      {editor.canEdit ? <button type="button" onClick={page.openPlants} className={`${STRONG} mb-3`}>Add a plant</button> : null}
      <WideTable label="The plants of the drawing in numbers">
        <table id="plants-table" data-testid="plants-table" className="w-full text-[15px] [&_td]:py-1 [&_td]:pr-1 [&_thead_th]:pr-2 [&_thead_th]:pb-1 [&_thead_th]:text-left [&_thead_th]:align-bottom [&_thead_th]:text-sm">
          <caption className="pb-2 text-left text-ink-soft">{rows.length === 1 ? 'One plant' : `${rows.length} plants`}, from the left corner to the right.</caption>
          <thead>
            <tr>
              <th scope="col">Plant</th><th scope="col">Along the wall</th><th scope="col">From the wall</th><th scope="col">Planted height</th><th scope="col">Planted spread</th>
              {editor.canEdit ? <th scope="col"><span className="sr-only">Remove</span></th> : null}
            </tr>
          </thead>
          <tbody>
            {rows.map((placement) => (
              <PlacementRow key={placement.id} sheet={sheet} placement={placement} keyLetter={keys.get(placement.plant) ?? ''} isSelected={placement.id === selected} />
            ))}
          </tbody>
        </table>
      </WideTable>
    </div>
  )
}
