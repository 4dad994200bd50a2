import { NothingHere } from '@/components/shell/nothing-here'

/** As at the front, under the studio's header. */
export default function StudioNotFound() {
  return <NothingHere />
}
