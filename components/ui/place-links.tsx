'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { placeOf, places } from './places'

/** Links to the places; the one that is open is marked. */
export function PlaceLinks({ className }: { className: string }) {
  const open = placeOf(usePathname())
  return places.map(({ href, name }) => (
    <Link
      key={href}
      href={href}
      prefetch={false}
      className={className}
      aria-current={href === open ? 'page' : undefined}
    >
      {name}
    </Link>
  ))
}
