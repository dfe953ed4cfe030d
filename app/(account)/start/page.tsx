import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { ownPath } from '@/components/account/own-path'
import { StartForm } from '@/components/account/start-form'
import { Panel } from '@/components/ui/panel'
import { currentActor } from '@/lib/auth/session'

export const metadata: Metadata = { title: 'Start a job book' }

export default async function StartPage({ searchParams }: PageProps<'/start'>) {
  const { from } = await searchParams
  const next = ownPath(typeof from === 'string' ? from : undefined, '/jobs')
  if (await currentActor()) redirect(next)
  return (
    <div className="mx-auto max-w-[30rem]">
      <h1>Start a job book</h1>
      <p className="lede">
        For a journeyman on the job: keep field measures and cut sheets, revise them, print the one that counts. It
        opens a shop with you alone in it.
      </p>
      <Panel>
        <StartForm from={next} />
      </Panel>
    </div>
  )
}
