import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { draw } from '@/components/drawing/handrail'
import { Plate } from '@/components/drawing/plate'
import { solveHandrail } from '@/lib/trade/rail/solve'
import { isRefusal } from '@/lib/trade/refusal'
import { extremeRails } from './rails'

const given = extremeRails[7]
const solved = given && solveHandrail(given, { tape: 16, dial: 0.25 })
if (!given || !solved || isRefusal(solved)) throw new Error('the rail of this test must solve')
const sketch = draw(given, solved, { tape: 16, dial: 0.25, detail: 'full' })

describe('Plate', () => {
  const html = renderToStaticMarkup(<Plate sketch={sketch} title="Rail of the stoop" highlight="B" />)

  it('is one picture with a name and its numbers in words', () => {
    expect(html).toContain('role="img"')
    expect(html).toMatch(/<title id="[^"]+">Rail of the stoop<\/title>/)
    expect(html).toContain(sketch.says.slice(0, 40))
  })

  it('is drawn on the server for a desk, before any script runs', () => {
    expect(html).toContain('viewBox="0 0 760 ')
    expect(html).toContain('<tspan')
  })

  it('lights the lines and labels of the part that is pointed at, and no others', () => {
    const lit = [...html.matchAll(/data-part="([^"]*)" data-on/g)].map(([, part]) => part)
    expect(lit.length).toBeGreaterThan(2)
    expect(new Set(lit)).toEqual(new Set(['B']))
    expect(html).toContain('data-lit="B"')
  })

  it('lights nothing when nothing is pointed at', () => {
    const plain = renderToStaticMarkup(<Plate sketch={sketch} title="Rail" />)
    expect(plain).not.toContain('data-on')
    expect(plain).not.toContain('data-lit')
  })

  it('asks a drawing for the detail that its width holds', () => {
    const asked: string[] = []
    const drawAt = (detail: 'full' | 'compact') => {
      asked.push(detail)
      return sketch
    }
    renderToStaticMarkup(<Plate sketch={drawAt} title="Rail" />)
    expect(asked).toContain('full')
  })
})
