'use client'

import { Button } from '../../ui/button'
import { blankMeasure } from './measure'
import type { HandrailState } from './use-handrail'

/** Says whose numbers stand on the sheet, and takes the last great change back. */
export function OriginBar({ origin, undo, store }: Pick<HandrailState, 'origin' | 'undo' | 'store'>) {
  const clear = () => store.begin(blankMeasure, 'The sheet is cleared.')
  return (
    <div className="origin-bar no-print">
      {origin === 'example' ? (
        <p>
          <b>This is an example.</b> A stoop of two flights, so that you see what comes out.
        </p>
      ) : (
        <p role="status">{undo?.says ?? 'Your measure. It stays on this device and in the address.'}</p>
      )}
      {undo && (
        <Button variant="quiet" onClick={store.undo}>
          Undo
        </Button>
      )}
      {origin === 'example' ? (
        <Button onClick={clear}>Clear it and put in your own</Button>
      ) : (
        <Button variant="quiet" onClick={clear}>
          Clear the sheet
        </Button>
      )}
    </div>
  )
}
