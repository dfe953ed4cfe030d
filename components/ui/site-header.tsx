import Link from 'next/link'
import { AccountCorner } from './account-corner'
import { HeatLine } from './heat-line'
import { PlaceLinks } from './place-links'
import { PreferencesButton } from './preferences'

/** Name, places, how the reader reads, account; under it the heat line. */
export function SiteHeader() {
  return (
    <header className="site-header">
      <a href="#main" className="skip-link">
        Skip to the page
      </a>
      <div className="flex min-h-[68px] items-center gap-9 px-10 max-sm:min-h-[56px] max-sm:gap-4 max-sm:px-4">
        <Link href="/" prefetch={false} className="logo">
          <Mark />
          Longpoint
        </Link>
        <nav aria-label="Places" className="flex gap-7 self-stretch max-sm:hidden">
          <PlaceLinks className="nav-link" />
        </nav>
        <div className="ml-auto flex gap-7 self-stretch max-sm:gap-4">
          <PreferencesButton />
          <AccountCorner />
        </div>
      </div>
      <HeatLine />
    </header>
  )
}

/** A rake meeting a level run, and the cut between them. */
const Mark = () => (
  <svg width="34" height="26" viewBox="0 0 34 26" aria-hidden="true">
    <path d="M2 22 17 8H32" fill="none" stroke="var(--chalk)" strokeWidth="6" />
    <path d="M14 1 21 16" stroke="var(--straw)" strokeWidth="2.5" />
  </svg>
)
