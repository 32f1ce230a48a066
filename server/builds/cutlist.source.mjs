// The thread of cut lists when the server runs from source: a thread does not take over what reads TypeScript in
// the process, so that is registered here first.
import { register } from 'tsx/esm/api'

register()
await import(new URL('cutlist.worker.ts', import.meta.url).href)
