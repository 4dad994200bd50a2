import { formatLength } from '@/lib/measure'
import type { BedsTakeoff } from '@/lib/takeoff'

const feet = (area: number) => `${area.toFixed(1)} sq ft`

/** The beds by area, with the mulch that covers them all. */
export function BedsTable({ takeoff: { beds, squareFeet, depth, mulch } }: { takeoff: BedsTakeoff }) {
  return (
    <section aria-labelledby="beds-title" className="grid gap-2">
      <h2 id="beds-title" className="font-heading text-2xl">Beds and mulch</h2>
      <table className="w-full max-w-xl border-collapse border border-rule bg-sheet print:border-0">
        <thead><tr><th scope="col" className="px-3 py-2 text-left">Bed</th><th scope="col" className="px-3 py-2 text-right">Area</th></tr></thead>
        <tbody>
          {beds.map(({ name, squareFeet: area }, i) => (
            <tr key={i} className="border-t border-rule"><th scope="row" className="px-3 py-2 text-left font-normal">{name}</th><td className="px-3 py-2 text-right font-mono tabular-nums">{feet(area)}</td></tr>
          ))}
        </tbody>
        <tfoot>
          <tr className="border-t-2 border-ink"><th scope="row" className="px-3 py-2 text-left">Total</th><td className="px-3 py-2 text-right font-mono tabular-nums">{feet(squareFeet)}</td></tr>
        </tfoot>
      </table>
      <p>{depth > 0 ? <>Mulch {formatLength(depth)} deep over all of it: <strong>{mulch.cubicYards.toFixed(2)} cubic yards</strong>, {mulch.order} to order.</> : 'No mulch is measured for this facade.'}</p>
    </section>
  )
}
