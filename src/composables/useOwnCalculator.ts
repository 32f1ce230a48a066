import { computed, onBeforeUnmount, ref, shallowRef } from 'vue'
import {
  ownCalculatorDefinitionSchema,
  type OwnCalculator,
  type OwnCalculatorDefinition,
} from '../../shared/contracts/ownCalculators'
import { ApiProblem, asProblem } from '../api/client'
import {
  findUnreadBounds,
  readOwnDraft,
  type OwnDraft,
} from '../components/exercises/ownCalculatorDrafts'
import { useOwnCalculatorsStore } from '../stores/ownCalculators'
import { useAutosave } from './useAutosave'

const prefix = 'definition.'

/** A refusal by the server, put to the fields of the form. */
function placed(error: unknown): ApiProblem {
  const problem = asProblem(error)
  const current = problem.problem.current as Partial<OwnCalculator> | undefined
  const errors = problem.errors.map(({ field, message }) => ({
    field: field.startsWith(prefix) ? field.slice(prefix.length) : field,
    message,
  }))
  const theirs =
    current?.definition && current.version !== undefined
      ? { current: { ...current.definition, version: current.version } }
      : {}
  return new ApiProblem({ ...problem.problem, errors, ...theirs })
}

function refuseUnread(changes: Partial<OwnDraft>) {
  const errors = findUnreadBounds(changes.inputs ?? [])
  if (errors.length === 0) return
  throw new ApiProblem({
    type: 'about:blank',
    title: 'unread',
    status: 0,
    code: 'unread',
    detail: 'a marked field cannot be taken yet. All of it is kept on this device until it can.',
    errors,
  })
}

/** What the server would hold of it: in the order of the contract, without spaces at the ends. */
function asSent(definition: OwnCalculatorDefinition): string {
  const read = ownCalculatorDefinitionSchema.safeParse(definition)
  return JSON.stringify(read.success ? read.data : definition)
}

/** An own calculator, saved as it is written and kept as a version when that is asked. */
export function useOwnCalculator(opened: OwnCalculator) {
  const store = useOwnCalculatorsStore()
  const { course, key } = opened
  /** What the server held last, with all that hangs on it. */
  const latest = shallowRef(opened)
  let definition: OwnCalculatorDefinition = opened.definition
  /** Writes go one after the other, so that none overtakes the version of another. */
  let line: Promise<unknown> = Promise.resolve()
  function inTurn<T>(work: () => Promise<T>): Promise<T> {
    const done = line.then(work, work)
    line = done.catch(() => undefined)
    return done
  }
  function take(changed: OwnCalculator) {
    latest.value = changed
    definition = changed.definition
    return changed
  }
  async function write(next: OwnCalculatorDefinition, version: number, keepsVersion: boolean) {
    try {
      const body = { version, definition: next, keepsVersion }
      return take(await store.change(course.id, key, body))
    } catch (error) {
      const problem = placed(error)
      const theirs = asProblem(error).problem.current as Partial<OwnCalculator> | undefined
      if (theirs?.definition && theirs.version !== undefined) take(theirs as OwnCalculator)
      throw problem
    }
  }

  const saving = useAutosave<OwnDraft>({
    name: `own-calculator:${course.id}:${key}`,
    initial: opened.definition,
    version: opened.version,
    save: (changes, version) =>
      inTurn(() => {
        refuseUnread(changes)
        return write(readOwnDraft({ ...definition, ...changes }), version, false)
      }),
  })
  onBeforeUnmount(() => void saving.saveNow())

  const isKeeping = ref(false)
  const keepMessage = ref('')
  /** Keeps what stands here as a version; what somebody else wrote meanwhile is told first. */
  async function keepVersion() {
    isKeeping.value = true
    keepMessage.value = ''
    try {
      await saving.saveNow()
      const kept = await inTurn(() => write(readOwnDraft(saving.form), latest.value.version, true))
      saving.rebase(kept.definition, kept.version)
      saving.state.value = 'saved'
      saving.savedAt.value = new Date(kept.savedAt)
    } catch (error) {
      const problem = asProblem(error)
      const theirs = problem.problem.current as (OwnDraft & { version?: number }) | undefined
      if (theirs?.version !== undefined) saving.rebase(theirs, theirs.version)
      keepMessage.value = problem.message
    } finally {
      isKeeping.value = false
    }
  }
  /** Something stands here that no version says. */
  const hasUnkept = computed(
    () =>
      latest.value.hasUnkept ||
      asSent(readOwnDraft(saving.form)) !== JSON.stringify(latest.value.definition),
  )
  return { ...saving, latest, hasUnkept, isKeeping, keepMessage, keepVersion }
}
