import {
  whoSchema,
  type ChangeAccount,
  type SignIn,
  type SignUp,
} from '../../shared/contracts/accounts'
import { request, requestNothing } from './client'

export const fetchMe = () => request(whoSchema, '/accounts/me')
export const signUp = (body: SignUp) => request(whoSchema, '/accounts', { method: 'POST', body })
export const signIn = (body: SignIn) => request(whoSchema, '/sessions', { method: 'POST', body })
export const changeMe = (body: ChangeAccount) =>
  request(whoSchema, '/accounts/me', { method: 'PATCH', body })
export const openBench = () => request(whoSchema, '/accounts/me/bench', { method: 'POST' })
export const signOutHere = () => requestNothing('/sessions/current', { method: 'DELETE' })
export const signOutEverywhere = () => requestNothing('/sessions', { method: 'DELETE' })
