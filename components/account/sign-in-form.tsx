'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useForm } from 'react-hook-form'
import { Button } from '@/components/ui/button'
import { refreshMe } from '@/components/ui/me'
import { TextField } from '@/components/ui/text-field'
import { signIn } from '@/lib/queries/session'
import { signInSchema, type SignInForm as Typed } from '@/lib/schemas/account'
import { FormProblem } from './form-problem'
import { SigningInNeedsScripts } from './signing-in-needs-scripts'
import { useSending } from './use-sending'

/** E-mail and password; goes on to `from` when they fit. */
export function SignInForm({ from }: { from: string }) {
  const router = useRouter()
  const form = useForm({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: '', password: '' } satisfies Typed,
  })
  const { errors } = form.formState
  const { submit, ready, sending, problem } = useSending(form, async (pair) => {
    await signIn(pair)
    await refreshMe()
    router.push(from)
    router.refresh()
  })
  return (
    <form onSubmit={submit} method="post" noValidate>
      <SigningInNeedsScripts />
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
        autoComplete="current-password"
        fault={errors.password?.message}
        {...form.register('password')}
      />
      <FormProblem>{problem}</FormProblem>
      <Button type="submit" variant="primary" disabled={!ready || sending}>
        {sending ? 'Signing in…' : 'Sign in'}
      </Button>
      <p className="mt-6">
        On your own, with no shop on Longpoint?{' '}
        <Link href={`/start?from=${encodeURIComponent(from)}`} prefetch={false}>
          Start a job book
        </Link>
        .
      </p>
    </form>
  )
}
