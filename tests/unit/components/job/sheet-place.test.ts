import { expect, it } from 'vitest'
import { readPlace, revisingQuery } from '@/components/job/sheet-place'

it('reads back the sheet that was opened to be revised', () => {
  const opened = { job: '01a23194-bf7b-7f0f-a504-240419316ca6', sheet: 2, revision: 3 }
  expect(readPlace(`?m=r~L&${revisingQuery(opened)}`)).toEqual(opened)
})

it.each([
  ['?rise=7', null],
  ['?job=7', { job: '7' }],
  ['?job=7&sheet=2', { job: '7' }],
  ['?job=7&sheet=2&revision=0', { job: '7' }],
  ['?job=7&sheet=-1&revision=1', { job: '7' }],
  ['?sheet=2&revision=1', null],
])('takes from %s no more than it says', (search, place) => {
  expect(readPlace(search)).toEqual(place)
})
