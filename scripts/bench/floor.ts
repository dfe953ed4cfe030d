import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { step } from '../setup/progress.mjs'
import { mustRun } from '../setup/run.mjs'
import { pagesOf } from './bytes'

const layout = `export default function Layout({ children }) {
  return <html lang="en"><body>{children}</body></html>
}
`
const page = `export default function Page() {
  return <p>Hello</p>
}
`

/** The JavaScript of a page that says hello, built with the same packages: no page of Next's ships less. Gzip bytes. */
export async function measureFloor(directory: string): Promise<number> {
  rmSync(directory, { recursive: true, force: true })
  mkdirSync(path.join(directory, 'app'), { recursive: true })
  // Under the project, so that it finds the project's packages by itself.
  const config = `export default { turbopack: { root: ${JSON.stringify(process.cwd())} } }\n`
  writeFileSync(path.join(directory, 'next.config.mjs'), config)
  // The bundler looks for this one upwards too, and would find the app's.
  writeFileSync(path.join(directory, 'instrumentation.js'), 'export function register() {}\n')
  writeFileSync(path.join(directory, 'app/layout.jsx'), layout)
  writeFileSync(path.join(directory, 'app/page.jsx'), page)
  const next = path.resolve('node_modules/next/dist/bin/next')
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', NEXT_DIST_DIR: '' } as const
  await step('Building a bare page beside the app', () =>
    mustRun('The bare page could not be built.', process.execPath, [next, 'build'], { cwd: directory, env }),
  )
  const [hello] = pagesOf(path.join(directory, '.next')).filter((built) => built.page === '/')
  if (!hello) throw new Error('the bare page was not prerendered')
  return hello.jsGzip
}
