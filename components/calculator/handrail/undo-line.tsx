'use client'

import { useEffect, useRef } from 'react'
import { Button } from '../../ui/button'
import type { Kept, MeasureStore } from './measure-store'
import { isFresh } from './origin-bar'

/** What just happened to the sheet and the way back, in sight wherever the sheet stands. */
export function UndoLine({ kept, store }: { kept: Kept; store: MeasureStore }) {
  const button = useRef<HTMLButtonElement>(null)
  const { undo } = kept
  const fresh = isFresh(kept)
  useEffect(() => {
    // What was pressed may be gone with the card that it stood on: the hand is not left on nothing.
    if (fresh && document.activeElement === document.body) button.current?.focus({ preventScroll: true })
  }, [fresh, undo])
  return (
    <div className="undo-line no-print" role="status">
      {fresh && undo && (
        <>
          <span>{undo.says}</span>
          <Button ref={button} variant="quiet" onClick={store.undo}>
            Undo
          </Button>
        </>
      )}
    </div>
  )
}
