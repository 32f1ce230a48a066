import { defineStore } from 'pinia'
import { ref, shallowRef } from 'vue'
import type { Build, BuildRow, PutInFieldBook } from '../../shared/contracts/builds'
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
  /** One key for one entry, kept until the server has taken it, so that a repeat counts once. */
  let unsent: { body: string; key: string } | null = null

  /** Puts a number into the field book of one's build. */
  async function keepEntry(slug: string, entry: PutInFieldBook) {
    const body = JSON.stringify([slug, entry])
    if (unsent?.body !== body) unsent = { body, key: crypto.randomUUID() }
    await api.putInFieldBook(slug, entry, unsent.key)
    unsent = null
  }
  return { rows, nextCursor, build, keepEntry, loadRows, loadMoreRows, loadBuild }
})
