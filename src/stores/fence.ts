import { defineStore } from 'pinia'
import { computed, ref, shallowRef, watch } from 'vue'
import type {
  CatchUp,
  ChangeAnswer,
  ChangeQuestion,
  FenceEvent,
  QuestionRow,
  Thread,
  Writer,
} from '../../shared/contracts/fence'
import type { Room } from '../../shared/contracts/socketEvents'
import * as api from '../api/fence'
import { useFenceLine } from '../composables/useFenceLine'
import { useFencePosts } from '../composables/useFencePosts'
import { useFenceThreads } from '../composables/useFenceThreads'
import { useAccountsStore } from './accounts'

export type { QuestionFilter } from '../api/fence'

const isSame = (a: Room | null, b: Room | null) =>
  a?.courseSlug === b?.courseSlug && a?.lessonKey === b?.lessonKey

/** The lesson's room that is open, live; the questions of a course; and what is on its way over the fence. */
export const useFenceStore = defineStore('fence', () => {
  const accounts = useAccountsStore()
  const room = shallowRef<Room | null>(null)
  const isLoaded = ref(false)
  const can = ref({ write: false, settleAny: false })
  /** The last change that somebody else made, to be said politely. */
  const news = shallowRef<FenceEvent | null>(null)
  const rows = ref<QuestionRow[]>([])
  const nextCursor = ref<string | null>(null)
  let listed: { slug: string; filter: api.QuestionFilter } | null = null

  const threads = useFenceThreads()
  const me = computed(() => accounts.me?.id ?? null)
  const posts = useFencePosts(
    () => `gf-fence-posts:${me.value ?? 'visitor'}`,
    (thread) => takeThread(thread),
  )
  const line = useFenceLine({
    lastNumber: () => threads.lastNumber.value,
    takeEvent(event) {
      const taken = threads.takeEvent(event)
      if (taken === 'new') hear([event])
      return taken
    },
    takeCatchUp,
  })

  async function takeCatchUp(missed: CatchUp) {
    const fresh = threads.takeCatchUp(missed)
    if (fresh) hear(fresh)
    else if (room.value) await readRoom(room.value).catch(waitForNextReading)
  }
  /** A reading that failed is made good by the next poll or change. */
  const waitForNextReading = () => undefined
  function hear(events: FenceEvent[]) {
    for (const { kind, thread } of events) {
      if (kind === 'asked') addRow(thread)
      updateRow(thread)
    }
    news.value = events.at(-1) ?? news.value
  }
  function updateRow(thread: Thread) {
    rows.value = rows.value
      .filter((row) => row.id !== thread.id || !thread.isDeleted)
      .map((row) => (row.id === thread.id ? { ...row, ...thread } : row))
  }
  /** Puts a new question on top of the list, when it belongs there by its filter. */
  function addRow(thread: Thread) {
    const sibling = rows.value.find((row) => row.lessonKey === thread.lessonKey)
    const isListed = rows.value.some((row) => row.id === thread.id)
    if (!sibling || isListed || thread.isDeleted || listed?.slug !== thread.courseSlug) return
    const { state, words } = listed.filter
    if (words || state === 'settled' || state === 'mine') return
    const { lessonTitle, lessonNumber } = sibling
    rows.value = [{ ...thread, lessonTitle, lessonNumber }, ...rows.value]
  }
  function takeThread(thread: Thread) {
    if (isSame(thread, room.value)) threads.take([thread])
    updateRow(thread)
    return thread
  }

  async function readRoom(opened: Room) {
    const first = await api.fetchLessonThreads(opened)
    const items = [...first.items]
    let cursor = first.nextCursor
    while (cursor) {
      const page = await api.fetchLessonThreads(opened, cursor)
      items.push(...page.items)
      cursor = page.nextCursor
    }
    if (!isSame(opened, room.value)) return
    threads.startFrom(items, first.lastNumber)
    can.value = first.can
    isLoaded.value = true
  }

  /** Reads a lesson's room and listens to it; the one that was open is left. */
  async function open(opened: Room) {
    if (isSame(opened, room.value) && isLoaded.value) return
    close()
    room.value = { courseSlug: opened.courseSlug, lessonKey: opened.lessonKey }
    await readRoom(room.value)
    if (isSame(opened, room.value)) line.open(room.value, me.value)
  }
  function close() {
    line.close()
    room.value = null
    isLoaded.value = false
    can.value = { write: false, settleAny: false }
    threads.startFrom([], 0)
  }
  watch(me, async () => {
    const again = room.value
    if (!again) return
    close()
    await open(again).catch(waitForNextReading)
  })

  async function loadRows(slug: string, filter: api.QuestionFilter) {
    const asked = { slug, filter: { ...filter } }
    listed = asked
    const page = await api.fetchQuestions(slug, filter)
    if (listed !== asked) return rows.value
    rows.value = page.items
    nextCursor.value = page.nextCursor
    return page.items
  }
  async function loadMoreRows() {
    if (!listed || !nextCursor.value) return
    const page = await api.fetchQuestions(listed.slug, listed.filter, nextCursor.value)
    const known = new Set(rows.value.map((row) => row.id))
    rows.value = [...rows.value, ...page.items.filter((row) => !known.has(row.id))]
    nextCursor.value = page.nextCursor
  }

  /** Reads one thread and opens its room. */
  async function openThread(questionId: number) {
    const thread = await api.fetchThread(questionId)
    await open(thread)
    return takeThread(thread)
  }
  async function deleteQuestion(thread: Thread) {
    await api.deleteQuestion(thread.id)
    takeThread({ ...thread, isDeleted: true })
  }

  const isMine = (writer: Writer) => me.value !== null && writer.id === me.value
  const mayEdit = (writer: Writer) => can.value.write && isMine(writer)

  return {
    room,
    isLoaded,
    can,
    news,
    threads: threads.threads,
    lastNumber: threads.lastNumber,
    threadOf: threads.threadOf,
    isLive: line.isLive,
    presence: line.presence,
    writersAt: line.writersAt,
    sayWriting: line.sayWriting,
    checkAgain: line.poll,
    open,
    openThread,
    close,
    posts: posts.kept,
    ask: posts.ask,
    answer: posts.answer,
    retryPost: posts.retry,
    dropPost: posts.drop,
    rows,
    nextCursor,
    loadRows,
    loadMoreRows,
    mayEdit,
    mayDelete: (writer: Writer) => can.value.settleAny || mayEdit(writer),
    maySettle: (thread: Thread) => can.value.settleAny || mayEdit(thread.writer),
    changeQuestion: async (id: number, body: ChangeQuestion) =>
      takeThread(await api.changeQuestion(id, body)),
    changeAnswer: async (id: number, body: ChangeAnswer) =>
      takeThread(await api.changeAnswer(id, body)),
    deleteQuestion,
    deleteAnswer: async (id: number) => takeThread(await api.deleteAnswer(id)),
    settle: async (questionId: number, answerId: number) =>
      takeThread(await api.settleQuestion(questionId, answerId)),
    unsettle: async (questionId: number) => takeThread(await api.unsettleQuestion(questionId)),
  }
})
