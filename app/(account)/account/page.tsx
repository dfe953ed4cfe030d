import type { Metadata } from 'next'
import { PasswordForm } from '@/components/account/password-form'
import { SignIns } from '@/components/account/sign-ins'
import { Panel } from '@/components/ui/panel'
import { PreferencesFields } from '@/components/ui/preferences'
import { requireActor } from '@/lib/auth/session'
import { getAccount } from '@/lib/data/account'

export const metadata: Metadata = { title: 'Account' }

export default async function AccountPage() {
  const { name, email, role, shop, signIns } = await getAccount(await requireActor('/account'))
  return (
    <>
      <h1>{name}</h1>
      <p className="lede">
        {role} at {shop} · {email}
      </p>
      <div className="grid gap-6">
        <Panel>
          <h2>Tape, saw and screen</h2>
          <div className="mt-4 max-w-[40rem]">
            <PreferencesFields />
          </div>
        </Panel>
        <Panel>
          <h2 className="mb-4">Where you are signed in</h2>
          <SignIns signIns={signIns} />
        </Panel>
        <Panel>
          <h2 className="mb-4">Password</h2>
          <PasswordForm />
        </Panel>
      </div>
    </>
  )
}
