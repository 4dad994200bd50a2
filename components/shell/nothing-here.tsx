import { LinkButton } from '@/components/ui'

/** What stands at an address that leads nowhere, or to what is not this person's to see: the same words for both. */
export function NothingHere() {
  return (
    <main className="mx-auto max-w-xl px-5 py-10">
      <h1 className="font-heading text-3xl leading-tight">There is nothing here</h1>
      <p className="mt-3">The address may be mistyped, the thing may be gone, or it is not yours to see.</p>
      <LinkButton href="/" variant="primary" className="mt-5">Go to the start</LinkButton>
    </main>
  )
}
