import type { z } from 'zod'
import { problemSchema, type FieldError, type Problem } from '../../shared/contracts/errors'

/** A refusal by the server, or a lost line, with a sentence to show and what is wrong with which field. */
export class ApiProblem extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail)
    this.name = 'ApiProblem'
  }
  get code() {
    return this.problem.code
  }
  get status() {
    return this.problem.status
  }
  get errors(): FieldError[] {
    return this.problem.errors ?? []
  }
  /** The line is down; the same may go through later. */
  get isOffline() {
    return this.problem.code === 'offline'
  }
}

/** Any thrown thing as a problem that can be shown. */
export function asProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error
  return new ApiProblem({
    type: 'about:blank',
    title: 'unexpected',
    status: 0,
    code: 'unexpected',
    detail:
      'Something went wrong on this page. Load it again; what you typed is kept where it says so.',
  })
}

const offline = () =>
  new ApiProblem({
    type: 'about:blank',
    title: 'offline',
    status: 0,
    code: 'offline',
    detail: 'No signal reached the server. What you typed is still here; try again.',
  })

async function readProblem(response: Response): Promise<ApiProblem> {
  const parsed = problemSchema.safeParse(await response.json().catch(() => null))
  if (parsed.success) return new ApiProblem(parsed.data)
  return new ApiProblem({
    type: 'about:blank',
    title: 'unreadable',
    status: response.status,
    code: 'unreadable',
    detail: 'The server answered something that cannot be read. Try again.',
  })
}

let tellSignedOut = () => {}

/** Calls `listener` whenever the server says that nobody is signed in here any more. */
export function onSignedOut(listener: () => void) {
  tellSignedOut = listener
}

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'
  body?: unknown
  /** Sent as they are, instead of JSON. */
  bytes?: Blob
  /** The same for every repetition of one write. */
  idempotencyKey?: string
  signal?: AbortSignal
}

async function send(path: string, options: RequestOptions): Promise<Response> {
  const headers: Record<string, string> = { Accept: 'application/json' }
  if (options.body !== undefined) headers['Content-Type'] = 'application/json'
  if (options.idempotencyKey) headers['Idempotency-Key'] = options.idempotencyKey
  const response = await fetch(`/api${path}`, {
    method: options.method ?? 'GET',
    headers,
    body: options.bytes ?? (options.body === undefined ? null : JSON.stringify(options.body)),
    ...(options.signal ? { signal: options.signal } : {}),
  }).catch((error: unknown) => {
    throw error instanceof DOMException && error.name === 'AbortError' ? error : offline()
  })
  if (response.ok) return response
  const problem = await readProblem(response)
  if (problem.code === 'sign-in-first') tellSignedOut()
  throw problem
}

/** Asks the API and checks the answer by its contract. Throws ApiProblem. */
export async function request<T extends z.ZodType>(
  schema: T,
  path: string,
  options: RequestOptions = {},
): Promise<z.output<T>> {
  const response = await send(path, options)
  return schema.parse(await response.json())
}

/** Asks the API for something that has no answer. Throws ApiProblem. */
export async function requestNothing(path: string, options: RequestOptions): Promise<void> {
  await send(path, options)
}

/** A query string from what is set, with its question mark, or nothing. */
export function queryString(values: Record<string, string | number | null | undefined>): string {
  const query = new URLSearchParams()
  for (const [name, value] of Object.entries(values)) {
    if (value !== null && value !== undefined && value !== '') query.set(name, String(value))
  }
  const text = query.toString()
  return text ? `?${text}` : ''
}
