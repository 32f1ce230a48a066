import { useDebounceFn, useEventListener } from '@vueuse/core'
import { onBeforeUnmount, ref, shallowRef } from 'vue'
import type { CaptionTrack } from '../../shared/contracts/media'
import { asProblem } from '../api/client'
import {
  errorsByRow,
  readRows,
  renewRow,
  rowBetween,
  toRow,
  type CueErrors,
  type CueRow,
} from '../components/media/cueRows'
import { useBenchLessonsStore } from '../stores/benchLessons'
import { useMediaStore } from '../stores/media'
import type { SaveState } from './useSavedField'

const pauseMs = 1500
const keepMs = 400

interface KeptSheet {
  version: number
  rows: CueRow[]
}

/**
 * The captions of one language while they are edited: saved as a whole after a pause, kept on the
 * device until then. A list with something wrong in it is not sent; a list that somebody else changed
 * meanwhile waits for a decision.
 */
export function useCueSheet(trackId: number) {
  const media = useMediaStore()
  const lessons = useBenchLessonsStore()
  const storageKey = `gf-unsent:captions:${trackId}`
  const rows = shallowRef<CueRow[]>([])
  const errors = shallowRef(new Map<number, CueErrors>())
  const state = ref<SaveState>('idle')
  const savedAt = ref<Date | null>(null)
  const message = ref('')
  /** The version somebody else saved while these were edited. */
  const theirVersion = ref<number | null>(null)
  const takenOut = shallowRef<{ row: CueRow; index: number } | null>(null)
  let version = 0
  let edits = 0
  let isSending = false

  function keep() {
    const kept: KeptSheet = { version, rows: rows.value }
    try {
      localStorage.setItem(storageKey, JSON.stringify(kept))
    } catch {
      message.value =
        'This device has no room to keep the captions. Stay on this page until they are saved.'
    }
  }
  const keepSoon = useDebounceFn(keep, keepMs)

  function readKept(): KeptSheet | null {
    const text = localStorage.getItem(storageKey)
    return text === null ? null : (JSON.parse(text) as KeptSheet)
  }

  async function load() {
    const { track, cues } = await media.loadCues(trackId)
    const kept = readKept()
    version = kept?.version ?? track.version
    rows.value = kept ? kept.rows.map(renewRow) : cues.map(toRow)
    savedAt.value = new Date(track.savedAt)
    if (kept) changed()
    return track
  }

  async function save() {
    if (isSending || edits === 0 || theirVersion.value !== null) return
    const read = readRows(rows.value)
    errors.value = read.ok ? new Map<number, CueErrors>() : read.errors
    if (!read.ok) {
      refuse('the marked captions cannot be kept like this. All of it is kept on this device.')
      return
    }
    const sent = edits
    isSending = true
    state.value = 'saving'
    try {
      accept(await media.saveCues(trackId, version, read.cues), sent)
      if (edits > 0) void saveSoon()
    } catch (error) {
      take(error)
    } finally {
      isSending = false
    }
  }
  const saveSoon = useDebounceFn(save, pauseMs)

  function accept(track: CaptionTrack, sent: number) {
    version = track.version
    savedAt.value = new Date(track.savedAt)
    edits -= sent
    state.value = 'saved'
    message.value = ''
    if (edits === 0) localStorage.removeItem(storageKey)
    else keep()
    void lessons.refresh().catch(() => undefined)
  }
  function refuse(words: string) {
    state.value = 'refused'
    message.value = words
  }
  function take(error: unknown) {
    const problem = asProblem(error)
    const current = problem.problem.current as CaptionTrack | undefined
    if (problem.status === 409 && current) {
      theirVersion.value = current.version
      refuse('somebody else saved these captions meanwhile.')
    } else if (problem.isOffline) state.value = 'offline'
    else refuse(problem.message)
    errors.value = errorsByRow(rows.value, problem.errors)
  }

  function changed() {
    edits++
    void keepSoon()
    void saveSoon()
  }
  function put(list: CueRow[]) {
    rows.value = list
    changed()
  }
  const change = (id: number, part: Partial<CueRow>) =>
    put(rows.value.map((row) => (row.id === id ? { ...row, ...part } : row)))
  /** An empty caption after the row of this index; -1 puts it first. Returns its row. */
  function addAfter(index: number): CueRow {
    const row = rowBetween(rows.value[index], rows.value[index + 1])
    put(rows.value.toSpliced(index + 1, 0, row))
    return row
  }
  function takeOut(index: number) {
    const row = rows.value[index]
    if (!row) return
    takenOut.value = { row, index }
    put(rows.value.toSpliced(index, 1))
  }
  function putBack() {
    const out = takenOut.value
    if (!out) return
    takenOut.value = null
    put(rows.value.toSpliced(out.index, 0, out.row))
  }
  /** What was typed here takes the place of theirs. */
  async function keepMine() {
    version = theirVersion.value ?? version
    theirVersion.value = null
    await save()
  }
  /** Theirs are shown; what was typed here is thrown away. */
  async function takeTheirs() {
    localStorage.removeItem(storageKey)
    theirVersion.value = null
    edits = 0
    errors.value = new Map()
    state.value = 'idle'
    await load()
  }
  useEventListener(window, 'online', () => void save())
  onBeforeUnmount(() => {
    if (edits === 0) return
    keep()
    void save()
  })
  return {
    ...{ rows, errors, state, savedAt, message, theirVersion, takenOut },
    ...{ load, change, addAfter, takeOut, putBack, keepMine, takeTheirs, saveNow: save },
  }
}
