'use client'

import type { PointerEvent, ReactNode } from 'react'
import type { PadKey } from './pad-text'

const BackSign = () => (
  <svg
    width="30"
    height="20"
    viewBox="0 0 30 20"
    aria-hidden="true"
    fill="none"
    stroke="currentColor"
    strokeWidth="2.4"
    className="inline"
  >
    <path d="M9 2h19v16H9L2 10zM14 6l8 8m0-8-8 8" />
  </svg>
)

const rows: readonly { key: PadKey; name: ReactNode; says?: string }[] = [
  { key: '1', name: '1' },
  { key: '2', name: '2' },
  { key: '3', name: '3' },
  { key: 'ft', name: 'ft', says: 'feet' },
  { key: '4', name: '4' },
  { key: '5', name: '5' },
  { key: '6', name: '6' },
  { key: '-', name: '−', says: 'minus' },
  { key: '7', name: '7' },
  { key: '8', name: '8' },
  { key: '9', name: '9' },
  { key: 'back', name: <BackSign />, says: 'take the last one back' },
  { key: '.', name: '.', says: 'point' },
  { key: '0', name: '0' },
]

/** The field keeps the focus, and with it its place on the page. */
const keepFocus = (event: PointerEvent) => event.preventDefault()

interface PadProps {
  onKey: (key: PadKey) => void
  onNext: () => void
  /** Brings the device's own keyboard, for whoever wants to write. */
  onKeyboard: () => void
}

/** Keys for gloves, 56 px high. */
export function Pad({ onKey, onNext, onKeyboard }: PadProps) {
  return (
    <div className="pad" role="group" aria-label="Number pad">
      {rows.map(({ key, name, says }) => (
        <button
          key={key}
          type="button"
          className="pad-key"
          aria-label={says}
          onPointerDown={keepFocus}
          onClick={() => onKey(key)}
        >
          {name}
        </button>
      ))}
      <button
        type="button"
        className="pad-key pad-word"
        onPointerDown={keepFocus}
        onClick={onKeyboard}
        aria-label="Write with the keyboard"
      >
        abc
      </button>
      <button type="button" className="pad-key pad-next" onPointerDown={keepFocus} onClick={onNext}>
        Next
      </button>
    </div>
  )
}
