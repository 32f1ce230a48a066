import { fetchLater } from '../base/fetchLater'

/** Fetches the room of a lesson that plays: player, tape and fence. */
export const fetchLessonRoom = () => import('./LessonRoom.vue')

/** The room of a lesson, fetched while the kit check is read. */
export const AsyncLessonRoom = fetchLater(fetchLessonRoom, 'the lesson')
