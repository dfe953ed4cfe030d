import type { Metadata } from 'next'
import Link from 'next/link'
import { HandbookList } from '@/components/calculator/handbook-list'
import { stages } from '@/components/calculator/stages'
import { ButtonLink } from '@/components/ui/button'
import { allCalculators } from '@/lib/calculators'

export const metadata: Metadata = {
  title: 'Handbook',
  description:
    'Calculators for the stair rail, from the field measure to the cut sheet, each with its drawing and its working.',
}

export default async function HandbookPage() {
  const all = await allCalculators()
  const listed = all.map(({ id, stage, name, asks, alsoCalled }) => ({ id, stage, name, asks, alsoCalled }))
  const handrail = all.find(({ id }) => id === 'handrail')
  return (
    <>
      <h1>Handbook</h1>
      <p className="lede">
        One question, one page: the number, a drawing of it to scale, how it works out, and what to mind.
      </p>
      {handrail && (
        <section className="hero-plate mb-9">
          <h2 className="text-[38px]">{handrail.name}</h2>
          <p className="my-3 max-w-[56ch]">{handrail.lede}</p>
          <ButtonLink href="/handbook/handrail" prefetch={false} variant="on-plate">
            Measure the stair
          </ButtonLink>
        </section>
      )}
      <HandbookList calculators={listed} stages={stages} />
      <section className="my-9">
        <h2>To read first</h2>
        <ul className="handbook-list">
          <li>
            <Link href="/handbook/taking-the-measure" prefetch={false}>
              <b>Taking the measure</b>
              <span>Three tapes, the plumb, the nosings: a field measure that closes.</span>
            </Link>
          </li>
        </ul>
      </section>
    </>
  )
}
