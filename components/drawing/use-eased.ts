import { useEffect, useRef, useState } from 'react'
import { blend } from '@/lib/drawing/blend'
import type { Plate } from '@/lib/drawing/plate'

const easeMs = 140

/** Browsers too old to say are not moved either. */
function prefersStill(): boolean {
  return typeof window.matchMedia !== 'function' || window.matchMedia('(prefers-reduced-motion: reduce)').matches
}

/** Lets a drawing slide to its new numbers, unless the reader asked for less motion or the drawing changed shape. */
export function useEased(plate: Plate): Plate {
  const [shown, setShown] = useState(plate)
  const last = useRef(plate)
  useEffect(() => {
    const from = last.current
    if (from === plate) return undefined
    const still = prefersStill()
    const start = performance.now()
    const settle = () => {
      last.current = plate
      setShown(plate)
    }
    const step = (now: number) => {
      const share = (now - start) / easeMs
      const between = still || share >= 1 ? null : blend(from, plate, share)
      if (!between) return settle()
      last.current = between
      setShown(between)
      frame = requestAnimationFrame(step)
    }
    let frame = requestAnimationFrame(step)
    return () => cancelAnimationFrame(frame)
  }, [plate])
  return shown
}
