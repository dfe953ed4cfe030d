'use client'

import { Button } from '../../ui/button'
import { blankMeasure } from './measure'
import { isBlank } from './measure-drafts'
import type { Kept, MeasureStore } from './measure-store'

/** True while nothing was typed since the last great change: its own line beside the drawing takes it back. */
export const isFresh = ({ undo, measure }: Pick<Kept, 'undo' | 'measure'>): boolean => undo?.after === measure

const own = 'Your measure. It stays on this device and in the address.'
const saved = 'A saved measure. What you change stays in the address until you save it.'

/** Says whose numbers stand on the sheet, and offers the other sheets that there are. */
export function OriginBar({ kept, store }: { kept: Kept; store: MeasureStore }) {
  const { measure, origin, undo, earlier } = kept
  const example = origin === 'example'
  const clear = () => store.begin(blankMeasure, 'The sheet is cleared.')
  return (
    <div className="origin-bar no-print">
      {example ? (
        <p>
          <b>This is an example.</b> A stoop of two flights, so that you see what comes out.
        </p>
      ) : (
        <p>{store.saved ? saved : own}</p>
      )}
      {undo && !isFresh(kept) && (
        <Button variant="quiet" onClick={store.undo} aria-label={`Undo: ${undo.says}`}>
          Undo
        </Button>
      )}
      {earlier && (
        <Button variant="quiet" onClick={() => store.begin(earlier, 'Your earlier measure stands on the sheet.')}>
          {example ? 'Back to your measure' : 'Your earlier measure'}
        </Button>
      )}
      {!example && !store.saved && (
        <Button variant="quiet" onClick={store.showExample}>
          See the example
        </Button>
      )}
      {!isBlank(measure) && (
        <Button variant={example ? 'primary' : 'quiet'} onClick={clear}>
          {example ? 'Clear it and put in your own' : 'Clear the sheet'}
        </Button>
      )}
    </div>
  )
}
