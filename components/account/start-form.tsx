'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { Button } from '@/components/ui/button'
import { refreshMe } from '@/components/ui/me'
import { TextField } from '@/components/ui/text-field'
import { openShop } from '@/lib/queries/account'
import { signIn } from '@/lib/queries/session'
import { startSchema } from '@/lib/schemas/account'
import { FormProblem } from './form-problem'
import { SigningInNeedsScripts } from './signing-in-needs-scripts'
import { useSending } from './use-sending'

const empty = { name: '', shop: '', email: '', password: '' }

/** Opens a one-person shop for a journeyman, signs in and goes on to `from`. */
export function StartForm({ from }: { from: string }) {
  const router = useRouter()
  const [key] = useState(() => crypto.randomUUID())
  const form = useForm({ resolver: zodResolver(startSchema), defaultValues: empty })
  const { errors } = form.formState
  const { submit, ready, sending, problem } = useSending(form, async (start) => {
    await openShop(start, key)
    await signIn(start)
    await refreshMe()
    router.push(from)
    router.refresh()
  })
  return (
    <form onSubmit={submit} method="post" noValidate>
      <SigningInNeedsScripts />
      <TextField
        label="Your name"
        autoComplete="name"
        hint="It stands on your cut sheets."
        fault={errors.name?.message}
        {...form.register('name')}
      />
      <TextField
        label="Shop"
        autoComplete="organization"
        hint="Your own name will do."
        fault={errors.shop?.message}
        {...form.register('shop')}
      />
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        fault={errors.email?.message}
        {...form.register('email')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="new-password"
        hint="15 characters or more; a few words in a row do well. Not your name, not the shop’s."
        fault={errors.password?.message}
        {...form.register('password')}
      />
      <FormProblem>{problem}</FormProblem>
      <Button type="submit" variant="primary" disabled={!ready || sending}>
        {sending ? 'Opening your job book…' : 'Open the job book'}
      </Button>
      <p className="mt-6">
        Been here before?{' '}
        <Link href={`/sign-in?from=${encodeURIComponent(from)}`} prefetch={false}>
          Sign in
        </Link>
        .
      </p>
    </form>
  )
}
