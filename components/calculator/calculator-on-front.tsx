'use client'

import type { CalculatorId } from '@/lib/calculators/load'
import { ButtonLink } from '../ui/button'
import { writeAddress } from './address'
import { Bench } from './bench'
import { useBench } from './use-bench'

/** A bench that works where it stands, and leads to its own page with the numbers typed here. */
export function CalculatorOnFront({ id }: { id: CalculatorId }) {
  const bench = useBench(id)
  return (
    <Bench bench={bench} padDown>
      <div className="actions">
        <ButtonLink
          variant="primary"
          prefetch={false}
          href={`/handbook/${id}${writeAddress(bench.calculator.inputs, bench.raw)}`}
        >
          How it works out
        </ButtonLink>
      </div>
    </Bench>
  )
}
