import { useIntervalFn } from '@vueuse/core'
import { computed, onMounted, ref, shallowRef, watch } from 'vue'
import type { RememberedUpload } from '../api/uploads'
import { showAmount, showTimeLeft } from '../components/media/uploadWords'
import { asProblem } from '../api/client'
import { useBenchLessonsStore } from '../stores/benchLessons'
import { useMediaStore } from '../stores/media'
import { useAction } from './useAction'

const pollMs = 2000

/** A lesson's video: on its way, being checked, ready or refused; polled while the server looks at it. */
export function useVideoUpload(lessonId: number) {
  const media = useMediaStore()
  const lessons = useBenchLessonsStore()
  const message = ref('')
  const remembered = shallowRef<RememberedUpload | null>(null)
  const now = ref(Date.now())

  const upload = computed(() => media.uploads.get(lessonId) ?? null)
  const video = computed(() => lessons.lesson?.video ?? null)
  const isChecking = computed(() => video.value?.state === 'checking')
  const isMoving = computed(() => ['sending', 'paused', 'cut'].includes(upload.value?.state ?? ''))
  const words = computed(() => {
    const sent = upload.value
    if (!sent) return ''
    const amount = showAmount(sent.sentBytes, sent.bytes)
    if (sent.state === 'paused') return `${amount}, paused`
    if (sent.state === 'cut')
      return `${amount}, the line is cut: it goes on by itself when it is back`
    if (sent.state !== 'sending') return amount
    const { at, bytes } = sent.since
    const left = showTimeLeft(sent.bytes - sent.sentBytes, sent.sentBytes - bytes, now.value - at)
    return left ? `${amount}, ${left}` : amount
  })

  const clock = useIntervalFn(() => (now.value = Date.now()), 1000, { immediate: false })
  watch(isMoving, (moving) => (moving ? clock.resume() : clock.pause()), { immediate: true })

  const isIn = computed(() => upload.value?.state === 'done')
  /** A line that is down leaves the page as it is; the next look may go through. */
  async function look() {
    try {
      await lessons.refresh()
      if (isIn.value) media.dropUpload(lessonId)
    } catch (error) {
      if (!asProblem(error).isOffline) throw error
    }
  }
  const poll = useIntervalFn(() => void look(), pollMs, { immediate: false })
  watch(
    () => isChecking.value || isIn.value,
    (waits) => (waits ? poll.resume() : poll.pause()),
    { immediate: true },
  )
  watch(isIn, (now) => now && void look(), { immediate: true })

  const recall = async () => {
    remembered.value = await media.findRemembered(lessonId).catch(() => null)
  }
  onMounted(() => {
    if (!upload.value) void recall()
  })

  const { run: choose } = useAction(message, async (file: File) => {
    remembered.value = null
    await media.startUpload(lessonId, file)
  })
  const { run: pause } = useAction(message, () => media.pauseUpload(lessonId))
  const { run: forget } = useAction(message, async () => {
    await media.forgetUpload(lessonId)
    remembered.value = null
  })
  const { run: forgetRemembered } = useAction(message, async () => {
    if (remembered.value) await media.forgetRemembered(remembered.value)
    remembered.value = null
  })
  return {
    ...{ upload, video, remembered, words, message, isMoving, isChecking },
    ...{ choose, pause, forget, forgetRemembered },
    tryAgain: () => void media.tryAgain(lessonId),
    goOn: () => media.goOnWithUpload(lessonId),
    drop: () => media.dropUpload(lessonId),
  }
}
