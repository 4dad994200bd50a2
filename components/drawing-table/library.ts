'use client'
/** The studio's whole library as the check reads it: fetched once, kept for as long as the table is open. */
import { useQuery } from '@tanstack/react-query'
import type { Plant } from '@/lib/plants'
import { ask } from './calls'

export interface Library {
  plants: Plant[]
  fruits: Record<string, { color: string; months: number[] }>
}

async function readLibrary(): Promise<Library> {
  const answer = await ask<Library>('/api/plants/library')
  if (!answer.ok) throw new Error(answer.message)
  return answer.value
}

export function useLibrary() {
  return useQuery({ queryKey: ['library'], queryFn: readLibrary, staleTime: Infinity, retry: 1 })
}
