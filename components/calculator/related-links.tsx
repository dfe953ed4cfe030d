'use client'

import Link from 'next/link'
import type { Fields } from '@/lib/calculators/fields'
import type { RawInputs } from './address'
import { relatedHref, type Related } from './related'

/** Where people go on to; numbers that both share go along. */
export function RelatedLinks({
  related,
  fields,
  raw,
}: {
  related: readonly Related[]
  fields: Fields
  raw: RawInputs
}) {
  if (related.length === 0) return null
  return (
    <section aria-labelledby="related" className="no-print">
      <h2 id="related">Goes with it</h2>
      <ul className="related">
        {related.map((each) => (
          <li key={each.id}>
            <Link href={relatedHref(each, fields, raw)} prefetch={false}>
              <b>{each.name}</b>
              <span>{each.asks}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  )
}
