import { ButtonLink } from '@/components/ui/button'

/** A mark that lies off the tape. */
export default function NotFound() {
  return (
    <article className="off-tape">
      <OffTape />
      <h1>That mark is not on this tape</h1>
      <p className="lede">There is no page at this address. It may have moved, or a letter of the link went missing.</p>
      <div className="flex flex-wrap gap-3">
        <ButtonLink href="/handbook" prefetch={false} variant="primary">
          Open the handbook
        </ButtonLink>
        <ButtonLink href="/" prefetch={false}>
          Front page
        </ButtonLink>
      </div>
    </article>
  )
}

const OffTape = () => (
  <svg viewBox="0 0 520 90" className="mb-8 block h-auto w-full max-w-[520px]" aria-hidden="true">
    <path d="M0 10h330l-14 16 14 16-14 16 14 16H0z" fill="var(--tape)" />
    {Array.from({ length: 20 }, (_, i) => (
      <path
        key={i}
        d={`M${8 + i * 16} 10v${i % 4 === 0 ? 34 : i % 2 === 0 ? 24 : 15}`}
        stroke="var(--tape-ink)"
        strokeWidth={i % 4 === 0 ? 2.4 : 1.6}
      />
    ))}
    <path d="M450 82V30m-9 16 9-18 9 18z" stroke="var(--off)" fill="var(--off)" strokeWidth="2.4" />
  </svg>
)
