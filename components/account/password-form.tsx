'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/text-field'
import { changePassword } from '@/lib/queries/account'
import { passwordSchema } from '@/lib/schemas/account'
import { FormProblem } from './form-problem'
import { useSending } from './use-sending'

const empty = { currentPassword: '', password: '' }

/** A new password; every other sign-in ends with it. */
export function PasswordForm() {
  const [changed, setChanged] = useState(false)
  const form = useForm({ resolver: zodResolver(passwordSchema), defaultValues: empty })
  const { errors } = form.formState
  const { submit, sending, problem } = useSending(form, async (passwords) => {
    setChanged(false)
    await changePassword(passwords)
    form.reset(empty)
    setChanged(true)
  })
  return (
    <form onSubmit={submit} method="post" noValidate className="max-w-[32rem]">
      <TextField
        label="Password now"
        type="password"
        autoComplete="current-password"
        fault={errors.currentPassword?.message}
        {...form.register('currentPassword')}
      />
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        hint="15 characters or more; a few words in a row do well."
        fault={errors.password?.message}
        {...form.register('password')}
      />
      <FormProblem>{problem}</FormProblem>
      <Button type="submit" disabled={sending}>
        {sending ? 'Changing…' : 'Change the password'}
      </Button>
      <p role="status" className="mt-3">
        {changed && 'Changed. Every other device is signed out.'}
      </p>
    </form>
  )
}
