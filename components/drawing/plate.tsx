'use client'

import { useId, useMemo } from 'react'
import { compose } from '@/lib/drawing/compose'
import type { Show, Sketch } from '@/lib/drawing/sketch'
import styles from './plate.module.css'
import { PlateMarks } from './plate-marks'
import { PlateLabels } from './plate-labels'
import { compactBelow, viewportFor, type PlateShape } from './plate-viewport'
import { useEased } from './use-eased'
import { useWidthStep } from './use-width-step'

interface PlateProps {
  /** The drawing, or how to draw it at the detail that its width holds. */
  sketch: Sketch | ((detail: Show['detail']) => Sketch)
  /** What the drawing is of; its numbers are said by the sketch itself. */
  title: string
  tone?: 'plate' | 'paper'
  shape?: PlateShape
  /** The part to light, by its mark. */
  highlight?: string | null
  onHighlight?: (part: string | null) => void
}

/** A drawing to scale: chalk on a plate or black on paper, composed for the width it is given. */
export function Plate({ sketch, title, tone = 'plate', shape = 'plate', highlight = null, onHighlight }: PlateProps) {
  const id = useId()
  const [frame, step] = useWidthStep()
  const composed = useMemo(() => {
    const drawn = typeof sketch === 'function' ? sketch(step < compactBelow ? 'compact' : 'full') : sketch
    return compose(drawn, viewportFor(step, shape))
  }, [sketch, step, shape])
  const plate = useEased(composed)
  const point = (target: EventTarget) =>
    onHighlight?.(target instanceof Element ? (target.closest('[data-part]')?.getAttribute('data-part') ?? null) : null)
  return (
    <div ref={frame} className={`${styles.frame} ${styles[tone]}`} data-lit={highlight ?? undefined}>
      <svg
        className={styles.svg}
        viewBox={`0 0 ${plate.width} ${Math.round(plate.height)}`}
        role="img"
        aria-labelledby={`${id}-title ${id}-says`}
        onPointerOver={(event) => point(event.target)}
        onPointerLeave={() => onHighlight?.(null)}
      >
        <title id={`${id}-title`}>{title}</title>
        <desc id={`${id}-says`}>{plate.says}</desc>
        <PlateMarks marks={plate.marks} highlight={highlight} />
        <PlateLabels labels={plate.labels} highlight={highlight} />
      </svg>
    </div>
  )
}
