/** The stages a project goes through, in order; `returned` is the way back from review. */
export const STAGES = ['draft', 'in-review', 'returned', 'approved', 'proposed', 'accepted', 'planted'] as const
export type Stage = (typeof STAGES)[number]

/** The stage as people say it. */
export const STAGE_WORDS: Record<Stage, string> = {
  draft: 'Draft',
  'in-review': 'In review',
  returned: 'Returned',
  approved: 'Approved',
  proposed: 'Proposed',
  accepted: 'Accepted',
  planted: 'Planted',
}

export * from './schema'
export * from './form'
export * from './words'
