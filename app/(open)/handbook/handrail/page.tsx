import type { Metadata } from 'next'
import Link from 'next/link'
import { HandrailAtWork } from '@/components/calculator/handrail/handrail-at-work'
import { NeedsScripts } from '@/components/calculator/needs-scripts'
import { Proof } from '@/components/calculator/proof'
import { sharedInputs } from '@/components/calculator/related'
import { RelatedLinks } from '@/components/calculator/related-links'
import { Sources } from '@/components/calculator/sources'
import { stageName } from '@/components/calculator/stages'
import { typesetAhead } from '@/components/calculator/typeset-ahead'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { isCalculatorId, loadCalculator } from '@/lib/calculators/load'
import { readProof } from '@/lib/proof/read'
import { compareRow } from '@/lib/proof/rows'

const calculator = asAny(handrail)

export const metadata: Metadata = { title: handrail.name, description: handrail.lede }

export default async function HandrailPage() {
  const proof = await Promise.all((await readProof('handrail')).map((row) => compareRow('handrail', row)))
  const related = await Promise.all(
    calculator.related.filter(isCalculatorId).map(async (id) => {
      const other = await loadCalculator(id)
      return { id, name: other.name, asks: other.asks, shares: sharedInputs(calculator.inputs, other.inputs) }
    }),
  )
  return (
    <article className="calculator handrail">
      <p className="crumb">
        <Link href="/handbook" prefetch={false}>
          Handbook
        </Link>{' '}
        · {stageName(handrail.stage)}
      </p>
      <h1>{handrail.name}</h1>
      <p className="lede">
        {handrail.lede}{' '}
        <Link href="/handbook/taking-the-measure" prefetch={false}>
          How to take the measure
        </Link>
      </p>
      <NeedsScripts />
      <HandrailAtWork
        typeset={typesetAhead(calculator)}
        aside={<RelatedLinks related={related} fields={calculator.inputs} raw={{}} />}
      >
        <Sources sources={handrail.sources} basis={handrail.basis} />
        <Proof rows={proof} outputs={handrail.outputs} />
      </HandrailAtWork>
    </article>
  )
}
