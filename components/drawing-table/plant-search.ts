'use client'
/** The library, asked by name as one types. */
import { useQuery } from '@tanstack/react-query'
import { useEffect, useState } from 'react'
import type { ErrorBody } from '@/lib/errors'
import { plantSchema, type Plant } from '@/lib/plants'

const PAUSE_MS = 200

/** A value once it has stood still for a moment. */
export function useSettled<T>(value: T, ms = PAUSE_MS): T {
  const [settled, setSettled] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), ms)
    return () => clearTimeout(timer)
  }, [value, ms])
  return settled
}

const SHEET_FACTS = Object.keys(plantSchema.shape) as (keyof Plant)[]

/** The facts of a library plant that a sheet carries; the rest stays in the library. */
export function sheetPlant(found: Plant): Plant {
  return Object.fromEntries(SHEET_FACTS.map((fact) => [fact, found[fact]])) as unknown as Plant
}

async function search(text: string, signal: AbortSignal): Promise<Plant[]> {
  const response = await fetch(`/api/plants?q=${encodeURIComponent(text)}`, { signal })
  const body = (await response.json()) as Partial<ErrorBody> & { plants?: Plant[] }
  if (!response.ok || !body.plants) throw new Error(body.error?.message ?? 'The library cannot be reached just now.')
  return body.plants
}

/** Plants whose botanical or common name begins like what is typed; the first of the library for nothing typed. */
export function usePlantSearch(text: string) {
  const settled = useSettled(text.trim())
  return useQuery({
    queryKey: ['plants', settled],
    queryFn: ({ signal }) => search(settled, signal),
    staleTime: 60_000,
    retry: 1,
  })
}
