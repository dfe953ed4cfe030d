import { existsSync, readFileSync } from 'node:fs'
import { z } from '@/lib/schemas/zod'

const written = z.record(z.string(), z.array(z.string()))

/** The file's name in the build's directory. */
export const hashesFile = 'csp-hashes.json'

/** Pages that Next answers with at any address. */
const anywhere = ['/_not-found', '/_global-error']

export class PageHashes {
  private constructor(private readonly pages: z.output<typeof written>) {}

  /** Reads what the build wrote; without a build every page counts as written at request time. */
  static from(directory: string): PageHashes {
    const file = `${directory}/${hashesFile}`
    return new PageHashes(existsSync(file) ? written.parse(JSON.parse(readFileSync(file, 'utf8'))) : {})
  }

  /** Hashes of a page made at build time, or undefined for one that is made on request. */
  of(pathname: string): readonly string[] | undefined {
    const page = pathname === '/' ? pathname : pathname.replace(/\/$/, '')
    return Object.hasOwn(this.pages, page) ? this.pages[page] : undefined
  }

  /** Hashes of the pages that stand in where nothing is found. */
  fallback(): readonly string[] {
    return [...new Set(anywhere.flatMap((page) => this.pages[page] ?? []))]
  }
}
