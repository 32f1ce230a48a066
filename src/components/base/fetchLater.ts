import { defineAsyncComponent, h, type Component } from 'vue'
import BaseLoading from './BaseLoading.vue'
import BaseProblem from './BaseProblem.vue'

const mostTries = 4

/** A component whose code is fetched apart from its page's; tried again where the line is poor, then told in words. */
export const fetchLater = <T extends Component>(
  fetch: () => Promise<{ default: T }>,
  what: string,
) =>
  defineAsyncComponent({
    loader: fetch,
    loadingComponent: () => h(BaseLoading, { what }),
    errorComponent: () =>
      h(BaseProblem, {
        message: `The signal was lost on ${what}. Load the page again with signal.`,
      }),
    onError: (_error, retry, fail, tries) =>
      tries < mostTries ? setTimeout(retry, 1000 * tries) : fail(),
  })
