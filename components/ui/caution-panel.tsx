import type { ReactNode } from 'react'
import { signalColours, type SignalWord } from './caution-word'
import { classNames } from './class-names'

/** Signal panel in the manner of ANSI Z535: the word, its colour, the sentence. A notice has no alert sign. */
export function CautionPanel({
  signal,
  children,
  className,
}: {
  signal: SignalWord
  children: ReactNode
  className?: string
}) {
  return (
    <div
      role="note"
      aria-label={signal}
      className={classNames('caution rounded-[3px] border-2 border-ink bg-field', className)}
    >
      <p
        className={classNames(
          'flex items-center gap-2 border-b-2 border-ink px-3.5 py-1 font-head text-xl font-semibold tracking-[.06em]',
          signalColours[signal],
        )}
      >
        {signal !== 'notice' && <AlertSign />}
        {signal.toUpperCase()}
      </p>
      <div className="px-3.5 pt-2 pb-3 text-base">{children}</div>
    </div>
  )
}

const AlertSign = () => (
  <svg width="20" height="18" viewBox="0 0 20 18" aria-hidden="true">
    <path d="M10 0 20 18H0Z" fill="currentColor" />
    <path d="M10 6v6M10 14v2" stroke="var(--sign-hole, #fff)" strokeWidth="2" />
  </svg>
)
