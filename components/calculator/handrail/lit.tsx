'use client'

import { createContext, use, useMemo, useState, type ReactNode } from 'react'

interface Lit {
  /** Mark of the part that is pointed at, anywhere on the page. */
  lit: string | null
  light: (mark: string | null) => void
}

const LitContext = createContext<Lit>({ lit: null, light: () => undefined })

export const useLit = (): Lit => use(LitContext)

/** Pointing at a part in one place lights it in all others. */
export function LitProvider({ children }: { children: ReactNode }) {
  const [lit, light] = useState<string | null>(null)
  const value = useMemo(() => ({ lit, light }), [lit])
  return <LitContext value={value}>{children}</LitContext>
}

/** What an element of a part carries so that pointing at it, or coming to it by key, lights the part. */
export function usePartLight(mark: string | undefined) {
  const { lit, light } = useLit()
  if (mark === undefined) return {}
  return {
    'data-lit': lit === mark || undefined,
    onPointerEnter: () => light(mark),
    onPointerLeave: () => light(null),
    onFocus: () => light(mark),
    onBlur: () => light(null),
  }
}

/** The mark of a part on its disc; a tap lights it. */
export function PartMark({ mark }: { mark: string }) {
  const { lit, light } = useLit()
  return (
    <button
      type="button"
      className="part-mark"
      aria-label={`Part ${mark}: light it in the drawing`}
      aria-pressed={lit === mark}
      onClick={() => light(mark)}
    >
      <span aria-hidden="true">{mark}</span>
    </button>
  )
}
