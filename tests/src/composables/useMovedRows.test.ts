import { describe, expect, it } from 'vitest'
import { ref } from 'vue'
import { useMovedRows } from '../../../src/composables/useMovedRows'

describe('useMovedRows', () => {
  it('gives each row a key that goes with it', () => {
    const rows = ref(['a', 'b', 'c'])
    const { keys, said, move, takeOut } = useMovedRows(() => rows.value.length)
    const before = [...keys.value]
    expect(new Set(before).size).toBe(3)

    move(2, -1, () => (rows.value = ['a', 'c', 'b']))
    expect(keys.value).toEqual([before[0], before[2], before[1]])
    expect(said.value).toBe('Now 2 of 3.')

    takeOut(0, () => (rows.value = ['c', 'b']))
    expect(keys.value).toEqual([before[2], before[1]])
    expect(said.value).toBe('Taken out; 2 left.')

    rows.value = ['c', 'b', 'd']
    expect(keys.value.slice(0, 2)).toEqual([before[2], before[1]])
    expect(before).not.toContain(keys.value[2])
  })

  it('leaves the ends where they are', () => {
    const { keys, move } = useMovedRows(() => 2)
    const before = [...keys.value]
    let moved = 0
    move(0, -1, () => moved++)
    move(1, 1, () => moved++)
    expect(moved).toBe(0)
    expect(keys.value).toEqual(before)
  })

  it('keeps the focus on what was pressed, or on its neighbour where that is switched off', async () => {
    const parent = document.createElement('span')
    const [up, down] = [document.createElement('button'), document.createElement('button')]
    parent.append(up, down)
    document.body.append(parent)
    up.focus()
    const { move } = useMovedRows(() => 2)
    move(1, -1, () => {
      up.disabled = true
      up.blur()
    })
    await Promise.resolve()
    await Promise.resolve()
    expect(document.activeElement).toBe(down)
    parent.remove()
  })
})
