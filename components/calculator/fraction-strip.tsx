'use client'

import { useRef, type KeyboardEvent, type PointerEvent } from 'react'
import { ticksOf } from './strip-ticks'

interface FractionStripProps {
  /** Divisions of the inch (or of the degree). */
  den: number
  /** Where the number lies within its inch: 0 up to, not with, 1; null when there is no number. */
  part: number | null
  /** A division was chosen: 0 to den − 1. */
  onPick: (divisions: number) => void
  label: string
}

const width = 358
const height = 62
const margin = 13
const across = width - 2 * margin

/** One inch of tape: tap or slide to a division; the mark shows where the number lies. */
export function FractionStrip({ den, part, onPick, label }: FractionStripProps) {
  const strip = useRef<SVGSVGElement>(null)
  const at = part === null ? null : part * den
  const nearest = at === null ? 0 : Math.min(Math.round(at), den - 1)
  const pick = (event: PointerEvent) => {
    const box = strip.current?.getBoundingClientRect()
    if (!box) return
    const x = ((event.clientX - box.left) / box.width) * width
    onPick(Math.min(den - 1, Math.max(0, Math.round(((x - margin) / across) * den))))
  }
  const step = (event: KeyboardEvent) => {
    const by = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 }[event.key]
    if (by === undefined) return
    event.preventDefault()
    onPick((nearest + by + den) % den)
  }
  return (
    <svg
      ref={strip}
      className="strip"
      viewBox={`0 0 ${width} ${height}`}
      preserveAspectRatio="none"
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={den - 1}
      aria-valuenow={nearest}
      aria-valuetext={nearest === 0 ? 'none' : `${nearest}/${den}`}
      onKeyDown={step}
      onPointerDown={(event) => {
        event.preventDefault()
        event.currentTarget.setPointerCapture?.(event.pointerId)
        pick(event)
      }}
      onPointerMove={(event) => event.buttons > 0 && pick(event)}
    >
      {at !== null && (
        <rect className="strip-mark" x={margin + (at / den) * across - 11} y={0} width={22} height={height} />
      )}
      {ticksOf(den).map(({ place, length, name, strong }) => (
        <g key={place}>
          <line
            x1={margin + place * across}
            x2={margin + place * across}
            y1={0}
            y2={length}
            strokeWidth={strong ? 2.4 : 1.6}
          />
          {name && (
            <text x={margin + place * across} y={height - 6}>
              {name}
            </text>
          )}
        </g>
      ))}
    </svg>
  )
}
