import { knownBy, type Fact, type LibraryPlant } from '@/lib/plants'
import { CARD, HEADING } from './parts'

const titlesFor = (fact: Fact, { sources }: LibraryPlant) =>
  knownBy(fact, sources).filter(({ evidence }) => evidence !== 'memory').map(({ title }) => title)

/** "Listed as toxic by A; B" after the sources read; "Held to be toxic, from memory" where there is none. */
function said(what: string, fact: Fact, plant: LibraryPlant): string {
  const titles = titlesFor(fact, plant)
  if (titles.length === 0) return `Held to be ${what}, from memory: no source was at hand`
  return `Listed as ${what} ${titles.length === 1 ? 'by' : 'jointly by'} ${titles.join('; ')}`
}

function cautionsOf(plant: LibraryPlant): string[] {
  const found: string[] = []
  if (plant.toxicity === 'toxic') found.push(`${said('toxic', 'toxicity', plant)}. Ask about children and animals before it is planted.`)
  if (plant.toxicity === 'irritant') found.push(`${said('an irritant', 'toxicity', plant)}. Wear gloves, and keep it from where people brush past.`)
  if (plant.thorns) found.push(`${said('thorny', 'thorns', plant)}. Keep it from walks, doors and play.`)
  if (plant.invasive) found.push(`${said('invasive in some part of the United States', 'invasive', plant)}. Look it up for the state, and whether it may be sold there, before it is specified.`)
  return found
}

/** What to mind about a plant. Silence is no proof of harmlessness, and that is said too. */
export function Cautions({ plant }: { plant: LibraryPlant }) {
  const found = cautionsOf(plant)
  return (
    <section className={CARD} aria-label="Before it is planted">
      <h2 className={HEADING}>Before it is planted</h2>
      {found.length > 0 && <ul className="mt-2 list-disc pl-5">{found.map((sentence) => <li key={sentence} className="py-1">{sentence}</li>)}</ul>}
      <p className="mt-2 max-w-prose text-ink-soft">
        {plant.toxicity === 'unlisted' ? 'Not listed as toxic or irritant here; absence from a list is not proof.' : 'Lists are not complete; absence from a list is not proof.'}
      </p>
    </section>
  )
}
