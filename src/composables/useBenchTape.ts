import { computed, nextTick, onMounted, ref, watch, type Ref } from 'vue'
import type { BenchLesson } from '../../shared/contracts/benchCourses'
import type { Video } from '../../shared/contracts/media'
import { useBenchLessonsStore } from '../stores/benchLessons'
import { useAction } from './useAction'
import { useVideoPlayer } from './useVideoPlayer'

function toVideo({ video, captions }: BenchLesson): Video | null {
  if (!video?.src || !video.durationMs) return null
  return {
    id: video.id,
    src: video.src,
    contentType: video.contentType,
    posterUrl: video.posterUrl,
    durationMs: video.durationMs,
    captions: captions.map(({ id, language, label, isOriginal, version }) => ({
      src: `/api/media/captions/${id}.vtt?v=${version}`,
      ...{ language, label, isOriginal },
    })),
  }
}

/** The tape of a lesson in edit: its video, its stops as they are being written, and the one that is chosen. */
export function useBenchTape(
  lesson: () => BenchLesson,
  frame: Ref<HTMLElement | null>,
  moveChosen: (atMs: number) => void,
) {
  const lessons = useBenchLessonsStore()
  const message = ref('')
  const chosenKey = ref<string | null>(null)
  /** How the chosen stop stands in its form, which may not be saved yet. */
  const written = ref<{ atMs?: number; name?: string }>({})
  /** One video object as long as its file and captions are the same, so that a save does not start it anew. */
  const video = ref<Video | null>(null)
  watch(
    () => JSON.stringify(toVideo(lesson())),
    () => (video.value = toVideo(lesson())),
    { immediate: true },
  )
  const player = useVideoPlayer(frame, () => video.value)
  const durationMs = computed(() => video.value?.durationMs ?? 0)

  const inOrder = computed(() =>
    lesson()
      .stops.map((stop) => (stop.key === chosenKey.value ? { ...stop, ...written.value } : stop))
      .sort((a, b) => a.atMs - b.atMs),
  )
  const chosen = computed(() => lesson().stops.find(({ key }) => key === chosenKey.value) ?? null)
  const stops = computed(() =>
    inOrder.value.map(({ key, name, atMs }) => ({
      key,
      name,
      atMs,
      state: key === chosenKey.value ? ('here' as const) : ('to-do' as const),
    })),
  )
  const settleAt = computed(() => player.cues.value.map(({ endMs }) => Math.round(endMs)))

  function pick(key: string) {
    if (chosenKey.value === key) return
    chosenKey.value = key
    written.value = {}
  }
  function choose(key: string) {
    pick(key)
    const stop = inOrder.value.find((candidate) => candidate.key === key)
    if (stop) player.seek(stop.atMs)
  }
  async function move(key: string, atMs: number) {
    pick(key)
    await nextTick()
    moveChosen(atMs)
    player.seek(atMs)
  }
  const { run: setStop } = useAction(message, async () => {
    const atMs = Math.min(Math.round(player.positionMs.value), durationMs.value)
    const name = `Stop ${lesson().stops.length + 1}`
    const stop = await lessons.addStop(lesson().id, { name, atMs, isRequired: true })
    pick(stop.key)
  })
  function toggle() {
    if (player.isPlaying.value) player.pause()
    else void player.play()
  }
  function start() {
    if (video.value) void player.start(video.value, player.positionMs.value)
  }
  onMounted(start)
  watch(frame, (element, before) => {
    if (element && !before) start()
  })
  watch(
    inOrder,
    (all) => {
      if (all.length > 0 && !all.some(({ key }) => key === chosenKey.value)) pick(all[0]?.key ?? '')
    },
    { immediate: true },
  )
  return {
    ...{
      player,
      chosen,
      stops,
      settleAt,
      durationMs,
      message,
      toggle,
      start,
      choose,
      move,
      setStop,
    },
    positionMs: player.positionMs,
    numberOf: (key: string) => inOrder.value.findIndex((stop) => stop.key === key) + 1,
    show: (atMs: number) => (written.value = { ...written.value, atMs }),
    rename: (name: string) => (written.value = { ...written.value, name }),
  }
}
