/** One entry of a column of the matrix. */
export interface Entry {
  row: number
  value: number
}
/** What the sum of a row may be; Infinity where there is no limit. */
export interface RowBounds {
  lower: number
  upper: number
}
/** One unknown, from zero up. */
export interface Column {
  cost: number
  upper: number
  entries: readonly Entry[]
}

/** A linear program that grows by columns and starts again from its last answer. */
export interface GrowingProgram {
  addColumn: (column: Column) => void
  setRow: (row: number, bounds: RowBounds) => void
  /** Null where it was stopped or failed. */
  solve: () => LinearAnswer | null
  close: () => void
}
/** The least cost, the unknowns, and the price of each row. */
export interface LinearAnswer {
  cost: number
  columns: Float64Array
  rowPrices: Float64Array
}

/** Least cost in whole numbers. */
export interface IntegerProgram {
  rows: readonly RowBounds[]
  columns: readonly Column[]
}
/** When to leave off. */
export interface IntegerLimits {
  /** A solution of this cost is good enough. */
  target: number
  mostNodes: number
}
/** How the search ended: a bound on the cost, and the best unknowns if any, not yet rounded. */
export interface IntegerAnswer {
  isInfeasible: boolean
  /** No solution costs less; −Infinity where nothing is known. */
  bound: number
  columns: Float64Array | null
}

/** What the search needs of a solver of linear programs; handed in, so that this folder loads none. */
export interface LpSolver {
  open: (rows: readonly RowBounds[]) => GrowingProgram
  solveInteger: (program: IntegerProgram, limits: IntegerLimits) => IntegerAnswer
}

/** When the search has to end. */
export interface Deadline {
  /** Milliseconds left; zero or less when time is up or somebody has cancelled. */
  millisecondsLeft: () => number
}
