import type { PasswordForm, Preferences, StartForm } from '@/lib/schemas/account'
import { send } from './send'

/** Opens a one-person shop; then sign in. A repeat with the same key opens no second one. */
export const openShop = (form: StartForm, key: string) => send<object>('POST', '/api/start', { body: form, key })

/** Changes the named preferences. */
export const savePreferences = (change: Partial<Preferences>) =>
  send<Preferences>('PATCH', '/api/account/preferences', { body: change })

/** Changes the password and signs out everywhere else. */
export const changePassword = (form: PasswordForm) => send<void>('POST', '/api/account/password', { body: form })

/** Signs out everywhere but here. */
export const endOtherSignIns = () => send<{ ended: number }>('DELETE', '/api/account/sign-ins')
