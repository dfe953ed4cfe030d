import type { SignIn } from './demo'
import type { Options } from './options'

/** The last thing `npm start` prints: where to go, and who may sign in. */
export function welcome({ origin, dev }: Options, signIns: readonly SignIn[]) {
  const lines = ['', `Longpoint is running at ${origin}${dev ? ' (hot reload)' : ''}`]
  if (signIns.length > 0) {
    const width = Math.max(...signIns.map(({ email }) => email.length))
    lines.push('', 'Demo sign-ins:')
    for (const { role, email, password } of signIns)
      lines.push(`  ${role.padEnd(12)} ${email.padEnd(width)}  ${password}`)
  }
  lines.push('', 'Ctrl-C stops it and everything it started.', '')
  process.stdout.write(lines.join('\n') + '\n')
}
