import { existsSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { sheetToPdf } from '@/lib/print/pdf/sheet-to-pdf'
import type { Sheet } from '@/lib/print/sheet/sheet'
import { beyond, emptyLetters, overlapping } from '@/tests/support/paper'
import { readPdf, type ReadPage } from '@/tests/support/pdf-reader'
import { handbookRail, quarryHead, sheetOfRail } from '@/tests/support/rail-sheets'

const corpus = '../shared/corpus/strings'
const there = existsSync(corpus)
if (!there) console.warn(`NOT RUN: the hostile strings of ${corpus} are not on this machine.`)

/** Hostile strings on one sheet. */
const many = 25

const plain: Sheet = {
  ...(await sheetOfRail(handbookRail)),
  blocks: [],
}

/** A sheet of one page with a text wherever a person may type one. */
async function pageWith(text: string): Promise<ReadPage> {
  const sheet: Sheet = {
    ...plain,
    title: text,
    under: text,
    particulars: [['by ', { strong: text }]],
    blocks: [{ kind: 'lists', lists: [{ title: 'Given', rows: [{ name: text, line: [text], under: [text] }] }] }],
    cautions: [[text]],
  }
  const [page] = readPdf(await sheetToPdf(sheet, 'letter')).pages
  if (!page) throw new Error('No page')
  return page
}

function expectWhole(page: ReadPage, text: string): void {
  expect(emptyLetters(page), text).toEqual([])
  // Some letters hang out to the left of where they are set.
  expect(beyond(page, 30), text).toEqual([])
  expect(overlapping(page), text).toEqual([])
}

describe('what a person typed on a sheet', () => {
  it.each(['Łódź', 'Kőszeg', 'Čapek', 'Nguyễn Văn Đức', 'Şişli', 'Ñuñoa', 'Île-à-la-Crosse', 'straße'])(
    'is written in our own faces: %s',
    async (text) => {
      const page = await pageWith(text)
      expectWhole(page, text)
      expect(page.text).toContain(text)
      expect(page.text).not.toContain('?')
    },
  )

  it.each([
    ['東京', '??'],
    ['Jörg 🔧 Bell', 'Jörg ? Bell'],
    ['👩🏽‍🏭', '?'],
    ['Иван', '????'],
    ['مرحبا', '?????'],
    ['\ud800lone', '?lone'],
  ])('has a question mark for each letter that none of our faces has: %s', async (text, said) => {
    const page = await pageWith(text)
    expectWhole(page, text)
    expect(page.text.startsWith(`${said} ${said} by ${said}`)).toBe(true)
  })

  it('drops what has no shape, and keeps to one line', async () => {
    const page = await pageWith('stoop\u200b\u202e rail\u0007\r\nnorth\ufeff')
    expectWhole(page, 'controls')
    expect(page.text.startsWith('stoop rail north stoop rail north')).toBe(true)
  })

  it.each(['x', 'W', 'railing', '____', '′″⁄', 'a b'])('wraps however long it is: %s', async (text) => {
    const page = await pageWith(text.repeat(Math.ceil(500 / text.length)))
    expectWhole(page, text)
  })

  it('keeps one page with the longest names that a job may have', async () => {
    const long = (length: number) => 'Northern Riverside Community Centre, east stair '.repeat(9).slice(0, length)
    const head = {
      ...quarryHead,
      job: long(120),
      place: long(200),
      sheet: long(80),
      measuredBy: long(80),
      instrument: long(120),
    }
    for (const paper of ['letter', 'a4'] as const) {
      const { pages } = readPdf(await sheetToPdf(await sheetOfRail(handbookRail, { head }), paper))
      expect(pages).toHaveLength(1)
      for (const page of pages) expectWhole(page, 'long names')
    }
  })

  it.skipIf(!there)('is drawn whole for every hostile string', { timeout: 120_000 }, async () => {
    const naughty = JSON.parse(
      readFileSync(`${corpus}/minimaxir_big-list-of-naughty-strings_blns.json`, 'utf8'),
    ) as string[]
    const { payloads } = JSON.parse(readFileSync(`${corpus}/markup-payloads.json`, 'utf8')) as {
      payloads: { payload: string }[]
    }
    const all = [...naughty, ...payloads.map(({ payload }) => payload)]
    expect(all.length).toBeGreaterThan(600)
    for (let from = 0; from < all.length; from += many) {
      const texts = all.slice(from, from + many).map((text) => text.slice(0, 300))
      const rows = texts.map((text) => ({ name: text, line: [text], under: [{ strong: text }] }))
      const sheet: Sheet = {
        ...plain,
        title: texts.join(' '),
        blocks: [{ kind: 'lists', lists: [{ title: texts[0] ?? '', rows }] }],
      }
      for (const page of readPdf(await sheetToPdf(sheet, 'a4')).pages) expectWhole(page, texts.join('\n'))
    }
  })
})
