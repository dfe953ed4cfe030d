import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readAddress, writeAddress } from '@/components/calculator/address'
import { degrees, group, inches, list, whole } from '@/lib/calculators/fields'

const fields = {
  rise: inches('Rise'),
  slope: degrees('Slope'),
  risers: whole('Risers'),
  pieces: list('Pieces', inches('Piece'), { least: 1, most: 40 }),
  top: group('Top', { kind: whole('Kind') }),
}
/** As people type: anything but the mark that parts the items of a list. */
const typed = fc.string({ unit: 'binary' }).filter((text) => !text.includes(';') && text === text.trim() && text !== '')

describe('inputs in the address bar', () => {
  it('come back as they were typed', () => {
    fc.assert(
      fc.property(
        typed,
        typed,
        fc.array(typed, { minLength: 1, maxLength: 8 }),
        fc.integer(),
        (rise, slope, pieces, kind) => {
          const raw = { rise, slope, pieces, top: { kind } }
          expect(readAddress(fields, writeAddress(fields, raw), {})).toEqual(raw)
        },
      ),
    )
  })

  it('say an emptied box too, so that a fallback is not put back in its place', () => {
    expect(readAddress(fields, writeAddress(fields, { rise: '' }), { rise: '7' })).toEqual({ rise: '' })
  })

  it('leave what the address does not name as it stands', () => {
    expect(readAddress(fields, '?rise=8', { rise: '7', slope: '30' })).toEqual({ rise: '8', slope: '30' })
  })

  it('pass over names they do not know and sets that cannot be read', () => {
    const standing = { rise: '7' }
    expect(readAddress(fields, '?wing=3&top={kind&top=x', standing)).toBe(standing)
  })

  it('keep the fraction of a link typed by hand', () => {
    expect(readAddress(fields, "?rise=6'+2+1/2", {})).toEqual({ rise: "6' 2 1/2" })
  })
})
