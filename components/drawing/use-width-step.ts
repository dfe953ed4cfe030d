import { useCallback, useState } from 'react'
import { deskWidth, stepFor } from './plate-viewport'

/** The step of width that a frame holds, followed as it changes; a desk's until it was measured. */
export function useWidthStep(): [(frame: HTMLElement | null) => (() => void) | undefined, number] {
  const [step, setStep] = useState(deskWidth)
  const ref = useCallback((frame: HTMLElement | null) => {
    if (!frame || typeof ResizeObserver === 'undefined') return undefined
    const observer = new ResizeObserver(([entry]) => setStep(stepFor(entry?.contentRect.width ?? deskWidth)))
    observer.observe(frame)
    return () => observer.disconnect()
  }, [])
  return [ref, step]
}
