import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { BotanicalName } from '@/components/plants/botanical-name'
import { Cautions } from '@/components/plants/cautions'
import { FactList, SourceList } from '@/components/plants/fact-list'
import { MonthsStrip } from '@/components/plants/months-strip'
import { plantSourcesOf, type LibraryPlant, type PlantInput } from '@/lib/plants'
import { plantInput } from '../../lib/plants/sample'

function plantWith(changed: Partial<PlantInput>): LibraryPlant {
  const { sources, memoryFacts, ...facts } = plantInput(changed)
  return { ...facts, id: 'p', studioId: null, sources: plantSourcesOf({ sources, memoryFacts }) }
}

const textOf = (element: React.ReactElement) => renderToStaticMarkup(element).replace(/<[^>]+>/g, ' ').replace(/&#x27;/g, "'").replace(/&quot;/g, '"').replace(/\s+/g, ' ')

describe('a botanical name', () => {
  it('sets the cultivar upright in single quotation marks, apostrophes inside it and all', () => {
    const html = renderToStaticMarkup(<BotanicalName name="Gardenia jasminoides 'Kleim's Hardy'" />)
    expect(html).toContain('<span class="not-italic">‘Kleim&#x27;s Hardy’</span>')
    expect(renderToStaticMarkup(<BotanicalName name="Acer griseum" />)).toBe('<span class="botanical">Acer griseum</span>')
  })
})

describe('how facts are known', () => {
  it('is said for every fact: jointly by the sources, or from memory', () => {
    const text = textOf(<FactList plant={plantWith({})} />)
    expect(text).toContain(`Mature height 3'-0" to 4'-0" sources 1 to 2, jointly`)
    expect(text).toContain('Growth Slow from memory')
    expect(textOf(<SourceList plant={plantWith({})} />)).toContain('ascribed to them jointly')
  })

  it('names both where the two ends of a range are known differently', () => {
    expect(textOf(<FactList plant={plantWith({ memoryFacts: ['spread_max'] })} />)).toContain('smallest spread: sources 1 to 2, jointly largest spread: from memory')
  })

  it('says so where no source is on record', () => {
    const plant = plantWith({ sources: [], memoryFacts: [] })
    expect(textOf(<SourceList plant={plant} />)).toContain('No source is on record')
    expect(textOf(<FactList plant={plant} />)).not.toMatch(/source \d|jointly/)
  })
})

describe('cautions', () => {
  it('name who lists the plant, and never take silence for proof', () => {
    expect(textOf(<Cautions plant={plantWith({})} />)).toContain('Listed as toxic jointly by A grower; A garden.')
    expect(textOf(<Cautions plant={plantWith({ memoryFacts: ['toxicity'] })} />)).toContain('Held to be toxic, from memory')
    const plain = textOf(<Cautions plant={plantWith({ toxicity: 'unlisted' })} />)
    expect(plain).toContain('absence from a list is not proof')
    expect(plain).not.toContain('Listed as')
  })

  it('tell of thorns and of invasive kinds', () => {
    const text = textOf(<Cautions plant={plantWith({ thorns: true, invasive: true })} />)
    expect(text).toContain('thorny')
    expect(text).toContain('invasive')
  })
})

it('the months say in words what their cells show', () => {
  const text = textOf(<MonthsStrip plant={plantWith({ fallColor: 'red' })} />)
  expect(text.match(/white/g)).toHaveLength(2)
  expect(text.match(/black/g)).toHaveLength(6)
  expect(text.match(/red/g)).toHaveLength(2)
})
