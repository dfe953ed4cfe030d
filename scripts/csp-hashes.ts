import { createHash } from 'node:crypto'
import { readdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { hashesFile } from '@/lib/http/page-hashes'
import { distDirectory } from './build/sources'

// After `next build`: the hashes of the inline scripts of every page made at build time, for `proxy.ts`.
const pages = path.join(distDirectory(), 'server/app')
const inlineScript = /<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/g

const hashes = Object.fromEntries(
  readdirSync(pages, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.html'))
    .map((file) => [addressOf(file), scriptsOf(readFileSync(path.join(pages, file), 'utf8'))]),
)
writeFileSync(path.join(distDirectory(), hashesFile), JSON.stringify(hashes))
console.log(`Inline scripts of ${Object.keys(hashes).length} pages hashed.`)

function addressOf(file: string): string {
  const page = file.replaceAll(path.sep, '/').replace(/\.html$/, '')
  return page === 'index' ? '/' : `/${page}`
}

function scriptsOf(html: string): string[] {
  const hashed = [...html.matchAll(inlineScript)].map(([, script = '']) =>
    createHash('sha256').update(script).digest('base64'),
  )
  return [...new Set(hashed)].map((hash) => `sha256-${hash}`)
}
