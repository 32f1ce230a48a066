import type { Highs, Model } from 'highs'
import type {
  Deadline,
  Entry,
  GrowingProgram,
  IntegerAnswer,
  IntegerLimits,
  IntegerProgram,
  LpSolver,
  RowBounds,
} from './lpSolver'

/** Solves linear and integer programs with HiGHS, which the caller has loaded, until the deadline. */
export function highsSolver(highs: Highs, deadline: Deadline): LpSolver {
  return {
    open: (rows) => openProgram(highs, deadline, rows),
    solveInteger: (program, limits) => {
      const model = highs.createModel()
      try {
        return solveInteger(highs, model, deadline, program, limits)
      } finally {
        model.dispose()
      }
    },
  }
}

const boundOf = (highs: Highs, bound: number) =>
  Number.isFinite(bound) ? bound : Math.sign(bound) * highs.infinity

const sparse = (entries: readonly Entry[]) => ({
  indices: entries.map(({ row }) => row),
  values: entries.map(({ value }) => value),
})

const secondsLeft = (deadline: Deadline) => Math.max(0, deadline.millisecondsLeft()) / 1000

function addRows(highs: Highs, model: Model, rows: readonly RowBounds[]) {
  for (const { lower, upper } of rows) {
    model.addRow(boundOf(highs, lower), boundOf(highs, upper), { indices: [], values: [] })
  }
}

function openProgram(highs: Highs, deadline: Deadline, rows: readonly RowBounds[]): GrowingProgram {
  const model = highs.createModel()
  model.options.set({ output_flag: false, presolve: 'off', solver: 'simplex' })
  addRows(highs, model, rows)
  return {
    addColumn: ({ cost, upper, entries }) =>
      void model.addCol(cost, 0, boundOf(highs, upper), sparse(entries)),
    setRow: (row, { lower, upper }) =>
      void model.changeRowBounds(row, boundOf(highs, lower), boundOf(highs, upper)),
    solve: () => {
      if (deadline.millisecondsLeft() <= 0) return null
      model.zeroAllClocks()
      model.options.set('time_limit', secondsLeft(deadline))
      model.run()
      if (model.getModelStatus() !== highs.constants.modelStatus.optimal) return null
      const { colValue, rowDual } = model.getSolution()
      return { cost: model.getObjectiveValue(), columns: colValue, rowPrices: rowDual }
    },
    close: () => model.dispose(),
  }
}

function passProgram(highs: Highs, model: Model, { rows, columns }: IntegerProgram) {
  const starts = [0]
  for (const { entries } of columns) starts.push((starts.at(-1) ?? 0) + entries.length)
  const entries = columns.flatMap((column) => column.entries)
  model.passModel({
    numCols: columns.length,
    numRows: rows.length,
    colCost: columns.map(({ cost }) => cost),
    colLower: columns.map(() => 0),
    colUpper: columns.map(({ upper }) => boundOf(highs, upper)),
    rowLower: rows.map(({ lower }) => boundOf(highs, lower)),
    rowUpper: rows.map(({ upper }) => boundOf(highs, upper)),
    integrality: columns.map(() => highs.constants.variableType.integer),
    matrix: {
      format: 'csc',
      numRows: rows.length,
      numCols: columns.length,
      starts,
      ...sparse(entries),
    },
  })
}

function solveInteger(
  highs: Highs,
  model: Model,
  deadline: Deadline,
  program: IntegerProgram,
  limits: IntegerLimits,
): IntegerAnswer {
  const unknown: IntegerAnswer = { isInfeasible: false, bound: -Infinity, columns: null }
  if (deadline.millisecondsLeft() <= 0) return unknown
  model.options.set({
    output_flag: false,
    // Costs are whole numbers: once less than one is between bound and solution, it is the best.
    mip_rel_gap: 0,
    mip_abs_gap: 0.99,
    mip_max_nodes: limits.mostNodes,
    objective_target: limits.target + 0.01,
    time_limit: secondsLeft(deadline),
  })
  passProgram(highs, model, program)
  model.run({
    [highs.constants.callbackType.mipInterrupt](event) {
      if (deadline.millisecondsLeft() <= 0) event.interrupt()
      return undefined
    },
  })
  const { modelStatus } = highs.constants
  const status = model.getModelStatus()
  if (status === modelStatus.infeasible) return { ...unknown, isInfeasible: true }
  const isFound = model.info.get('primal_solution_status') === 2
  const bound = Number(model.info.get('mip_dual_bound'))
  return {
    isInfeasible: false,
    bound: Number.isFinite(bound) && Math.abs(bound) < highs.infinity ? bound : -Infinity,
    columns: isFound ? model.getSolution().colValue : null,
  }
}
