import { inkDashes } from '@/lib/drawing/inks'
import type { Mark } from '@/lib/drawing/plate'
import styles from './plate.module.css'

const px = (value: number) => value.toFixed(1)

function pathOf({ points, closed }: Mark): string {
  return `M${points.map((p) => `${px(p.x)} ${px(p.y)}`).join('L')}${closed ? 'Z' : ''}`
}

/** The lines of a composed drawing. */
export function PlateMarks({ marks, highlight }: { marks: readonly Mark[]; highlight: string | null }) {
  return marks.map((mark, i) => (
    <path
      key={i}
      d={pathOf(mark)}
      className={`${styles.mark} ${styles[mark.ink]}`}
      // The width is a custom property so that the bright sun theme can thicken every line at once.
      style={{ '--width': `${mark.width}px` } as React.CSSProperties}
      strokeDasharray={inkDashes[mark.ink]?.join(' ')}
      data-fill={mark.fill}
      data-part={mark.part}
      data-on={mark.part !== undefined && mark.part === highlight ? '' : undefined}
    />
  ))
}
