import { describe, expect, it } from 'vitest'
import { calculators } from '../../../../shared/calculators'
import { calculatorGroups, findListed } from '../../../../src/components/exercises/calculatorGroups'

describe('the list of calculators', () => {
  it('knows every id of its groups, and every calculator has a place', () => {
    const ids = calculatorGroups.flatMap((group) => group.ids)
    for (const id of ids) expect(findListed(id)?.id).toBe(id)
    expect(ids).toContain('cutlist')
    for (const { id } of calculators) expect(ids).toContain(id)
  })
})
