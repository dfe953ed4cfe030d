'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { refreshMe } from '@/components/ui/me'
import { endOtherSignIns } from '@/lib/queries/account'
import { sentenceOf } from '@/lib/queries/sentence'
import { signOut } from '@/lib/queries/session'
import type { Account } from '@/lib/schemas/views'
import { FormProblem } from './form-problem'

const when = new Intl.DateTimeFormat('en-US', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' })

/** Where the account is signed in, and the ways out. */
export function SignIns({ signIns }: Pick<Account, 'signIns'>) {
  const router = useRouter()
  const [problem, setProblem] = useState<string>()
  const [working, setWorking] = useState(false)
  const act = async (work: () => Promise<unknown>, then: () => void) => {
    setWorking(true)
    setProblem(undefined)
    try {
      await work()
      then()
    } catch (error) {
      setProblem(sentenceOf(error))
    }
    setWorking(false)
  }
  const leave = async () => {
    await signOut()
    await refreshMe()
  }
  return (
    <>
      <ul className="mb-5 max-w-[46rem]">
        {signIns.map(({ id, agent, lastSeenAt, thisOne }) => (
          <li key={id} className="border-b border-rule py-3">
            <b>{thisOne ? 'This device' : 'Another device'}</b>
            <span className="block text-mute">
              {agent || 'unknown browser'}, last seen {when.format(new Date(lastSeenAt))} UTC
            </span>
          </li>
        ))}
      </ul>
      <FormProblem>{problem}</FormProblem>
      <div className="flex flex-wrap gap-3">
        <Button variant="primary" disabled={working} onClick={() => act(leave, () => router.push('/'))}>
          Sign out here
        </Button>
        <Button disabled={working || signIns.length < 2} onClick={() => act(endOtherSignIns, () => router.refresh())}>
          Sign out everywhere else
        </Button>
      </div>
    </>
  )
}
