'use client'

import { useState } from 'react'
import { FacadeDrawing } from './facade-drawing'
import { PlantCard } from './plant-card'
import { plantFacts } from './plant-facts'
import { TimeControls } from './time-controls'
import { SEASON_MONTHS, hrefOf, type Shown } from './view-state'
import type { ClientFacade } from './types'

interface Props {
  facades: ClientFacade[]
  shown: Shown
}

/** The house fronts of a project through years and seasons. Drawn on the server for the address asked for, then at hand. */
export function ClientGarden({ facades, shown: first }: Props) {
  const [shown, setShown] = useState(first)
  const show = (next: Shown) => {
    setShown(next)
    // The address follows, so that what is shown can be sent on or reloaded.
    window.history.replaceState(null, '', hrefOf(next))
  }
  return (
    <>
      {facades.map((facade, index) => (
        <section key={facade.id} aria-labelledby={`front-${index}-name`}>
          <div className="bg-sheet px-3 pt-4 pb-2">
            <h2 id={`front-${index}-name`} className="px-1 font-heading text-2xl">{facade.name}</h2>
            <FacadeDrawing facade={facade} index={index} shown={shown} onPart={(part) => show({ ...shown, part })} />
          </div>
          <FacadePlants facade={facade} index={index} shown={shown} />
        </section>
      ))}
      <TimeControls shown={shown} onChange={show} />
    </>
  )
}

function FacadePlants({ facade, index, shown }: { facade: ClientFacade; index: number; shown: Shown }) {
  const plants = plantFacts(facade.sheet)
  if (plants.length === 0) {
    return <p className="border-t border-rule px-4 py-4">No plants are drawn here yet. They will stand in this list, with their sizes and their months of flower.</p>
  }
  return (
    <ul aria-label={`Plants of ${facade.name}`}>
      {plants.map((facts) => (
        <PlantCard key={facts.plant.id} facts={facts} sheet={facade.sheet} year={shown.year} month={SEASON_MONTHS[shown.season]} name={`card-${index}-${facts.key}`} />
      ))}
    </ul>
  )
}
