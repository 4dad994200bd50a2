import type { Metadata } from 'next'
import { NothingHere } from '@/components/shell/nothing-here'

export const metadata: Metadata = { title: 'Nothing here' }

export default function NotFound() {
  return <NothingHere />
}
