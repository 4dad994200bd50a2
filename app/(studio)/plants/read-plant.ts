import { notFound } from 'next/navigation'
import { AppError } from '@/lib/errors'
import type { LibraryPlant } from '@/lib/plants'
import type { Context } from '@/lib/server/context'
import { getPlant } from '@/lib/server/plants/get-plant'

/** The plant of a page, or the page of what is not there. */
export function readPlant(context: Context, plantId: string): LibraryPlant {
  try {
    return getPlant(context, { plantId })
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') notFound()
    throw error
  }
}
