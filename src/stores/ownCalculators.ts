import { defineStore } from 'pinia'
import { ref, shallowRef } from 'vue'
import type {
  ChangeOwnCalculator,
  CopyableOwnCalculator,
  CopyOwnCalculator,
  OwnCalculator,
  OwnCalculatorDefinition,
  OwnCalculatorRow,
  OwnCalculatorVersion,
  OwnSnapshot,
} from '../../shared/contracts/ownCalculators'
import * as api from '../api/ownCalculators'

/** As many as one answer may hold; a course has fewer. */
const allAtOnce = 100

/** A course's own calculators, and the one that is being written. */
export const useOwnCalculatorsStore = defineStore('ownCalculators', () => {
  const rows = ref<OwnCalculatorRow[]>([])
  const nextCursor = ref<string | null>(null)
  const calculator = shallowRef<OwnCalculator | null>(null)
  const versions = ref<OwnCalculatorVersion[]>([])
  const nextVersion = ref<string | null>(null)
  const copyable = ref<CopyableOwnCalculator[]>([])
  const nextCopyable = ref<string | null>(null)
  /** The same for a repeated write, so that a lost line makes no second calculator. */
  let repeated: { body: string; key: string } | null = null

  function keyFor(input: unknown) {
    const body = JSON.stringify(input)
    if (repeated?.body !== body) repeated = { body, key: crypto.randomUUID() }
    return repeated.key
  }

  async function loadRows(courseId: number) {
    const page = await api.fetchOwnCalculators(courseId)
    rows.value = page.items
    nextCursor.value = page.nextCursor
    return page.items
  }
  async function loadMoreRows(courseId: number) {
    const page = await api.fetchOwnCalculators(courseId, nextCursor.value)
    rows.value = [...rows.value, ...page.items]
    nextCursor.value = page.nextCursor
  }
  async function create(courseId: number, definition: OwnCalculatorDefinition) {
    const made = await api.createOwnCalculator(
      courseId,
      { definition },
      keyFor([courseId, definition]),
    )
    repeated = null
    return made
  }
  async function copy(courseId: number, input: CopyOwnCalculator) {
    const made = await api.copyOwnCalculator(courseId, input, keyFor([courseId, input]))
    repeated = null
    return made
  }
  async function load(courseId: number, key: string) {
    calculator.value = await api.fetchOwnCalculator(courseId, key)
    return calculator.value
  }
  async function change(courseId: number, key: string, body: ChangeOwnCalculator) {
    const changed = await api.changeOwnCalculator(courseId, key, body)
    if (calculator.value?.key === key) calculator.value = changed
    return changed
  }
  const remove = (courseId: number, key: string) => api.deleteOwnCalculator(courseId, key)

  async function loadVersions(courseId: number, key: string) {
    const page = await api.fetchOwnVersions(courseId, key)
    versions.value = page.items
    nextVersion.value = page.nextCursor
    return page.items
  }
  async function loadMoreVersions(courseId: number, key: string) {
    const page = await api.fetchOwnVersions(courseId, key, nextVersion.value)
    versions.value = [...versions.value, ...page.items]
    nextVersion.value = page.nextCursor
  }
  async function loadCopyable(courseId: number) {
    const page = await api.fetchCopyable(courseId)
    copyable.value = page.items
    nextCopyable.value = page.nextCursor
    return page.items
  }
  async function loadMoreCopyable(courseId: number) {
    const page = await api.fetchCopyable(courseId, nextCopyable.value)
    copyable.value = [...copyable.value, ...page.items]
    nextCopyable.value = page.nextCursor
  }

  /** Those of a course that can be put in a stop. */
  async function listAttachable(courseId: number): Promise<OwnCalculatorRow[]> {
    const { items } = await api.fetchOwnCalculators(courseId, null, allAtOnce)
    return items.filter((row) => row.attachable !== null)
  }
  /** The newest version of a calculator, as an exercise holds it. */
  async function takeNewest(courseId: number, key: string): Promise<OwnSnapshot | null> {
    return (await api.fetchOwnCalculator(courseId, key)).attachable
  }
  return {
    rows,
    nextCursor,
    calculator,
    versions,
    nextVersion,
    copyable,
    nextCopyable,
    loadRows,
    loadMoreRows,
    create,
    copy,
    load,
    change,
    remove,
    loadVersions,
    loadMoreVersions,
    loadCopyable,
    loadMoreCopyable,
    listAttachable,
    takeNewest,
  }
})
