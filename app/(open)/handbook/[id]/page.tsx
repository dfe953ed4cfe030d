import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { CalculatorScreen } from '@/components/calculator/calculator-screen'
import { Proof } from '@/components/calculator/proof'
import { sharedInputs, type Related } from '@/components/calculator/related'
import { NeedsScripts } from '@/components/calculator/needs-scripts'
import { Sources } from '@/components/calculator/sources'
import { stageName } from '@/components/calculator/stages'
import { typesetAhead } from '@/components/calculator/typeset-ahead'
import type { AnyCalculator } from '@/lib/calculators/define'
import { calculatorIds, isCalculatorId, loadCalculator } from '@/lib/calculators/load'
import { readProof } from '@/lib/proof/read'
import { compareRow } from '@/lib/proof/rows'

interface Props {
  params: Promise<{ id: string }>
}

export const dynamicParams = false

/** The handrail is laid out by hand, on a page of its own. */
const ownPage: readonly string[] = ['handrail']

export const generateStaticParams = () => calculatorIds.filter((id) => !ownPage.includes(id)).map((id) => ({ id }))

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { id } = await params
  if (!isCalculatorId(id)) return {}
  const { name, lede } = await loadCalculator(id)
  return { title: name, description: lede }
}

/** The calculators that this one names and that exist. */
const relatedOf = ({ related, inputs }: AnyCalculator): Promise<Related[]> =>
  Promise.all(
    related.filter(isCalculatorId).map(async (id) => {
      const other = await loadCalculator(id)
      return { id, name: other.name, asks: other.asks, shares: sharedInputs(inputs, other.inputs) }
    }),
  )

export default async function CalculatorPage({ params }: Props) {
  const { id } = await params
  if (!isCalculatorId(id)) notFound()
  const calculator = await loadCalculator(id)
  const proof = await Promise.all((await readProof(id)).map((row) => compareRow(id, row)))
  return (
    <article className="calculator">
      <p className="crumb">
        <Link href="/handbook" prefetch={false}>
          Handbook
        </Link>{' '}
        · {stageName(calculator.stage)}
      </p>
      <h1>{calculator.name}</h1>
      <p className="lede">{calculator.lede}</p>
      <NeedsScripts />
      <CalculatorScreen id={id} typeset={typesetAhead(calculator)} related={await relatedOf(calculator)}>
        <Sources sources={calculator.sources} basis={calculator.basis} />
        <Proof rows={proof} outputs={calculator.outputs} />
      </CalculatorScreen>
    </article>
  )
}
