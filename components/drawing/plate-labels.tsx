import { shapeOutline } from '@/lib/drawing/shapes'
import type { PlacedLabel, PlacedRun } from '@/lib/drawing/plate'
import type { LabelInk } from '@/lib/drawing/sketch'
import styles from './plate.module.css'

const inkClass: Readonly<Record<LabelInk, string | undefined>> = {
  text: styles.text,
  quiet: styles.quietText,
  cut: styles.cutText,
  off: styles.offText,
  'on-tape': styles.onTape,
}

/** The words of a composed drawing: real text, so that it stays crisp and can be selected. */
export function PlateLabels({ labels, highlight }: { labels: readonly PlacedLabel[]; highlight: string | null }) {
  return labels.map((label, i) => (
    <g key={i} data-part={label.part} data-on={label.part !== undefined && label.part === highlight ? '' : undefined}>
      {label.badge === 'disc' && (
        <circle className={styles.disc} cx={label.box.x} cy={label.box.y} r={label.box.halfWidth} />
      )}
      <g
        className={styles.words}
        transform={`translate(${label.x.toFixed(1)} ${label.y.toFixed(1)}) rotate(${label.turn.toFixed(2)})`}
      >
        <text>{label.runs.map((run, j) => run.kind === 'text' && <TextRun key={j} run={run} />)}</text>
        {label.runs.map((run, j) => run.kind === 'shape' && <ShapeRun key={j} run={run} />)}
      </g>
    </g>
  ))
}

function TextRun({ run }: { run: Extract<PlacedRun, { kind: 'text' }> }) {
  return (
    <tspan
      x={run.x.toFixed(2)}
      y={run.y.toFixed(2)}
      fontSize={run.size.toFixed(2)}
      className={`${styles[run.face]} ${inkClass[run.ink]}`}
    >
      {run.text}
    </tspan>
  )
}

function ShapeRun({ run }: { run: Extract<PlacedRun, { kind: 'shape' }> }) {
  const points = shapeOutline(run).map((p) => `${p.x.toFixed(2)},${p.y.toFixed(2)}`)
  return <polygon points={points.join(' ')} className={inkClass[run.ink]} />
}
