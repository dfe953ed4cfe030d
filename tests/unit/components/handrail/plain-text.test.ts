import { describe, expect, it } from 'vitest'
import { inputsOf, measureFromInputs } from '@/components/calculator/handrail/measure-inputs'
import { cutListText } from '@/components/calculator/handrail/plain-text'
import { answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { defaultPrecision } from '@/lib/calculators/fields'
import { readPreferences } from '@/components/ui/preferences-store'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'

const preferences = readPreferences(null)

describe('words of the cut list', () => {
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
