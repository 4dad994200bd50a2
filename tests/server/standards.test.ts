import { beforeEach, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { facades, findings } from '@/db/schema'
import { getStandards } from '@/lib/server/standards/get-standards'
import { saveStandards } from '@/lib/server/standards/save-standards'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { AppError } from '@/lib/errors'
import { addStudios, contextOf, NOW, placementAt, put, type Who } from '../support/actors'
import { openTestDatabase } from '../support/database'

let db: Db
beforeEach(() => {
  db = openTestDatabase()
  addStudios(db)
})
const as = (who: Who) => contextOf(db, who, NOW)

function refusal(work: () => unknown): AppError {
  try {
    work()
  } catch (error) {
    return error as AppError
  }
  throw new Error('Nothing was refused')
}

const rules = (facadeId: string) => db.select().from(findings).where(eq(findings.facadeId, facadeId)).all().map(({ rule }) => rule)

describe('the standards of a studio', () => {
  it('are none until somebody sets them, and those of one studio alone', () => {
    expect(getStandards(as('designer')).values).toEqual({})
    saveStandards(as('owner'), { values: { 'wall-gap.gap': 18, 'downspout.kind': 'off' }, opened: {} })
    expect(getStandards(as('reviewer')).values).toEqual({ 'wall-gap.gap': 18, 'downspout.kind': 'off' })
    expect(getStandards(as('stranger')).values).toEqual({})
  })

  it('are set by the owner alone', () => {
    for (const who of ['designer', 'reviewer', 'estimator'] as const) expect(refusal(() => saveStandards(as(who), { values: {}, opened: {} })).code).toBe('forbidden')
    expect(refusal(() => getStandards(as('client'))).code).toBe('forbidden')
  })

  it('change what every facade is found to break, at once, and stand beside the findings', () => {
    saveEdits(as('designer'), { facadeId: 'facade-a', base: 0, editor: 'e', edits: [put(1, placementAt('p1', 200, { y: 20 }))] })
    expect(rules('facade-a')).toContain('wall-gap')
    expect(saveStandards(as('owner'), { values: { 'wall-gap.gap': 0 }, opened: {} }).checked).toBeGreaterThan(1)
    const stored = rules('facade-a').filter((rule) => rule === 'wall-gap').length
    const { sheet, report } = getSheet(as('designer'), { facadeId: 'facade-a' })
    expect(sheet.standards).toEqual({ 'wall-gap.gap': 0 })
    expect(report.findings.filter(({ rule }) => rule === 'wall-gap')).toHaveLength(stored)
    expect(report.findings.filter(({ rule }) => rule === 'wall-gap').every(({ limit }) => limit === 0)).toBe(true)
    expect(db.select().from(facades).where(eq(facades.id, 'facade-a')).get()!.standards).toEqual({ 'wall-gap.gap': 0 })
  })

  it('are refused by name when they are out of range or unknown, and nothing is changed', () => {
    const refused = refusal(() => saveStandards(as('owner'), { values: { 'wall-gap.gap': 500, 'sill.kind': 'off', nonsense: 1 }, opened: {} }))
    expect(refused.code).toBe('invalid')
    expect(refused.problems?.map(({ path }) => path[0])).toEqual(['wall-gap.gap', 'sill.kind', 'nonsense'])
    expect(getStandards(as('owner')).values).toEqual({})
  })

  it('are not written over what somebody else set meanwhile', () => {
    saveStandards(as('owner'), { values: { 'wall-gap.gap': 18 }, opened: {} })
    expect(refusal(() => saveStandards(as('owner'), { values: { 'sill.margin': 6 }, opened: {} })).code).toBe('conflict')
    expect(getStandards(as('owner')).values).toEqual({ 'wall-gap.gap': 18 })
    saveStandards(as('owner'), { values: {}, opened: { 'wall-gap.gap': 18 } })
    expect(getStandards(as('owner')).values).toEqual({})
  })
})
