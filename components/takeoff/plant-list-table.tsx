import { WideTable } from '@/components/ui'
import { BotanicalName } from '@/components/plants/botanical-name'
import { formatLength } from '@/lib/measure'
import { partsOf, totalOf, type PlantListRow } from '@/lib/takeoff'

const range = ({ min, max }: { min: number; max: number }) => (min === max ? formatLength(min) : `${formatLength(min)} to ${formatLength(max)}`)

const HEADS = ['Key', 'Quantity', 'Plant', 'At planting', 'Mature height', 'Mature spread', 'Spacing', 'Remarks']

function Row({ row }: { row: PlantListRow }) {
  const size = 'px-3 py-2 font-mono tabular-nums whitespace-nowrap'
  return (
    <tr className="border-t border-rule align-top">
      <th scope="row" className="px-3 py-2 text-left font-mono">{row.key}</th>
      <td className="px-3 py-2 text-right font-mono tabular-nums">{row.quantity}</td>
      <td className="px-3 py-2"><BotanicalName name={row.botanical} /><span className="block text-ink-soft">{row.common}</span></td>
      <td className={size}>{formatLength(row.plantedHeight)} high<br />{formatLength(row.plantedSpread)} wide</td>
      <td className={size}>{range(row.matureHeight)}</td>
      <td className={size}>{range(row.matureSpread)}</td>
      <td className={size}>{row.spacing === null ? 'single' : formatLength(Math.round(row.spacing * 2) / 2)}</td>
      <td className="px-3 py-2">{row.remarks}</td>
    </tr>
  )
}

function Sum({ word, count, remark, isFirst = false }: { word: string; count: number; remark: string; isFirst?: boolean }) {
  return (
    <tr className={isFirst ? 'border-t-2 border-ink' : 'border-t border-rule'}>
      <th scope="row" className="px-3 py-2 text-left">{word}</th>
      <td className="px-3 py-2 text-right font-mono font-bold tabular-nums">{count}</td>
      <td colSpan={6} className="px-3 py-2 text-ink-soft">{remark}</td>
    </tr>
  )
}

/** The plant list with its sums; what stands there already is counted apart. */
export function PlantListTable({ rows }: { rows: readonly PlantListRow[] }) {
  const { fresh, existing } = partsOf(rows)
  return (
    <WideTable label="Plant list" className="border border-rule bg-sheet print:overflow-visible print:border-0">
      <table className="w-full border-collapse">
        <thead>
          <tr>{HEADS.map((head) => <th key={head} scope="col" className={`px-3 py-2 ${head === 'Quantity' ? 'text-right' : 'text-left'}`}>{head}</th>)}</tr>
        </thead>
        <tbody>{rows.map((row, i) => <Row key={i} row={row} />)}</tbody>
        <tfoot>
          {existing > 0 && <Sum word="New" count={fresh} remark="to be bought and planted" isFirst />}
          {existing > 0 && <Sum word="Existing" count={existing} remark="stand there already and stay" />}
          <Sum word="Total" count={totalOf(rows)} remark="as many as the drawing shows" isFirst={existing === 0} />
        </tfoot>
      </table>
    </WideTable>
  )
}
