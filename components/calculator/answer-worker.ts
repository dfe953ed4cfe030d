import { answer, type Answered } from '@/lib/calculators/answer'
import type { Precision } from '@/lib/calculators/fields'
import { loadCalculator, type CalculatorId } from '@/lib/calculators/load'

export interface Asked {
  id: CalculatorId
  raw: unknown
  precision: Precision
}
/** Runs off the page's thread, so that a long list leaves the page lively. */
self.addEventListener('message', ({ data }: MessageEvent<Asked>) => {
  void loadCalculator(data.id).then((calculator) => {
    const said: Answered = answer(calculator, data.raw, data.precision)
    self.postMessage(said)
  })
})
