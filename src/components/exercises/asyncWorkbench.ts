import { fetchLater } from '../base/fetchLater'

/** Fetches the workbench; asked for ahead, it is there when the video comes to a stop, with or without signal. */
export const fetchWorkbench = () => import('./WorkbenchPanel.vue')

/** The workbench, fetched apart from the lesson: the picture comes first. */
export const AsyncWorkbench = fetchLater(fetchWorkbench, 'the workbench')
