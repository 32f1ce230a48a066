import { computed, ref } from 'vue'
import type { OwnCalculatorRow, OwnSnapshot } from '../../shared/contracts/ownCalculators'
import { asProblem } from '../api/client'
import { newerVersion, ownChoices } from '../components/exercises/ownCalculatorChoice'
import { useBenchLessonsStore } from '../stores/benchLessons'
import { useOwnCalculatorsStore } from '../stores/ownCalculators'

/** The own calculators of the course whose lesson lies open, to make an exercise of. */
export function useOwnChoice(inUse: () => OwnSnapshot | undefined) {
  const store = useOwnCalculatorsStore()
  const courseId = useBenchLessonsStore().lesson?.courseId
  const message = ref('')
  const isTaking = ref(false)
  const rows = ref<OwnCalculatorRow[]>([])
  if (courseId !== undefined) {
    store
      .listAttachable(courseId)
      .then((listed) => (rows.value = listed))
      .catch((error: unknown) => {
        message.value = `The course’s own calculators are missing here: ${asProblem(error).message}`
      })
  }

  /** The newest version of one; nothing, and a sentence, where it cannot be had. */
  async function take(key: string): Promise<OwnSnapshot | null> {
    if (courseId === undefined) return null
    isTaking.value = true
    message.value = ''
    try {
      const snapshot = await store.takeNewest(courseId, key)
      if (!snapshot) message.value = 'No version of this calculator was kept yet.'
      return snapshot
    } catch (error) {
      message.value = asProblem(error).message
      return null
    } finally {
      isTaking.value = false
    }
  }
  return {
    choices: computed(() => ownChoices(rows.value, inUse())),
    newer: computed(() => newerVersion(rows.value, inUse())),
    take,
    message,
    isTaking,
  }
}
