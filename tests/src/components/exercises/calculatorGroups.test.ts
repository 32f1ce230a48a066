import { describe, expect, it } from 'vitest'
import { calculators } from '../../../../shared/calculators'
import { calculatorGroups, findListed } from '../../../../src/components/exercises/calculatorGroups'

describe('the list of calculators', () => {
  it('shows every calculator once, and the cut list', () => {
    const listed = calculatorGroups.flatMap(({ ids }) => ids)
    expect([...listed].sort()).toEqual([...calculators.map(({ id }) => id), 'cutlist'].sort())
  })

  it('knows the words of all that it shows', () => {
    for (const id of calculatorGroups.flatMap(({ ids }) => ids)) {
      expect(findListed(id), id).toMatchObject({ id })
    }
  })
})
