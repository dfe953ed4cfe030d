import { existsSync, readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { gzipSync } from 'node:zlib'

export interface PageBytes {
  page: string
  scripts: number
  jsGzip: number
  cssGzip: number
  htmlGzip: number
}

/** What a first visit to each prerendered page of a build loads, gzipped. Bytes. */
export function pagesOf(distDir: string): PageBytes[] {
  const pages = path.join(distDir, 'server/app')
  return readdirSync(pages, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.html') && !path.basename(file).startsWith('_'))
    .sort()
    .map((file) => measure(distDir, file, readFileSync(path.join(pages, file), 'utf8')))
}

function measure(distDir: string, file: string, html: string): PageBytes {
  const page = `/${file.replace(/(index)?\.html$/, '')}`
  const scripts = named(html, /<script[^>]*\ssrc="([^"]+)"[^>]*>/g)
  const styles = named(html, /<link[^>]*\shref="([^"]+\.css[^"]*)"[^>]*>/g)
  const total = (addresses: string[]) => addresses.reduce((bytes, address) => bytes + gzipOf(distDir, address), 0)
  const htmlGzip = gzipSync(html).length
  return { page, scripts: scripts.length, jsGzip: total(scripts), cssGzip: total(styles), htmlGzip }
}

/** Each address once. Scripts for browsers without modules are not loaded by those we serve. */
function named(html: string, tag: RegExp): string[] {
  const tags = [...html.matchAll(tag)].filter(([whole]) => !/\snomodule/i.test(whole))
  return [...new Set(tags.map(([, address = '']) => address.split('?')[0] ?? ''))]
}

/** Under /_next lies the build, everywhere else what is public. */
function gzipOf(distDir: string, address: string): number {
  const built = address.startsWith('/_next/')
  const file = built ? path.join(distDir, address.slice('/_next/'.length)) : path.join('public', address)
  if (!existsSync(file)) throw new Error(`A page names ${address}, which is nowhere.`)
  return gzipSync(readFileSync(file)).length
}
