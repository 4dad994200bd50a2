/** How the facts of a plant are known, as it is entered and as it is kept. */
import { FACTS, type Fact } from './facts'
import type { PlantSource } from './types'

export const FROM_MEMORY = 'From memory'

interface Entered {
  sources: { title: string; url: string }[]
  memoryFacts: readonly Fact[]
}

/**
 * The sources kept for a plant: those read, which jointly stand for every fact that is not from memory, and last
 * one that says which are from memory. Without a source everything is from memory.
 */
export function plantSourcesOf({ sources, memoryFacts }: Entered): PlantSource[] {
  const recalled = FACTS.filter((fact) => sources.length === 0 || memoryFacts.includes(fact))
  const read = FACTS.filter((fact) => !recalled.includes(fact))
  const kept = sources.map(({ title, url }): PlantSource => ({ title, url, evidence: 'read', facts: read }))
  return recalled.length > 0 ? [...kept, { title: FROM_MEMORY, url: '', evidence: 'memory', facts: recalled }] : kept
}

/** The same as it was entered: the inverse of `plantSourcesOf`. */
export function enteredSourcesOf(sources: readonly PlantSource[]): { sources: { title: string; url: string }[]; memoryFacts: Fact[] } {
  const recalled = new Set(sources.filter(({ evidence }) => evidence === 'memory').flatMap(({ facts }) => facts))
  const read = sources.filter(({ evidence }) => evidence !== 'memory').map(({ title, url }) => ({ title, url }))
  return { sources: read, memoryFacts: read.length === 0 ? [] : FACTS.filter((fact) => recalled.has(fact)) }
}

/** How one fact is known: by the sources that stand for it, from memory, or not recorded. */
export function knownBy(fact: Fact, sources: readonly PlantSource[]): PlantSource[] {
  return sources.filter(({ facts }) => facts.includes(fact))
}
