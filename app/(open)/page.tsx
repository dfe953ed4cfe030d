import Link from 'next/link'
import { CalculatorOnFront } from '@/components/calculator/calculator-on-front'
import { NeedsScripts } from '@/components/calculator/needs-scripts'
import { stages } from '@/components/calculator/stages'
import { ButtonLink } from '@/components/ui/button'
import { allCalculators } from '@/lib/calculators'

const ways = [
  {
    who: 'You are learning',
    says: 'Read how to take the measure, then work each number yourself and hold it against the handbook.',
    href: '/handbook/taking-the-measure',
    name: 'Take the measure',
  },
  {
    who: 'You teach',
    says: 'Every calculator shows its formula, its numbers, its sources, and the printed values it was checked against.',
    href: '/handbook',
    name: 'Open the handbook',
  },
  {
    who: 'You are on the job',
    says: 'Measure the stair, get the whole rail cut by cut, and keep the cut sheets in a job book of your own shop.',
    href: '/start',
    name: 'Start a job book',
  },
] as const

export default async function FrontPage() {
  const all = await allCalculators()
  return (
    <article className="calculator front">
      <h1>Measure the stair. Set the saw. Cut it once.</h1>
      <p className="lede">
        Longpoint teaches apprentice welders to build a stair rail that fits the first time, and gives the whole shop
        one set of numbers, from the field measure to the cut sheet.
      </p>
      <NeedsScripts />
      <CalculatorOnFront id="miter" />
      <div className="front-below">
        <section aria-labelledby="handrail-way" className="hero-plate">
          <h2 id="handrail-way" className="text-[38px]">
            The whole rail at once
          </h2>
          <p className="my-3 max-w-[56ch]">
            Flights, landings, level runs, returns: give the stair as you measured it, and get every part with its saw
            setting and long point.
          </p>
          <ButtonLink href="/handbook/handrail" prefetch={false} variant="on-plate">
            Measure a stair
          </ButtonLink>
        </section>
        <section aria-labelledby="ways">
          <h2 id="ways">Ways in</h2>
          <ul className="ways">
            {ways.map(({ who, says, href, name }) => (
              <li key={who}>
                <h3>{who}</h3>
                <p className="mt-2 mb-4 text-mute">{says}</p>
                <ButtonLink href={href} prefetch={false} className="mt-auto">
                  {name}
                </ButtonLink>
              </li>
            ))}
          </ul>
        </section>
        <section aria-labelledby="stages">
          <h2 id="stages">Six stages</h2>
          <ol className="stages">
            {stages.map(({ id, name, says }) => (
              <li key={id}>
                <h3>{name}</h3>
                <p className="mt-1 text-mute">{says}</p>
                <ul className="mt-2">
                  {all
                    .filter(({ stage }) => stage === id)
                    .map((calculator) => (
                      <li key={calculator.id}>
                        <Link className="stage-link" href={`/handbook/${calculator.id}`} prefetch={false}>
                          {calculator.name}
                        </Link>
                      </li>
                    ))}
                </ul>
              </li>
            ))}
          </ol>
        </section>
      </div>
    </article>
  )
}
