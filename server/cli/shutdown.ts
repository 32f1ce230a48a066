const hardStopMs = 20_000

type Task = () => Promise<void> | void

const tasks: Task[] = []
let ending: Promise<void> | null = null

/** Adds something to undo when the program ends; the last added is undone first. */
export function whenStopping(task: Task): void {
  tasks.unshift(task)
}

export function isStopping(): boolean {
  return ending !== null
}

/** Undoes everything, once; what fails is said and does not keep the rest from being undone. */
export function stopAll(): Promise<void> {
  ending ??= runTasks()
  return ending
}

async function runTasks(): Promise<void> {
  setTimeout(() => process.exit(1), hardStopMs).unref()
  for (const task of tasks) {
    try {
      await task()
    } catch (error) {
      console.error(sentence(error))
    }
  }
}

/** Ctrl-C and SIGTERM stop everything in order; a second one changes nothing. */
export function stopOnSignals(exitCode: number): void {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
    process.on(signal, () => {
      void stopAll().then(() => process.exit(exitCode))
    })
  }
}

/** Runs a program to its end; a failure is said in a sentence, and everything is stopped. */
export async function runToEnd(program: () => Promise<number>): Promise<void> {
  let exitCode = 1
  try {
    exitCode = await program()
  } catch (error) {
    if (!isStopping()) console.error(`\n${sentence(error)}`)
  }
  await stopAll()
  process.exit(exitCode)
}

function sentence(error: unknown): string {
  if (!(error instanceof Error)) return String(error)
  return error.cause instanceof Error ? `${error.message}\n${error.cause.message}` : error.message
}
