import { readContent, type Content } from './pdf-content'
import { readFont, textOf, type ReadFont } from './pdf-font'
import { isBytes, isDict, Objects, type Dict } from './pdf-syntax'

export interface ReadPage extends Content {
  /** Points. */
  width: number
  height: number
  /** Points a unit of the page: 1 where a ruler on it is true. */
  unit: number
}
export interface ReadPdf {
  pages: ReadPage[]
  info: Readonly<Record<string, string>>
}

/** Reads a PDF back: its pages, where letters and paths lie on them, and what they say. */
export function readPdf(bytes: Uint8Array): ReadPdf {
  const text = Buffer.from(bytes).toString('latin1')
  if (!text.startsWith('%PDF-')) throw new Error('Not a PDF')
  const objects = new Objects(text)
  const pages = objects.all().filter((value): value is Dict => isDict(value) && value.get('/Type') === '/Page')
  return { pages: pages.map((page) => readPage(objects, page)), info: infoOf(objects, text) }
}

function readPage(objects: Objects, page: Dict): ReadPage {
  const [left = 0, bottom = 0, right = 0, top = 0] = objects.numbers(inherited(objects, page, '/MediaBox'))
  const fonts = objects.get(objects.dict(inherited(objects, page, '/Resources')).get('/Font'))
  const named: [string, ReadFont | null][] = isDict(fonts)
    ? [...fonts].map(([name, font]) => [name, readFont(objects, objects.dict(font))])
    : []
  const contents = page.get('/Contents')
  const parts = Array.isArray(contents) ? contents : [contents]
  const source = parts.map((part) => objects.stream(part).toString('latin1')).join('\n')
  const unit = page.has('/UserUnit') ? Number(page.get('/UserUnit')) : 1
  return { width: right - left, height: top - bottom, unit, ...readContent(source, new Map(named)) }
}

/** What a page does not say itself, its parent says. */
function inherited(objects: Objects, page: Dict, key: string): ReturnType<Dict['get']> {
  if (page.has(key)) return page.get(key)
  const parent = objects.get(page.get('/Parent'))
  return isDict(parent) ? inherited(objects, parent, key) : undefined
}

function infoOf(objects: Objects, text: string): Record<string, string> {
  const ref = /\/Info (\d+) 0 R/.exec(text)?.[1]
  const info = ref ? objects.get({ ref: Number(ref) }) : undefined
  if (!isDict(info)) return {}
  return Object.fromEntries(
    [...info].flatMap(([key, value]) => {
      const said = objects.get(value)
      return isBytes(said) ? [[key.slice(1), textOf(said.bytes)]] : []
    }),
  )
}
