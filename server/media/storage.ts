/** Where videos and posters lie. Files today; anything that can do this much tomorrow. */
export interface MediaStorage {
  /** Takes a finished file over under a key; doing it again after a crash in between is fine. */
  put: (key: string, sourcePath: string) => Promise<void>
  /** Size in bytes, or null when nothing lies under the key. */
  stat: (key: string) => Promise<{ bytes: number } | null>
  /** The folder and the name in it by which a range can be read. */
  locate: (key: string) => { root: string; name: string }
  /** Removes what lies under a key; nothing there is fine. */
  remove: (key: string) => Promise<void>
}
