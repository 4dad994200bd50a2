/** A sheet on which ways out are tried: what it has against it now, and whether a change makes it better and nothing worse. */
import type { Plant } from '../../plants/types'
import { allFindings, tellOfPlacement, tellOfPlant } from '../judge'
import { growPlacement, growSheet, type Prepared } from '../prepared'
import { resolveStandards } from '../standards'
import type { Finding, FindingKind, Placement, Sheet } from '../types'

const BADNESS: Partial<Record<FindingKind, number>> = { conflict: 2, risk: 1 }
/** 2 for a conflict, 1 for a risk, 0 for all that a designer may leave as it is. */
const badness = (kind: FindingKind): number => BADNESS[kind] ?? 0

export class Trial {
  readonly prepared: Prepared
  /** How bad each conflict and risk of the sheet is, by key. */
  private readonly before: ReadonlyMap<string, number>

  constructor(readonly sheet: Sheet, findings?: readonly Finding[]) {
    this.prepared = growSheet(sheet, resolveStandards(sheet))
    const known = findings ?? allFindings(this.prepared)
    this.before = new Map(known.map(({ key, kind }) => [key, badness(kind)]))
  }

  /** Is it a conflict or risk that was not there before, a worse one, or the very one to be rid of? */
  private isRefusing({ key, kind }: Finding, unwanted: string): boolean {
    const bad = badness(kind)
    return bad > 0 && (key === unwanted || bad > (this.before.get(key) ?? 0))
  }

  /** Looks at size and neighbours of one placement alone, and stops at the first objection. */
  isRefused(plant: Plant, placement: Placement, unwanted: string): boolean {
    return tellOfPlacement(this.prepared, growPlacement(this.prepared, plant, placement), (finding) => this.isRefusing(finding, unwanted))
  }

  /** Has it no conflict and no risk of its own there, of size, neighbours and site? */
  isFreeOfFindings(plant: Plant, placement: Placement): boolean {
    const one = growPlacement(this.prepared, plant, placement)
    const isBad = ({ kind }: Finding) => badness(kind) > 0
    return !tellOfPlant(this.prepared, { plant, placements: [one] }, isBad) && !tellOfPlacement(this.prepared, one, isBad)
  }

  /** The whole check of the changed sheet: the finding is no conflict and no risk any more, and none came or grew worse. */
  isBetter(changed: Sheet, unwanted: string): boolean {
    return !allFindings(growSheet(changed, resolveStandards(changed))).some((finding) => this.isRefusing(finding, unwanted))
  }
}
