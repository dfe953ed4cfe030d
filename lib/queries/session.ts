import type { SignInForm } from '@/lib/schemas/account'
import { ProblemError, refusal, send } from './send'

/** Signs in on this device. @throws ProblemError 401 when the pair does not fit, 429 when it was tried too often. */
export async function signIn({ email, password }: SignInForm): Promise<void> {
  const response = await post('/api/auth/callback/credentials', { email, password })
  if (response.ok) return
  if (response.status !== 401) throw await refusal(response)
  const detail = 'That e-mail address and that password do not fit together.'
  throw new ProblemError({ type: 'about:blank', title: 'Not signed in', status: 401, detail })
}

/** Signs out on this device. @throws ProblemError */
export async function signOut(): Promise<void> {
  const response = await post('/api/auth/signout', {})
  if (!response.ok) throw await refusal(response)
}

/** next-auth takes forms that carry its token back. */
async function post(path: string, fields: { [name: string]: string }): Promise<Response> {
  const { csrfToken } = await send<{ csrfToken: string }>('GET', '/api/auth/csrf')
  const body = new URLSearchParams({ ...fields, csrfToken, callbackUrl: '/', json: 'true' })
  return fetch(path, { method: 'POST', body })
}
