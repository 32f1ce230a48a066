import { useLocalStorage } from '@vueuse/core'
import { defineStore } from 'pinia'
import { computed, ref } from 'vue'
import type { ChangeAccount, Me, SignIn, SignUp } from '../../shared/contracts/accounts'
import type { UnitSystem } from '../../shared/contracts/exercises'
import * as api from '../api/accounts'

/** Who is signed in here, and how they like to read: units and theme, kept on the device for visitors. */
export const useAccountsStore = defineStore('accounts', () => {
  const me = ref<Me | null>(null)
  const deviceUnits = useLocalStorage<UnitSystem>('gf-units', 'metric')
  const deviceTheme = useLocalStorage<'paper' | 'sun'>('gf-theme', 'paper')
  let loading: Promise<void> | null = null

  const isSignedIn = computed(() => me.value !== null)
  const units = computed(() => me.value?.units ?? deviceUnits.value)
  const theme = computed(() => me.value?.theme ?? deviceTheme.value)

  function take(user: Me | null) {
    me.value = user
    if (!user) return
    deviceUnits.value = user.units
    deviceTheme.value = user.theme
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
  async function change(input: ChangeAccount) {
    take((await api.changeMe(input)).user)
  }
  async function openBench() {
    take((await api.openBench()).user)
  }
  /** Units at once here, and kept with the account when there is one. */
  async function setUnits(value: UnitSystem) {
    deviceUnits.value = value
    if (me.value) {
      me.value = { ...me.value, units: value }
      await change({ units: value })
    }
  }
  async function setTheme(value: 'paper' | 'sun') {
    deviceTheme.value = value
    if (me.value) {
      me.value = { ...me.value, theme: value }
      await change({ theme: value })
    }
  }
  /** The session ended elsewhere. */
  function forget() {
    take(null)
  }

  return {
    me,
    isSignedIn,
    units,
    theme,
    load,
    signUp,
    signIn,
    signOut,
    change,
    openBench,
    setUnits,
    setTheme,
    forget,
  }
})
