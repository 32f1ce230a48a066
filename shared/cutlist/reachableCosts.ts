import type { PackingProblem } from './sectionProblem'

/** Longer tables are not worth their memory; every whole number then counts as reachable. */
const longestTable = 4_000_000

/** Answers with the least cost, from a given one up, at which bars with enough room for all pieces can be bought. */
export type NextCost = (from: number) => number

/**
 * Builds that answer for costs of one bar of each offer. Stock limits are left out, so it is a bound:
 * no plan costs anything between `from` and the answer.
 */
export function reachableCosts(problem: PackingProblem, costs: readonly number[]): NextCost {
  const { sizes, offers } = problem
  const needed = sizes.reduce((sum, { width, demand }) => sum + width * demand, 0)
  const pieces = sizes.reduce((sum, { demand }) => sum + demand, 0)
  const bars = offers.map(({ capacity, available }, index) => ({
    room: Math.max(0, capacity),
    available: available ?? pieces,
    cost: costs[index] ?? 0,
  }))
  const free = bars.filter(({ cost }) => cost === 0)
  const paid = bars.filter(({ cost, room }) => cost > 0 && room > 0)
  /** The most room that bars of exactly this cost have; −1 where no bars cost it. */
  const rooms = [free.reduce((sum, { room, available }) => sum + room * available, 0)]
  const roomFor = (cost: number) => {
    for (let next = rooms.length; next <= cost; next++) rooms.push(mostRoom(rooms, paid, next))
    return rooms[cost] ?? -1
  }
  return (from) => {
    const least = Math.max(0, Math.ceil(from))
    if (paid.length === 0) return least === 0 && roomFor(0) >= needed ? 0 : Infinity
    for (let cost = least; cost < longestTable; cost++) if (roomFor(cost) >= needed) return cost
    return Math.max(least, longestTable)
  }
}

function mostRoom(
  rooms: readonly number[],
  paid: readonly { room: number; cost: number }[],
  cost: number,
) {
  let most = -1
  for (const bar of paid) {
    const before = rooms[cost - bar.cost] ?? -1
    if (before >= 0) most = Math.max(most, before + bar.room)
  }
  return most
}
