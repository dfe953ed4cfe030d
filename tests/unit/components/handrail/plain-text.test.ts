import { describe, expect, it } from 'vitest'
import { closingText } from '@/components/calculator/handrail/closing-text'
import { endText } from '@/components/calculator/handrail/end-cut'
import { inputsOf, measureFromInputs } from '@/components/calculator/handrail/measure-inputs'
import { cutListText } from '@/components/calculator/handrail/plain-text'
import { sticksText } from '@/components/calculator/handrail/sticks-text'
import { answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { defaultPrecision } from '@/lib/calculators/fields'
import { readPreferences } from '@/components/ui/preferences-store'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'

const preferences = readPreferences(null)

describe('words of the cut list', () => {
  it('says whether fewer sticks could do', () => {
    expect(sticksText({ sticks: 1, bound: 1, proved: true })).toBe('1 stick, and no fewer can do')
    expect(sticksText({ sticks: 6, bound: 5, proved: false })).toBe('6 sticks; 5 not ruled out')
  })

  it('says by how much three tapes do not close', () => {
    expect(closingText({ flight: 1, error: -0.375, verdict: 'measure again' }, 16)).toBe(
      'Measure again: the three tapes do not close by 3/8".',
    )
    expect(closingText({ flight: 1, error: 0.01, verdict: 'agree' }, 16)).toBe('The three tapes close.')
  })

  it.each([
    [0, 'saw 16 1/4°, long on top'],
    [90, 'saw 73 3/4°, long on top'],
  ] as const)('reads the saw as it is marked: square at %i', (sawSquare, said) => {
    expect(endText({ saw: 16.25, exact: 16.3, longPoint: 'top' }, 0.25, { sawSquare })).toBe(said)
  })

  it('lists every part with its cuts, and where to find the sheet again', () => {
    const said = answer(asAny(handrail), inputsOf(measureFromInputs(handrail.example)), defaultPrecision)
    if (!said.ok) throw new Error('the example must solve')
    const rail = {
      given: said.answer.inputs as unknown as HandrailInputs,
      solved: said.answer.outputs as unknown as HandrailOutputs,
    }
    const text = cutListText(rail, { precision: defaultPrecision, preferences }, 'https://longpoint.example/sheet')
    for (const { mark, kind } of rail.solved.parts) expect(text).toContain(`${mark}  ${kind}`)
    expect(text).toContain('LEFT hand going up')
    expect(text.endsWith('https://longpoint.example/sheet')).toBe(true)
  })
})
