import pino from 'pino'

/** What the log keeps of an error: never the statement or its values, which hold what people typed. */
export function errorLine(error: unknown): object {
  if (!(error instanceof Error)) return { thrown: typeof error }
  const withoutStatement = (text: string | undefined) => text?.split('\nsql:')[0]
  const { name, message, stack } = error
  const code =
    'parent' in error && error.parent instanceof Object && 'code' in error.parent ? error.parent.code : undefined
  const frames = stack?.split('\n').filter((line) => /^\s+at /.test(line))
  return { name, message: withoutStatement(message), code, frames }
}

/** One JSON line an event, on standard output. Never given bodies, cookies or passwords. */
export const log = pino({
  level: process.env.LOG_LEVEL || (process.env.NODE_ENV === 'test' ? 'silent' : 'info'),
  serializers: { err: errorLine },
})
