import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'

/** What a build is made of. The order is the order of hashing. */
const directories = ['app', 'components', 'content', 'fonts', 'lib', 'models', 'public']
const files = [
  'instrumentation.ts',
  'mdx-components.tsx',
  'next.config.mjs',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'scripts/build.ts',
  'tailwind.config.ts',
  'tsconfig.json',
]
/** Written by the build itself. */
const made = ['public/sw.js']
const recordName = 'longpoint-sources'

/** Where the build lies: NEXT_DIST_DIR, or Next's own choice. */
export function distDirectory(env: NodeJS.ProcessEnv = process.env): string {
  return env.NEXT_DIST_DIR || '.next'
}

/** One hash over every source of the build, so that touching a file without changing it builds nothing. */
export function hashSources(): string {
  const hash = createHash('sha256')
  for (const file of [...files.filter((name) => existsSync(name)), ...directories.flatMap(filesUnder)]) {
    if (made.includes(file)) continue
    hash.update(`${file}\0`).update(readFileSync(file)).update('\0')
  }
  return hash.digest('hex')
}

/** Where a finished build writes the hash of what it was made of. */
export const recordOf = (distDir: string) => path.join(distDir, recordName)

/** Whether the build in this directory was finished, and from the sources as they are now. */
export function isCurrent(distDir: string): boolean {
  const record = recordOf(distDir)
  return existsSync(record) && readFileSync(record, 'utf8') === hashSources()
}

function filesUnder(directory: string): string[] {
  if (!existsSync(directory)) return []
  return readdirSync(directory, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name))
    .sort()
}
