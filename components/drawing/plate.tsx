'use client'

import { useId, useMemo } from 'react'
import { compose, type Viewport } from '@/lib/drawing/compose'
import type { Show, Sketch } from '@/lib/drawing/sketch'
import styles from './plate.module.css'
import { PlateMarks } from './plate-marks'
import { PlateLabels } from './plate-labels'
import { useEased } from './use-eased'
import { useWidthStep, type WidthStep } from './use-width-step'

export type PlateShape = 'plate' | 'strip' | 'trim'

interface PlateProps {
  /** The drawing, or how to draw it at the detail that its width holds. */
  sketch: Sketch | ((detail: Show['detail']) => Sketch)
  /** What the drawing is of; its numbers are said by the sketch itself. */
  title: string
  tone?: 'plate' | 'paper'
  /** A full plate, a low strip, or as high as what is drawn. */
  shape?: PlateShape
  /** The part to light, by its mark. */
  highlight?: string | null
  onHighlight?: (part: string | null) => void
}

const heights: Readonly<Record<WidthStep, number>> = { 300: 290, 340: 310, 480: 400, 640: 500, 760: 590, 960: 660 }
const textScales: Readonly<Record<WidthStep, number>> = {
  300: 0.72,
  340: 0.76,
  480: 0.86,
  640: 0.95,
  760: 1,
  960: 1.05,
}

function viewportOf(step: WidthStep, shape: PlateShape): Viewport {
  const height = shape === 'strip' ? Math.round(step * 0.5) : heights[step]
  return { width: step, height, textScale: textScales[step], margin: step < 480 ? 12 : 22, trim: shape === 'trim' }
}

/** A drawing to scale: chalk on a plate or black on paper, composed for the width it is given. */
export function Plate({ sketch, title, tone = 'plate', shape = 'plate', highlight = null, onHighlight }: PlateProps) {
  const id = useId()
  const [frame, step] = useWidthStep()
  const composed = useMemo(() => {
    const drawn = typeof sketch === 'function' ? sketch(step < 480 ? 'compact' : 'full') : sketch
    return compose(drawn, viewportOf(step, shape))
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
