import { defineStore } from 'pinia'
import { ref, shallowRef } from 'vue'
import type { Sheet, SheetSummary } from '../../shared/contracts/courses'
import * as api from '../api/courses'

export interface RegisterFilter {
  weekends: number | null
  cover: string | null
}

/** The register as far as it was fetched, and the sheets that were opened. */
export const useCoursesStore = defineStore('courses', () => {
  const register = ref<SheetSummary[]>([])
  const nextCursor = ref<string | null>(null)
  const sheet = shallowRef<Sheet | null>(null)

  async function loadRegister(filter: RegisterFilter) {
    const page = await api.fetchRegister({ ...filter })
    register.value = page.items
    nextCursor.value = page.nextCursor
    return page.items
  }
  async function loadMore(filter: RegisterFilter) {
    const page = await api.fetchRegister({ ...filter, cursor: nextCursor.value })
    register.value = [...register.value, ...page.items]
    nextCursor.value = page.nextCursor
  }
  async function loadSheet(slug: string) {
    sheet.value = await api.fetchSheet(slug)
    return sheet.value
  }
  const enrol = (slug: string) => api.enrol(slug)

  return { register, nextCursor, sheet, loadRegister, loadMore, loadSheet, enrol }
})
