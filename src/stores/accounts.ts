import { useLocalStorage } from '@vueuse/core'
import { defineStore } from 'pinia'
import { computed, ref } from 'vue'
import type { ChangeAccount, Me, SignIn, SignUp } from '../../shared/contracts/accounts'
import type { UnitSystem } from '../../shared/contracts/exercises'
import * as api from '../api/accounts'
import { asProblem, onSignedOut } from '../api/client'

/** Who is signed in here, and how they like to read: units and theme, kept on the device for visitors. */
export const useAccountsStore = defineStore('accounts', () => {
  const me = ref<Me | null>(null)
  /** On the device, and so the same at once in every window of it. */
  const units = useLocalStorage<UnitSystem>('gf-units', 'metric')
  const theme = useLocalStorage<'paper' | 'sun'>('gf-theme', 'paper')
  /** The session was ended from another device while somebody was at work here. */
  const hasEndedElsewhere = ref(false)
  let loading: Promise<void> | null = null
  /** One choice after the other, so that the last one made is the one that is kept. */
  let keeping: Promise<void> = Promise.resolve()

  const isSignedIn = computed(() => me.value !== null)

  function take(user: Me | null) {
    me.value = user
    hasEndedElsewhere.value = false
    if (!user) return
    units.value = user.units
    theme.value = user.theme
  }

  /** Asks once who is signed in; a lost line leaves a visitor. */
  function load(): Promise<void> {
    loading ??= api
      .fetchMe()
      .then(({ user }) => take(user))
      .catch(() => {
        loading = null
      })
    return loading
  }

  async function signUp(input: SignUp) {
    take((await api.signUp(input)).user)
  }
  async function signIn(input: SignIn) {
    take((await api.signIn(input)).user)
  }
  async function signOut(everywhere: boolean) {
    await (everywhere ? api.signOutEverywhere() : api.signOutHere())
    take(null)
  }
  /** Units and theme are not taken from the answer: they may have been changed again meanwhile. */
  async function change(input: ChangeAccount) {
    me.value = (await api.changeMe(input)).user
  }
  async function openBench() {
    take((await api.openBench()).user)
  }
  /** What is kept with the account when the line is back, should it be down now. */
  async function keepWithAccount(choice: Pick<ChangeAccount, 'units' | 'theme'>) {
    if (!me.value) return
    const sent = keeping.then(() => change(choice))
    keeping = sent.catch(() => undefined)
    try {
      await sent
    } catch (error) {
      if (asProblem(error).isOffline) {
        addEventListener('online', () => void keepWithAccount(choice), { once: true })
      }
    }
  }

  /** Units at once here, and kept with the account when there is one. */
  async function setUnits(value: UnitSystem) {
    units.value = value
    await keepWithAccount({ units: value })
  }
  async function setTheme(value: 'paper' | 'sun') {
    theme.value = value
    await keepWithAccount({ theme: value })
  }

  onSignedOut(() => {
    if (!me.value) return
    take(null)
    hasEndedElsewhere.value = true
  })

  return {
    me,
    isSignedIn,
    units,
    theme,
    hasEndedElsewhere,
    load,
    signUp,
    signIn,
    signOut,
    change,
    openBench,
    setUnits,
    setTheme,
  }
})
