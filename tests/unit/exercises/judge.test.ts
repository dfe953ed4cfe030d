import { describe, expect, it } from 'vitest'
import { draw } from '@/lib/exercises/draw'
import { settingAndFace, inOrder, sawSetting } from '@/lib/exercises/half-the-bend'
import { judge } from '@/lib/exercises/judge'
import { slips } from '@/lib/exercises/slips'
import { numberExercise } from '../../support/made-up-exercise'

const good = { read: true, good: true, parts: [{ good: true }] }
const missed = (...codes: string[]) => ({ read: true, good: false, parts: [{ good: false, slips: codes }] })

describe('a number judged at shop tolerance', () => {
  it.each([
    ['length', '74 1/2', true],
    ['length', '74 9/16', true],
    ['length', '74 7/16', true],
    ['length', '74 37/64', false],
    ['length', `6' 2 1/2"`, true],
    ['length', '1892 mm', true],
    ['length', '1893 mm', true],
    ['length', '1894 mm', false],
    ['layout', '74 5/8', true],
    ['layout', '74 41/64', false],
    ['angle', '75', true],
    ['angle', '74', true],
    ['angle', '75.01', false],
    ['angle', '-74.5', false],
  ] as const)('as %s, 74.5 answered with %s is good: %s', (measure, typed, isGood) => {
    expect(judge(numberExercise(measure, 74.5, []), {}, [typed])).toEqual(isGood ? good : missed())
  })
})

describe('a slip', () => {
  const lengths = numberExercise('length', 74.5, [
    ['full-pitch', 80.3],
    ['added-pitches', 80.33],
    ['radians', 20.3],
    ['halved-twice', null],
  ])

  it.each([
    ['20.3', ['radians']],
    ['20.31', ['radians']],
    ['20 5/16', ['radians']],
    ['20 1/4', ['radians']],
    ['516 mm', ['radians']],
    ['20.2', []],
    ['0', []],
    ['80 1/4', ['full-pitch']],
    ['80 5/16', ['full-pitch', 'added-pitches']],
  ])('is recognised before and after rounding, and two that fit are both named: %s', (typed, codes) => {
    expect(judge(lengths, {}, [typed])).toEqual(missed(...codes))
  })

  it('is recognised at every step of a dial', () => {
    const angle = numberExercise('angle', 16, [['full-pitch', 32.4]])
    for (const typed of ['32.4', '32.5', '32 1/2 deg', '32', '32.37'])
      expect(judge(angle, {}, [typed])).toEqual(missed('full-pitch'))
    for (const typed of ['33', '31', '32.7', '32.1']) expect(judge(angle, {}, [typed])).toEqual(missed())
  })

  it('says its cause and its consequence in whole sentences', () => {
    for (const { cause, consequence } of Object.values(slips))
      for (const text of [cause, consequence]) expect(text).toMatch(/^[A-Z].+\.$/)
  })
})

describe('what cannot be read', () => {
  it('gives a sentence, and judges nothing', () => {
    const stair = draw(sawSetting, 1)
    expect(judge(sawSetting, stair, ['about 16'])).toEqual({ read: false, says: [expect.stringMatching(/degrees/)] })
    expect(judge(sawSetting, stair, [])).toEqual({ read: false, says: ['give a number.'] })
    expect(judge(sawSetting, stair, [[16]])).toEqual({ read: false, says: ['give a number.'] })
  })

  it('keeps quiet about the other part', () => {
    const says = [null, 'choose one: top or underside.']
    for (const number of ['16', '1000', 'atan(7/11)/2'])
      for (const face of ['left', '', [0]])
        expect(judge(settingAndFace, draw(settingAndFace, 1), [number, face])).toEqual({ read: false, says })
  })

  it.each([[[]], [[0, 1, 2]], [[0, 1, 2, 2]], [[0, 1, 2, 4]], [[0, 1, 2, -1]], [[0, 1, 2, 0.5]], ['0123']])(
    'takes %j for no order of four',
    (reply) => {
      const says = ['give each of them one place.']
      expect(judge(inOrder, draw(inOrder, 1), [reply])).toEqual({ read: false, says })
    },
  )
})
