'use client'
/** The studio's whole library as the check reads it: fetched once, kept for as long as the table is open. */
import { useQuery } from '@tanstack/react-query'
import type { Plant } from '@/lib/plants'
import { ask } from './calls'

async function readLibrary(): Promise<Plant[]> {
  const answer = await ask<{ plants: Plant[] }>('/api/plants/library')
  if (!answer.ok) throw new Error(answer.message)
  return answer.value.plants
}

export function useLibrary() {
  return useQuery({ queryKey: ['library'], queryFn: readLibrary, staleTime: Infinity, retry: 1 })
}
