import { defineStore } from 'pinia'
import { ref, shallowRef } from 'vue'
import type { Build, BuildRow } from '../../shared/contracts/builds'
import * as api from '../api/builds'

/** The signed-in person's builds. */
export const useBuildsStore = defineStore('builds', () => {
  const rows = ref<BuildRow[]>([])
  const nextCursor = ref<string | null>(null)
  const build = shallowRef<Build | null>(null)

  async function loadRows() {
    const page = await api.fetchBuilds()
    rows.value = page.items
    nextCursor.value = page.nextCursor
    return page.items
  }
  async function loadMoreRows() {
    const page = await api.fetchBuilds(nextCursor.value)
    rows.value = [...rows.value, ...page.items]
    nextCursor.value = page.nextCursor
  }
  async function loadBuild(slug: string) {
    build.value = await api.fetchBuild(slug)
    return build.value
  }
  return { rows, nextCursor, build, loadRows, loadMoreRows, loadBuild }
})
