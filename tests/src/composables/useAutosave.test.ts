import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, nextTick, type EffectScope } from 'vue'
import { ApiProblem } from '../../../src/api/client'
import { useAutosave } from '../../../src/composables/useAutosave'

interface Block {
  title: string
  outcome: string
}
const initial: Block = { title: 'A log store', outcome: 'Dry wood' }
const saved = (version: number) => ({ version, savedAt: '2026-12-01T10:46:00.000Z' })
const save = vi.fn<(changes: Partial<Block>, version: number) => Promise<{ version: number }>>()
let scope: EffectScope

function refuse(status: number, details: Partial<ApiProblem['problem']> = {}) {
  const code = status === 0 ? 'offline' : 'refused'
  return new ApiProblem({
    type: 'about:blank',
    title: code,
    status,
    code,
    detail: 'No.',
    ...details,
  })
}
function open(server: Block = initial, version = 1) {
  scope = effectScope()
  return scope.run(() => useAutosave({ name: 'course:1', initial: server, version, save }))!
}
async function pause() {
  await nextTick()
  await vi.advanceTimersByTimeAsync(800)
  await flushPromises()
}
function kept(): unknown {
  const text = localStorage.getItem('gf-unsent:course:1') ?? '{"changes":{}}'
  return (JSON.parse(text) as { changes: unknown }).changes
}

beforeEach(() => {
  vi.useFakeTimers()
  localStorage.clear()
  save.mockReset()
  save.mockImplementation(async (_changes, version) => saved(version + 1))
})
afterEach(() => {
  scope.stop()
  vi.useRealTimers()
})

describe('useAutosave', () => {
  it('saves only what was changed, once, after a pause in the typing', async () => {
    const { form, state, savedAt } = open()
    form.title = 'A log'
    await nextTick()
    form.title = 'A log shed'
    expect(save).not.toHaveBeenCalled()
    await pause()
    expect(save.mock.calls).toEqual([[{ title: 'A log shed' }, 1]])
    expect(state.value).toBe('saved')
    expect(savedAt.value?.toISOString()).toBe('2026-12-01T10:46:00.000Z')
    expect(kept()).toEqual({})
  })

  it('sends the version that the save before it was answered with', async () => {
    const { form } = open()
    form.title = 'One'
    await pause()
    form.title = 'Two'
    await pause()
    expect(save.mock.calls.map(([, version]) => version)).toEqual([1, 2])
  })

  it('leaves a refused value in its field with the reason, and saves the rest', async () => {
    save.mockImplementation(async ({ title }, version) => {
      if (title === '')
        throw refuse(400, { errors: [{ field: 'title', message: 'Give it a name.' }] })
      return saved(version + 1)
    })
    const { form, state, errorOf } = open()
    form.title = ''
    form.outcome = 'Dry wood for two winters'
    await pause()
    expect(form.title).toBe('')
    expect(errorOf('title')).toBe('Give it a name.')
    expect(state.value).toBe('refused')
    expect(save.mock.lastCall).toEqual([{ outcome: 'Dry wood for two winters' }, 1])
    expect(kept()).toEqual({ title: '' })
  })

  it('does not send a refused value again until it is changed, and then takes the reason away', async () => {
    save.mockRejectedValueOnce(
      refuse(400, { errors: [{ field: 'title', message: 'Give it a name.' }] }),
    )
    const { form, state, errorOf } = open()
    form.title = ''
    await pause()
    await pause()
    expect(save).toHaveBeenCalledTimes(1)
    form.title = 'A shed'
    await pause()
    expect(save).toHaveBeenCalledTimes(2)
    expect([state.value, errorOf('title')]).toEqual(['saved', ''])
  })

  it('forgets the refusal when what stood there before is typed again', async () => {
    save.mockRejectedValueOnce(refuse(400, { errors: [{ field: 'title', message: 'No.' }] }))
    const { form, state, errorOf } = open()
    form.title = ''
    await pause()
    form.title = initial.title
    await pause()
    expect([state.value, errorOf('title'), save.mock.calls.length]).toEqual(['idle', '', 1])
  })

  it('takes over what was saved elsewhere, keeps what was typed here, and sends it again', async () => {
    const theirs = { title: initial.title, outcome: 'Theirs', version: 5 }
    save.mockRejectedValueOnce(refuse(409, { current: theirs }))
    const { form, message, state } = open()
    form.title = 'Mine'
    await pause()
    expect(form).toEqual({ title: 'Mine', outcome: 'Theirs' })
    expect(save.mock.lastCall).toEqual([{ title: 'Mine' }, 5])
    expect([state.value, message.value]).toEqual(['saved', ''])
  })

  it('says what somebody else wrote into the same field', async () => {
    save.mockRejectedValueOnce(
      refuse(409, { current: { title: 'Theirs', outcome: initial.outcome, version: 5 } }),
    )
    const { form, message } = open()
    form.title = 'Mine'
    await pause()
    expect(form.title).toBe('Mine')
    expect(message.value).toContain('“Theirs”')
  })

  it('does not go round for ever when the same version is refused again', async () => {
    save.mockRejectedValue(refuse(409, { current: { ...initial, version: 1 } }))
    const { form, state } = open()
    form.title = 'Mine'
    await pause()
    expect(save).toHaveBeenCalledTimes(1)
    expect(state.value).toBe('refused')
  })

  it('keeps what was typed without a line through a reload, and sends it when the line is back', async () => {
    save.mockRejectedValue(refuse(0))
    const first = open()
    first.form.title = 'Typed in the shed'
    await pause()
    expect(first.state.value).toBe('offline')
    expect(kept()).toEqual({ title: 'Typed in the shed' })
    scope.stop()
    await flushPromises()

    const second = open()
    expect(second.form.title).toBe('Typed in the shed')
    await pause()
    save.mockReset()
    save.mockResolvedValue(saved(2))
    window.dispatchEvent(new Event('online'))
    await flushPromises()
    expect(save.mock.calls).toEqual([[{ title: 'Typed in the shed' }, 1]])
    expect([second.state.value, kept()]).toEqual(['saved', {}])
  })

  it('says after a reload what was written meanwhile where something unsent stood', async () => {
    save.mockRejectedValue(refuse(0))
    open().form.title = 'Mine'
    await pause()
    scope.stop()
    await flushPromises()
    save.mockReset()
    save.mockResolvedValue(saved(4))
    const { form, message } = open({ ...initial, title: 'Theirs' }, 3)
    await flushPromises()
    expect(form.title).toBe('Mine')
    expect(message.value).toContain('“Theirs”')
  })

  it('does not wait for the pause when the page is left', async () => {
    const { form } = open()
    form.title = 'Left at once'
    await nextTick()
    scope.stop()
    await flushPromises()
    expect(save.mock.calls).toEqual([[{ title: 'Left at once' }, 1]])
  })

  it('sends one save after the other, the last with all that was typed meanwhile', async () => {
    let answer: (value: { version: number }) => void = () => undefined
    save.mockImplementationOnce(() => new Promise((resolve) => (answer = resolve)))
    const { form, state } = open()
    form.title = 'One'
    await pause()
    form.title = 'Two'
    await pause()
    expect(save).toHaveBeenCalledTimes(1)
    answer(saved(2))
    await flushPromises()
    expect(save.mock.calls).toEqual([
      [{ title: 'One' }, 1],
      [{ title: 'Two' }, 2],
    ])
    expect(state.value).toBe('saved')
  })

  it('tries again by itself while the server is away', async () => {
    save.mockRejectedValueOnce(refuse(0))
    const { form, state } = open()
    form.title = 'Typed while it was started anew'
    await pause()
    expect(state.value).toBe('offline')
    await vi.advanceTimersByTimeAsync(5000)
    expect(save).toHaveBeenCalledTimes(2)
    expect([state.value, kept()]).toEqual(['saved', {}])
  })

  it('leaves alone what another window of this device has not sent yet', async () => {
    save.mockRejectedValue(refuse(0))
    const [first, firstScope] = [open(), scope]
    const second = open()
    first.form.title = 'In the first window'
    await pause()
    second.form.outcome = 'In the second'
    await pause()
    expect(kept()).toEqual({ title: 'In the first window', outcome: 'In the second' })
    second.form.outcome = initial.outcome
    await pause()
    expect(kept()).toEqual({ title: 'In the first window' })
    firstScope.stop()
  })
})
