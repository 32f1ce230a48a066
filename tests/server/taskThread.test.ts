import { afterEach, describe, expect, it } from 'vitest'
import { Worker, type WorkerOptions } from 'node:worker_threads'
import { TaskEnded, TaskThread } from '../../server/taskThread'

/** Adds, throws, spins or fills the memory, as it is told. */
const program = `
  const { parentPort, threadId } = require('node:worker_threads')
  parentPort.on('message', ({ id, task }) => {
    parentPort.postMessage({ taken: id })
    if (task.spin) { const end = Date.now() + task.spin; while (Date.now() < end); }
    if (task.fill) { const all = []; for (;;) all.push(new Array(10_000).fill(all.length + 0.5)) }
    if (task.fail) parentPort.postMessage({ done: id, failed: 'it broke' })
    else if (task.exit) process.exit(3)
    else parentPort.postMessage({ done: id, found: { sum: task.a + task.b, threadId } })
  })
  parentPort.postMessage('ready')
`
const open: TaskThread[] = []
afterEach(async () => {
  await Promise.all(open.splice(0).map((thread) => thread.close()))
})

function openThread(limits = { computeMs: 50, clockMs: 1000 }, options: WorkerOptions = {}) {
  let started = 0
  const thread = new TaskThread(() => {
    started++
    return new Worker(program, { eval: true, ...options })
  }, limits)
  open.push(thread)
  return { thread, countStarted: () => started }
}
const sum = (a: number, b: number) => ({ a, b })
const endOf = (task: Promise<unknown>) => task.catch((error: unknown) => error)

describe('TaskThread', () => {
  it('does one task after another in one thread', async () => {
    const { thread, countStarted } = openThread()
    const found = await Promise.all([1, 2, 3].map((n) => thread.perform(sum(n, 1))))
    expect(found).toMatchObject([{ sum: 2 }, { sum: 3 }, { sum: 4 }])
    expect(await thread.perform(sum(4, 1))).toMatchObject({ sum: 5 })
    expect(countStarted()).toBe(1)
  })

  it('ends a task that spins without end, and does the next in a new thread', async () => {
    const { thread, countStarted } = openThread()
    await thread.perform(sum(0, 0))
    const began = performance.now()
    const [spun, after] = await Promise.all([
      endOf(thread.perform({ spin: 60_000 })),
      thread.perform(sum(1, 1)),
    ])
    expect(spun).toBeInstanceOf(TaskEnded)
    expect(spun).toMatchObject({ reason: 'time' })
    expect(after).toMatchObject({ sum: 2 })
    expect(performance.now() - began).toBeLessThan(20_000)
    expect(countStarted()).toBe(2)
  })

  it('keeps this process free meanwhile', async () => {
    const { thread } = openThread({ computeMs: 300, clockMs: 3000 })
    await thread.perform(sum(0, 0))
    let ticks = 0
    const ticking = setInterval(() => ticks++, 5)
    expect(await endOf(thread.perform({ spin: 60_000 }))).toBeInstanceOf(TaskEnded)
    clearInterval(ticking)
    expect(ticks).toBeGreaterThan(5)
  })

  it('lets a task take what it may', async () => {
    const { thread } = openThread({ computeMs: 2000, clockMs: 20_000 })
    expect(await thread.perform({ spin: 100, ...sum(2, 2) })).toMatchObject({ sum: 4 })
  })

  it('counts the time of this task only', async () => {
    const { thread, countStarted } = openThread({ computeMs: 400, clockMs: 20_000 })
    for (let task = 0; task < 6; task++) await thread.perform({ spin: 100, ...sum(1, 1) })
    expect(countStarted()).toBe(1)
  })

  it('ends a task that fills its memory, and does the next', async () => {
    const { thread, countStarted } = openThread(
      { computeMs: 30_000, clockMs: 60_000 },
      { resourceLimits: { maxOldGenerationSizeMb: 32, maxYoungGenerationSizeMb: 8 } },
    )
    expect(await endOf(thread.perform({ fill: true }))).toMatchObject({ reason: 'memory' })
    expect(await thread.perform(sum(3, 3))).toMatchObject({ sum: 6 })
    expect(countStarted()).toBe(2)
  })

  it('passes on what went wrong, and goes on', async () => {
    const { thread } = openThread()
    expect(await endOf(thread.perform({ fail: true }))).toMatchObject({ message: 'it broke' })
    expect(await endOf(thread.perform({ exit: true }))).toMatchObject({
      message: 'the thread has ended',
    })
    expect(await thread.perform(sum(1, 2))).toMatchObject({ sum: 3 })
  })

  it('refuses all that waits when a thread cannot even begin', async () => {
    const thread = new TaskThread(
      () => new Worker('throw new Error("no such file")', { eval: true }),
      {
        computeMs: 50,
        clockMs: 1000,
      },
    )
    open.push(thread)
    const ends = await Promise.all([1, 2].map((n) => endOf(thread.perform(sum(n, n)))))
    expect(ends).toMatchObject([{ message: 'no such file' }, { message: 'no such file' }])
  })
})
