import { useCallback, useState } from 'react'

export const widthSteps = [300, 340, 480, 640, 760, 960] as const
export type WidthStep = (typeof widthSteps)[number]

/** Server pages are drawn for a desk; the browser measures and corrects at once. */
const before: WidthStep = 760

/** Widest step that its frame holds, so that a drawing is composed a few times, not at every pixel. */
export function useWidthStep(): [(frame: HTMLElement | null) => (() => void) | undefined, WidthStep] {
  const [step, setStep] = useState<WidthStep>(before)
  const ref = useCallback((frame: HTMLElement | null) => {
    if (!frame || typeof ResizeObserver === 'undefined') return undefined
    const observer = new ResizeObserver(([entry]) => {
      const width = entry?.contentRect.width ?? before
      setStep(widthSteps.findLast((s) => s <= width) ?? widthSteps[0])
    })
    observer.observe(frame)
    return () => observer.disconnect()
  }, [])
  return [ref, step]
}
