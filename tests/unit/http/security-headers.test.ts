import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import { hashesFile, PageHashes } from '@/lib/http/page-hashes'
import { contentSecurityPolicy, securityHeaders } from '@/lib/http/security-headers'

const directive = (policy: string, name: string) => policy.split('; ').find((part) => part.startsWith(`${name} `))

describe('the content security policy', () => {
  it('of a page made at build time allows its own scripts by hash, and none by a blanket word', () => {
    const policy = contentSecurityPolicy({ hashes: ['sha256-abc='], development: false })
    expect(directive(policy, 'script-src')).toBe("script-src 'self' 'sha256-abc='")
    expect(policy).not.toMatch(/unsafe-eval|strict-dynamic|\*/)
  })

  it('of a page made on request allows what carries its nonce', () => {
    const policy = contentSecurityPolicy({ hashes: [], nonce: 'n0nce', development: false })
    expect(directive(policy, 'script-src')).toBe("script-src 'self' 'nonce-n0nce'")
  })

  it.each(['object-src', 'base-uri', 'frame-ancestors'])('allows no %s', (name) => {
    expect(directive(contentSecurityPolicy({ hashes: [], development: false }), name)).toBe(`${name} 'none'`)
  })
})

describe('the other headers', () => {
  it('promise https only where the address has it', () => {
    expect(securityHeaders(true)['Strict-Transport-Security']).toMatch(/max-age=\d{8}/)
    expect(securityHeaders(false)).not.toHaveProperty('Strict-Transport-Security')
  })
})

describe('hashes of pages', () => {
  it('are found by address, with and without a closing stroke, and are no object’s own names', () => {
    const directory = mkdtempSync(path.join(os.tmpdir(), 'hashes-'))
    const pages = { '/': ['sha256-a'], '/handbook': ['sha256-b'], '/_not-found': ['sha256-c'] }
    writeFileSync(path.join(directory, hashesFile), JSON.stringify(pages))
    const hashes = PageHashes.from(directory)
    rmSync(directory, { recursive: true })
    expect([hashes.of('/'), hashes.of('/handbook/'), hashes.of('/jobs')]).toEqual([
      ['sha256-a'],
      ['sha256-b'],
      undefined,
    ])
    expect(hashes.of('/constructor')).toBeUndefined()
    expect(hashes.of('constructor')).toBeUndefined()
    expect(hashes.fallback()).toEqual(['sha256-c'])
  })

  it('are none without a build', () => {
    expect(PageHashes.from('/nowhere').of('/')).toBeUndefined()
  })
})
