import type { CutBar, CutList } from '../../../shared/cutlist/cutList'

/** Equal pieces that follow each other on a bar. */
export interface CutRun {
  label: string
  lengthMm: number
  count: number
}

/** Bars that are cut alike. */
export interface CutGroup {
  section: string
  stockMm: number
  bars: number
  runs: CutRun[]
  offcutMm: number
}

function gatherRuns({ cuts }: CutBar): CutRun[] {
  const runs: CutRun[] = []
  for (const { label, lengthMm } of cuts) {
    const last = runs.at(-1)
    if (last?.label === label && last.lengthMm === lengthMm) last.count += 1
    else runs.push({ label, lengthMm, count: 1 })
  }
  return runs
}

/** The bars of a list by section, those with the same pieces of the same length of stock as one. */
export function gatherCutGroups({ bars }: Pick<CutList, 'bars'>): CutGroup[] {
  const groups = new Map<string, CutGroup>()
  for (const bar of bars) {
    const { section, stock, offcutMm } = bar
    const runs = gatherRuns(bar)
    const key = JSON.stringify([section, stock.lengthMm, runs])
    const group = groups.get(key)
    if (group) group.bars += 1
    else groups.set(key, { section, stockMm: stock.lengthMm, bars: 1, runs, offcutMm })
  }
  return [...groups.values()]
}
