import { BotanicalName } from '@/components/plants/botanical-name'
import { formatLength } from '@/lib/measure'
import { partsOf, totalOf, type PlantListRow } from '@/lib/takeoff'

const range = ({ min, max }: { min: number; max: number }) => (min === max ? formatLength(min) : `${formatLength(min)} to ${formatLength(max)}`)

const HEADS = ['Key', 'Quantity', 'Plant', 'At planting', 'Mature height', 'Mature spread', 'Spacing', 'Remarks']

function Row({ row }: { row: PlantListRow }) {
  const size = 'px-3 py-2 font-mono whitespace-nowrap'
  return (
    <tr className="border-t border-rule align-top first:border-t-0">
      <th scope="row" className="px-3 py-2 text-left font-mono">{row.key}</th>
      <td className="px-3 py-2 text-right font-mono">{row.quantity}</td>
      <td className="px-3 py-2"><BotanicalName name={row.botanical} /><span className="block text-ink-soft">{row.common}</span></td>
      <td className={size}>{formatLength(row.plantedHeight)} high<br />{formatLength(row.plantedSpread)} wide</td>
      <td className={size}>{range(row.matureHeight)}</td>
      <td className={size}>{range(row.matureSpread)}</td>
      <td className={size}>{row.spacing === null ? 'single' : formatLength(Math.round(row.spacing * 2) / 2)}</td>
      <td className="px-3 py-2">{row.remarks}</td>
    </tr>
  )
}

function Sum({ word, count, remark, isLast }: { word: string; count: number; remark: string; isLast?: boolean }) {
  return (
    <tr className={isLast ? 'border-t-2 border-ink font-bold' : 'border-t border-ink-soft'}>
      <th scope="row" className="px-3 py-2 text-left whitespace-nowrap">{word}</th>
      <td className="px-3 py-2 text-right font-mono">{count}</td>
      <td colSpan={6} className="px-3 py-2 font-normal text-ink-soft">{remark}</td>
    </tr>
  )
}

/** The plant list with its sums. What stands there already is counted apart. */
export function PlantListTable({ rows }: { rows: readonly PlantListRow[] }) {
  const { fresh, existing } = partsOf(rows)
  return (
    <div className="overflow-x-auto border border-rule bg-sheet print:overflow-visible print:border-0" role="region" aria-label="Plant list" tabIndex={0}>
      <table className="w-full border-collapse">
        <thead>
          <tr className="border-b border-ink text-sm">{HEADS.map((head) => <th key={head} scope="col" className={`px-3 py-2 ${head === 'Quantity' ? 'text-right' : 'text-left'}`}>{head}</th>)}</tr>
        </thead>
        <tbody>{rows.map((row, i) => <Row key={i} row={row} />)}</tbody>
        <tfoot>
          {existing > 0 && <Sum word="New" count={fresh} remark="to be planted" />}
          {existing > 0 && <Sum word="Existing" count={existing} remark="stand there already and stay" />}
          <Sum word="Total" count={totalOf(rows)} remark="as many as the drawing shows" isLast />
        </tfoot>
      </table>
    </div>
  )
}
