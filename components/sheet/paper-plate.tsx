import { compose, type Viewport } from '@/lib/drawing/compose'
import type { Sketch } from '@/lib/drawing/sketch'
import { PlateLabels } from '../drawing/plate-labels'
import { PlateMarks } from '../drawing/plate-marks'
import styles from '../drawing/plate.module.css'

interface PaperPlateProps {
  sketch: Sketch
  title: string
  viewport: Viewport
}

/** A drawing composed once for paper: black on white, of one size however wide the screen is. */
export function PaperPlate({ sketch, title, viewport }: PaperPlateProps) {
  const plate = compose(sketch, viewport)
  return (
    <div className={`${styles.frame} ${styles.paper} printed-plate`}>
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
}
