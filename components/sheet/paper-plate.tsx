import { memo } from 'react'
import { compose } from '@/lib/drawing/compose'
import type { Sketch } from '@/lib/drawing/sketch'
import { pictureViewport, stripViewport } from '@/lib/print/sheet/picture-room'
import { PlateLabels } from '../drawing/plate-labels'
import { PlateMarks } from '../drawing/plate-marks'
import { viewportFor } from '../drawing/plate-viewport'
import styles from '../drawing/plate.module.css'

interface PaperPlateProps {
  sketch: Sketch
  title: string
  /** A number is the printed page with so many px of room. */
  on: number | 'desk' | 'phone' | 'strip'
}

function viewportOf(on: PaperPlateProps['on']) {
  if (on === 'strip') return stripViewport
  return on === 'phone' ? viewportFor(340, 'plate') : pictureViewport(on === 'desk' ? 400 : on)
}

/** A drawing composed once for its paper, black on white. Composing takes a moment: it is done anew only for another drawing. */
export const PaperPlate = memo(function PaperPlate({ sketch, title, on }: PaperPlateProps) {
  const plate = compose(sketch, viewportOf(on))
  return (
    <div className={`${styles.frame} ${styles.paper} printed-plate`} data-on={typeof on === 'number' ? 'print' : on}>
      <svg
        className={styles.svg}
        viewBox={`0 0 ${plate.width} ${Math.round(plate.height)}`}
        role="img"
        aria-label={`${title}. ${plate.says}`}
      >
        <PlateMarks marks={plate.marks} highlight={null} />
        <PlateLabels labels={plate.labels} highlight={null} />
      </svg>
    </div>
  )
})
