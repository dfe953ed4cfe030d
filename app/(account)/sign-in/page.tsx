import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { ownPath } from '@/components/account/own-path'
import { SignInForm } from '@/components/account/sign-in-form'
import { Panel } from '@/components/ui/panel'
import { currentActor } from '@/lib/auth/session'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { from } = await searchParams
  const next = ownPath(typeof from === 'string' ? from : undefined, '/jobs')
  if (await currentActor()) redirect(next)
  return (
    <div className="mx-auto max-w-[30rem]">
      <h1>Sign in</h1>
      <p className="lede">The handbook needs no sign-in. Your job book does.</p>
      <Panel>
        <SignInForm from={next} />
      </Panel>
    </div>
  )
}
