import { FACT_LABELS, factGroups, knownBy, type Fact, type FactLine, type LibraryPlant, type PlantSource } from '@/lib/plants'
import { CARD, HEADING } from './parts'

const isRead = ({ evidence }: PlantSource) => evidence !== 'memory'

/** How one fact is known, in a few words: numbers are those of the list of sources. */
function knownText(fact: Fact, sources: readonly PlantSource[], read: readonly PlantSource[]): string {
  const by = knownBy(fact, sources)
  if (by.some(isRead)) {
    const numbers = by.filter(isRead).map((source) => read.indexOf(source) + 1)
    return numbers.length === 1 ? `source ${numbers[0]}` : `sources ${numbers[0]} to ${numbers.at(-1)}, jointly`
  }
  return by.length > 0 ? 'from memory' : 'not recorded'
}

/** How the facts of a line are known: once where all are known alike, else fact by fact. */
function evidenceOf({ facts }: FactLine, sources: readonly PlantSource[], read: readonly PlantSource[]): string[] {
  const texts = facts.map((fact) => knownText(fact, sources, read))
  return new Set(texts).size === 1 ? [texts[0]!] : facts.map((fact, i) => `${FACT_LABELS[fact].toLowerCase()}: ${texts[i]}`)
}

/** Every fact of a plant with how it is known. */
export function FactList({ plant }: { plant: LibraryPlant }) {
  const read = plant.sources.filter(isRead)
  return (
    <div className="grid grid-cols-1 gap-4 lg:grid-cols-2">
      {factGroups(plant).map(({ title, lines }) => (
        <section key={title} className={CARD} aria-label={title}>
          <h2 className={HEADING}>{title}</h2>
          <table className="mt-2 w-full border-collapse text-left">
            <thead className="sr-only"><tr><th scope="col">Fact</th><th scope="col">Value</th><th scope="col">How it is known</th></tr></thead>
            <tbody>
              {lines.map((line) => (
                <tr key={line.label} className="border-t border-rule align-top">
                  <th scope="row" className="w-36 py-2 pr-3 font-normal text-ink-soft">{line.label}</th>
                  <td className="py-2 pr-3">{line.value}</td>
                  <td className="w-36 py-2 text-sm text-ink-soft">{evidenceOf(line, plant.sources, read).map((text) => <span key={text} className="block">{text}</span>)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </section>
      ))}
    </div>
  )
}

/** Where the facts were read, numbered as the facts refer to them. */
export function SourceList({ plant }: { plant: LibraryPlant }) {
  const read = plant.sources.filter(isRead)
  return (
    <section className={CARD} aria-label="Sources">
      <h2 className={HEADING}>Sources</h2>
      {read.length === 0 && <p className="mt-2">No source is on record for this plant: its facts are from memory.</p>}
      {read.length > 1 && <p className="mt-2 max-w-prose">These were read together. Which of them carries which fact was not written down, so facts are ascribed to them jointly.</p>}
      <ol className="mt-2 list-decimal pl-6">
        {read.map(({ title, url, evidence }) => (
          <li key={`${title} ${url}`} className="py-1 break-words">
            {url ? <a href={url} rel="noreferrer noopener" target="_blank" className="inline-block min-h-11 py-2 underline underline-offset-4">{title}<span className="sr-only"> (opens in a new tab)</span></a> : title}
            {evidence === 'practice' && ' (common practice)'}
          </li>
        ))}
      </ol>
      <p className="mt-2 max-w-prose text-ink-soft">Facts marked “from memory” were entered without a source at hand: look them up before much rests on them.</p>
    </section>
  )
}
