import { describe, expect, it } from 'vitest'
import { reachableCosts } from '../../../shared/cutlist/reachableCosts'

const offer = (capacity: number, available: number | null = null) => ({
  capacity,
  cost: 0,
  length: 0,
  available,
})
const sizes = [{ width: 10, demand: 5 }]

describe('reachableCosts', () => {
  it('answers with the least cost of bars that have room for all pieces', () => {
    const next = reachableCosts({ sizes, offers: [offer(20), offer(30)] }, [4, 7])
    // 50 wide: 20 + 30 for 11; 30 + 30 would cost 14, 20 + 20 + 20 would cost 12.
    expect([0, 11, 12, 13, 14].map(next)).toEqual([11, 11, 12, 14, 14])
  })

  it('counts bars that cost nothing as far as there are any', () => {
    expect(reachableCosts({ sizes, offers: [offer(20), offer(30, 1)] }, [4, 0])(0)).toBe(4)
    expect(reachableCosts({ sizes, offers: [offer(20), offer(30)] }, [4, 0])(0)).toBe(0)
    expect(reachableCosts({ sizes, offers: [offer(30, 1)] }, [0])(0)).toBe(Infinity)
  })
})
