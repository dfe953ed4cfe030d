'use client'

import Link from 'next/link'
import { useMe } from './me'

/** Sign-in or the account, at the end of the header. Holds its room while it does not know. */
export function AccountCorner() {
  const me = useMe()
  if (me === undefined)
    return (
      <span className="nav-link invisible" aria-hidden="true">
        Sign in
      </span>
    )
  if (me === null)
    return (
      <Link href="/sign-in" prefetch={false} className="nav-link">
        Sign in
      </Link>
    )
  return (
    <Link href="/account" prefetch={false} className="nav-link max-w-[12ch] truncate" title={`Account of ${me.name}`}>
      {me.name}
    </Link>
  )
}
