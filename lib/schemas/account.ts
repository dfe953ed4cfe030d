import { newPassword, passwordFault } from './password'
import { emailField, typedText } from './text'
import { z } from './zod'

export const roles = ['apprentice', 'journeyman', 'instructor', 'coordinator'] as const
export type Role = (typeof roles)[number]

const tapes = [8, 16, 32, 64] as const
const dials = [0.25, 0.5, 1] as const
const squares = [0, 90] as const

/** How a person reads tape, dial and screen. */
export const preferencesSchema = z.object({
  units: z.enum(['in', 'mm']),
  tape: z.literal(tapes),
  sawSquare: z.literal(squares),
  dialStep: z.literal(dials),
  theme: z.enum(['system', 'paper', 'sun', 'night']),
})
export type Preferences = z.output<typeof preferencesSchema>

export const defaultPreferences: Preferences = { units: 'in', tape: 16, sawSquare: 0, dialStep: 0.25, theme: 'system' }

/** Body of a change: only the named ones change. */
export const preferencesChangeSchema = preferencesSchema.partial()

/** Form of the sign-in. */
export const signInSchema = z.object({
  email: emailField,
  password: z.string().min(1, { message: 'Type the password.' }).max(1000, { message: 'The password is too long.' }),
})

/** Form and body of `/start`: a one-person shop and its journeyman. */
export const startSchema = z
  .object({
    name: typedText('Your name', 80),
    shop: typedText('The shop’s name', 80),
    email: emailField,
    password: newPassword,
  })
  .superRefine((start, checks) => {
    const fault = passwordFault(start.password, [start.name, start.shop, start.email])
    if (fault !== null) checks.addIssue({ code: 'custom', path: ['password'], message: fault })
  })

/** Form and body of a changed password. */
export const passwordSchema = z.object({
  currentPassword: z.string().min(1, { message: 'Type the password you use now.' }).max(1000),
  password: newPassword,
})

export type StartForm = z.output<typeof startSchema>
export type SignInForm = z.input<typeof signInSchema>
export type PasswordForm = z.output<typeof passwordSchema>
