'use client'
/** What every field of the measure form needs: the store, the units, where heights are taken from. */
import { createContext, use, useCallback, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react'
import { listOf, type Problem } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import type { Units } from './length-field'
import { pathOf, type Measuring, type MeasuringState, type Thing } from './measuring'
import { useRemembered } from './use-remembered'

export type HeightsFrom = 'soil' | 'zero'

interface Value {
  measuring: Measuring
  state: MeasuringState
  readOnly: boolean
  units: Units
  setUnits: (units: Units) => void
  heightsFrom: HeightsFrom
  setHeightsFrom: (from: HeightsFrom) => void
}

const MeasureContext = createContext<Value | null>(null)

export function MeasureProvider({ measuring, readOnly, children }: { measuring: Measuring; readOnly: boolean; children: ReactNode }) {
  const state = useSyncExternalStore(measuring.subscribe, measuring.getState, measuring.getState)
  const [units, setUnits] = useRemembered<Units>('units', 'imperial', ['imperial', 'metric'])
  const [heightsFrom, setHeightsFrom] = useRemembered<HeightsFrom>('heights-from', 'soil', ['soil', 'zero'])
  const value = useMemo(
    () => ({ measuring, state, readOnly, units, setUnits, heightsFrom, setHeightsFrom }),
    [measuring, state, readOnly, units, setUnits, heightsFrom, setHeightsFrom],
  )
  return <MeasureContext value={value}>{children}</MeasureContext>
}

export function useMeasure(): Value {
  const value = use(MeasureContext)
  if (!value) throw new Error('useMeasure is for fields inside a MeasureProvider.')
  return value
}

type Of<K extends Thing['kind']> = Extract<Thing, { kind: K }>

export interface ThingForm<K extends Thing['kind']> {
  /** With what is typed and not yet kept. */
  value: Of<K>['value']
  type: (change: Partial<Of<K>['value']>) => void
  /** Changes and keeps at once: choices, points added and removed. */
  choose: (change: Partial<Of<K>['value']>) => void
  leave: () => void
  /** Sentence for a field of this thing, by its path inside the thing. */
  problemAt: (...path: (string | number)[]) => string | null
  /** What keeping this thing would break elsewhere. */
  elsewhere: string[]
  /** Drops what is typed and cannot be kept; null when nothing waits. */
  putBack: (() => void) | null
}

function keptValue(sheet: Sheet, kind: Thing['kind'], id: string | null): Thing['value'] {
  if (kind === 'facade') return sheet.facade
  if (kind === 'aspect') return { light: sheet.site.light, ...(sheet.site.facing !== undefined && { facing: sheet.site.facing }) }
  return listOf(sheet, kind).find((thing) => thing.id === id) as Thing['value']
}

const startsWith = (problem: Problem, start: readonly (string | number)[]) => start.every((step, i) => problem.path[i] === step)

/** The form of one thing on the sheet. `id` is null for what stands once. */
export function useThing<K extends Thing['kind']>(kind: K, id: string | null = null): ThingForm<K> {
  const { measuring, state } = useMeasure()
  const draft = state.drafts.get(`${kind}:${id ?? 'single'}`)
  const value = (draft?.thing.value ?? keptValue(state.sheet, kind, id)) as Of<K>['value']
  const start = pathOf(state.sheet, { kind, value } as Thing)
  const problems = draft?.problems ?? []
  const type = (change: Partial<Of<K>['value']>) => measuring.type({ kind, value: { ...value, ...change } } as Thing)
  return {
    value,
    type,
    choose: (change) => {
      type(change)
      measuring.leave()
    },
    leave: measuring.leave,
    problemAt: (...path) => problems.find((problem) => problem.path.join('.') === [...start, ...path].join('.'))?.message ?? null,
    elsewhere: problems.filter((problem) => !startsWith(problem, start)).map(({ message }) => message),
    putBack: draft && problems.length > 0 ? () => measuring.drop(draft.thing) : null,
  }
}

/** The thing just added or copied, so that its first field can take the focus. */
export function useFresh() {
  const [fresh, setFresh] = useState<string | null>(null)
  return { fresh, setFresh, focusRef: useCallback((element: HTMLElement | null) => element?.querySelector('input')?.focus(), []) }
}
