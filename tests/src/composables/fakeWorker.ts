import type { AsideQuestion } from '../../../src/composables/asideThread'
import type { Exercise } from '../../../shared/contracts/exercises'
import { findExerciseProblems } from '../../../shared/grading'
import { performFormulaTask, type FormulaTask } from '../../../shared/ownCalculators/tasks'

type Listener = (event: { data: unknown }) => void

/** Stands for the browser's worker, which happy-dom does not have: the same work, told by the same words. */
export class FakeWorker {
  static opened: FakeWorker[] = []
  /** What the workers do with a task; a test may let them spin or break. */
  static behaviour: 'works' | 'spins' | 'breaks' = 'works'
  isEnded = false
  tasks: unknown[] = []
  private listeners: Record<string, Listener[]> = {}

  constructor() {
    FakeWorker.opened.push(this)
    const { behaviour } = FakeWorker
    setTimeout(() => (behaviour === 'breaks' ? this.emit('error', null) : this.tell('ready')))
  }
  static reset() {
    FakeWorker.opened = []
    FakeWorker.behaviour = 'works'
  }
  addEventListener(kind: string, listener: Listener) {
    ;(this.listeners[kind] ??= []).push(listener)
  }
  postMessage({ id, task }: AsideQuestion<FormulaTask | Exercise>) {
    this.tasks.push(structuredClone(task))
    const isSpinning = FakeWorker.behaviour === 'spins'
    setTimeout(() => {
      this.tell({ taken: id })
      const found = () => ('name' in task ? performFormulaTask(task) : findExerciseProblems(task))
      if (!isSpinning) this.tell({ done: id, found: found() })
    })
  }
  terminate() {
    this.isEnded = true
  }
  private tell(data: unknown) {
    this.emit('message', data)
  }
  private emit(kind: string, data: unknown) {
    for (const listener of this.listeners[kind] ?? []) listener({ data })
  }
}
