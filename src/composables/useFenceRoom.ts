import { onBeforeUnmount } from 'vue'
import type { Room } from '../../shared/contracts/socketEvents'
import { useFenceStore } from '../stores/fence'
import { useLoad } from './useLoad'

/** Keeps a lesson's room open while a component shows it; null waits until the lesson is known. */
export function useFenceRoom(room: () => Room | null) {
  const fence = useFenceStore()
  const address = () => {
    const wanted = room()
    return wanted ? `${wanted.courseSlug}/${wanted.lessonKey}` : ''
  }
  const { problem, again } = useLoad(address, async () => {
    const wanted = room()
    if (wanted) await fence.open(wanted)
    return true
  })
  onBeforeUnmount(() => fence.close())
  return { problem, again }
}
