'use client'
/** The library as a table. Order and pages are the server's: headings are links. */
import { WideTable } from '@/components/ui'
import { createColumnHelper, rowSortingFeature, tableFeatures, useTable } from '@tanstack/react-table'
import type { Route } from 'next'
import Link from 'next/link'
import { DEER_WORDS, monthsInWords, plantQueryText, rangeText, wordOf, zonesText, type LibraryPlant, type PlantQuery, type PlantSort } from '@/lib/plants'
import { BotanicalName } from './botanical-name'

const features = tableFeatures({ rowSortingFeature })
const helper = createColumnHelper<typeof features, LibraryPlant>()

function Name({ plant }: { plant: LibraryPlant }) {
  return (
    <Link href={`/plants/${plant.id}` as Route} className="flex min-h-11 items-center text-lg underline decoration-rule underline-offset-4 hover:decoration-ink">
      <span><BotanicalName name={plant.botanical} />{plant.studioId !== null && <span className="ml-2 text-sm text-ink-soft">our own</span>}</span>
    </Link>
  )
}

function Flower({ plant }: { plant: LibraryPlant }) {
  const { bloomColor, bloomMonths } = plant
  if (bloomMonths.length === 0) return <span className="text-ink-soft">none of note</span>
  const color = bloomColor === 'multi' ? 'several colors' : wordOf(bloomColor).toLowerCase()
  return <>{bloomColor === '' ? '' : `${color}, `}{monthsInWords(bloomMonths)}</>
}

/** Short words of a narrow column. */
const LIGHT_WORDS = { 'full-sun': 'sun', 'part-shade': 'part', 'full-shade': 'shade' } as const

const columns = helper.columns([
  helper.accessor('botanical', { header: 'Botanical name', cell: ({ row }) => <Name plant={row.original} /> }),
  helper.accessor('common', { header: 'Common name' }),
  helper.accessor('category', { header: 'Type', cell: ({ row }) => wordOf(row.original.category) }),
  helper.accessor('heightMax', { id: 'height', header: 'Height', cell: ({ row }) => rangeText(row.original.heightMin, row.original.heightMax) }),
  helper.accessor('spreadMax', { id: 'spread', header: 'Spread', cell: ({ row }) => rangeText(row.original.spreadMin, row.original.spreadMax) }),
  helper.accessor('zoneMin', { id: 'zone', header: 'Zones', cell: ({ row }) => zonesText(row.original) }),
  helper.accessor('light', { header: 'Light', enableSorting: false, cell: ({ row }) => row.original.light.map((light) => LIGHT_WORDS[light]).join(', ') || 'not recorded' }),
  helper.accessor('bloomMonths', { id: 'flower', header: 'Flower', enableSorting: false, cell: ({ row }) => <Flower plant={row.original} /> }),
  helper.accessor('deer', { header: 'Deer browse', enableSorting: false, cell: ({ row }) => DEER_WORDS[row.original.deer].replace(' browsed', '') }),
])

const FIGURES = new Set(['height', 'spread', 'zone'])
const UNBROKEN = new Set(['height', 'spread', 'zone', 'light'])
const ARIA_SORT = { asc: 'ascending', desc: 'descending' } as const

/** The address that sorts by a column: again turns the order; the first page is shown. */
function sortedBy(query: PlantQuery, sort: PlantSort): Route {
  const direction = query.sort === sort && query.direction === 'asc' ? 'desc' : 'asc'
  return `/plants?${plantQueryText({ ...query, sort, direction, page: 1 })}` as Route
}

function Heading({ id, title, sorted, query }: { id: string; title: React.ReactNode; sorted: false | 'asc' | 'desc'; query: PlantQuery }) {
  return (
    <Link href={sortedBy(query, id as PlantSort)} scroll={false} className="flex min-h-11 items-center gap-1 font-bold underline decoration-rule underline-offset-4 hover:decoration-ink">
      {title}
      {sorted && <span aria-hidden="true">{sorted === 'asc' ? '▲' : '▼'}</span>}
    </Link>
  )
}

export function PlantTable({ plants, query, caption }: { plants: LibraryPlant[]; query: PlantQuery; caption: string }) {
  const sorting = query.sort === 'match' ? [] : [{ id: query.sort, desc: query.direction === 'desc' }]
  const table = useTable({ features, columns, data: plants, getRowId: (plant) => plant.id, manualSorting: true, state: { sorting } })
  return (
    <WideTable label={caption} className="rounded-sm border border-rule bg-sheet">
      <table className="w-full min-w-240 border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id} className="border-b border-ink-soft">
              {group.headers.map((header) => {
                const sorted = header.column.getIsSorted()
                return (
                  <th key={header.id} scope="col" className="px-3 py-1" aria-sort={sorted ? ARIA_SORT[sorted] : undefined}>
                    {header.column.getCanSort() ? <Heading id={header.column.id} title={<table.FlexRender header={header} />} sorted={sorted} query={query} /> : <table.FlexRender header={header} />}
                  </th>
                )
              })}
            </tr>
          ))}
        </thead>
        <tbody>
          {table.getRowModel().rows.map((row) => (
            <tr key={row.id} className="border-b border-rule last:border-0">
              {row.getAllCells().map((cell) => {
                const className = `px-3 py-1 align-middle ${FIGURES.has(cell.column.id) ? 'font-mono text-sm' : ''} ${UNBROKEN.has(cell.column.id) ? 'whitespace-nowrap' : ''}`
                return cell.column.id === 'botanical'
                  ? <th key={cell.id} scope="row" className={`${className} min-w-56 font-normal`}><table.FlexRender cell={cell} /></th>
                  : <td key={cell.id} className={className}><table.FlexRender cell={cell} /></td>
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </WideTable>
  )
}
