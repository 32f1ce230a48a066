import { describe, expect, it } from 'vitest'
import { ref } from 'vue'
import { useMovedRows } from '../../../src/composables/useMovedRows'

describe('useMovedRows', () => {
  it('gives each row a key that goes with it', () => {
    const rows = ref(['a', 'b', 'c'])
    const setAll = (next: string[]) => (rows.value = next)
    const { keys, said, shift, drop } = useMovedRows(() => rows.value, setAll)
    const before = [...keys.value]
    expect(new Set(before).size).toBe(3)

    shift(2, -1)
    expect(rows.value).toEqual(['a', 'c', 'b'])
    expect(keys.value).toEqual([before[0], before[2], before[1]])
    expect(said.value).toBe('Now 2 of 3.')

    drop(0)
    expect(rows.value).toEqual(['c', 'b'])
    expect(keys.value).toEqual([before[2], before[1]])
    expect(said.value).toBe('Taken out; 2 left.')

    rows.value = ['c', 'b', 'd']
    expect(keys.value.slice(0, 2)).toEqual([before[2], before[1]])
    expect(before).not.toContain(keys.value[2])
  })

  it('leaves the ends where they are', () => {
    let moved = 0
    const { keys, shift } = useMovedRows(
      () => ['a', 'b'],
      () => moved++,
    )
    const before = [...keys.value]
    shift(0, -1)
    shift(1, 1)
    expect(moved).toBe(0)
    expect(keys.value).toEqual(before)
  })

  it('keeps the focus on what was pressed, or on its neighbour where that is switched off', async () => {
    const parent = document.createElement('span')
    const [up, down] = [document.createElement('button'), document.createElement('button')]
    parent.append(up, down)
    document.body.append(parent)
    up.focus()
    const { shift } = useMovedRows(
      () => ['a', 'b'],
      () => {
        up.disabled = true
        up.blur()
      },
    )
    shift(1, -1)
    await Promise.resolve()
    await Promise.resolve()
    expect(document.activeElement).toBe(down)
    parent.remove()
  })
})
