import { computed, nextTick, ref } from 'vue'
import type { z } from 'zod'
import { asProblem, type ApiProblem } from '../api/client'

/**
 * A form that is sent whole: checked by its contract first, then by the server; each field's error
 * by its dotted path. What was typed is never touched.
 */
export function useForm<T extends z.ZodType>(
  schema: T,
  read: () => unknown,
  send: (value: z.output<T>) => Promise<void>,
) {
  const errors = ref<Record<string, string>>({})
  const problem = ref<ApiProblem | null>(null)
  const isSending = ref(false)
  /** What is wrong with the whole, when no field shows it. */
  const message = computed(() =>
    problem.value && Object.keys(errors.value).length === 0 ? problem.value.message : '',
  )

  /** The first field in question gets the focus, and with it its reason is read out. */
  async function showFirst() {
    await nextTick()
    document.querySelector<HTMLElement>('main form [aria-invalid="true"]')?.focus()
  }

  async function submit() {
    errors.value = {}
    problem.value = null
    const parsed = schema.safeParse(read())
    if (!parsed.success) {
      for (const issue of parsed.error.issues) {
        errors.value[issue.path.map(String).join('.')] ??= issue.message
      }
      return showFirst()
    }
    isSending.value = true
    try {
      await send(parsed.data)
    } catch (error) {
      problem.value = asProblem(error)
      for (const { field, message } of problem.value.errors) errors.value[field] ??= message
    } finally {
      isSending.value = false
    }
    await showFirst()
  }
  return { errors, message, isSending, submit }
}
