import { watchEffect } from 'vue'
import { useAccountsStore } from '../stores/accounts'

/** Puts the person's theme on the page, everywhere and at once. */
export function useTheme() {
  const accounts = useAccountsStore()
  watchEffect(() => {
    document.documentElement.dataset['theme'] = accounts.theme
  })
}
