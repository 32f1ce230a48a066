import { defineAsyncComponent, h } from 'vue'
import BaseLoading from '../base/BaseLoading.vue'
import BaseProblem from '../base/BaseProblem.vue'

/** Fetches the workbench; asked for ahead, it is there when the video comes to a stop, with or without signal. */
export const fetchWorkbench = () => import('./WorkbenchPanel.vue')

const mostTries = 4
const missing = 'The workbench did not load. Load the page again once there is signal.'

/** The workbench, fetched apart from the lesson: the picture comes first. */
export const AsyncWorkbench = defineAsyncComponent({
  loader: fetchWorkbench,
  loadingComponent: () => h(BaseLoading, { what: 'the workbench' }),
  errorComponent: () => h(BaseProblem, { message: missing }),
  onError: (_error, retry, fail, tries) =>
    tries < mostTries ? setTimeout(retry, 1000 * tries) : fail(),
})
