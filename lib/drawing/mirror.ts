import type { LabelRequest, Sketch, Spot, Stroke } from './sketch'
import type { Line, Run } from './text'

/** The same drawing going up the other way. Words stay readable; only arrows turn. */
export function mirror(sketch: Sketch): Sketch {
  return { ...sketch, strokes: sketch.strokes.map(mirrorStroke), labels: sketch.labels.map(mirrorLabel) }
}

const across = (spot: Spot): Spot => ({ ...spot, x: -spot.x, dx: -(spot.dx ?? 0) })

function mirrorStroke(stroke: Stroke): Stroke {
  if (stroke.kind === 'path') return { ...stroke, points: stroke.points.map(across) }
  return { ...stroke, centre: across(stroke.centre), from: 180 - stroke.to, to: 180 - stroke.from }
}

function mirrorLabel(label: LabelRequest): LabelRequest {
  const text = label.text.map(mirrorLine)
  if (label.kind === 'at')
    return { ...label, text, spot: across(label.spot), prefer: label.prefer.map((way) => 180 - way) }
  const ends = { from: across(label.from), to: across(label.to) }
  if (label.kind === 'along') return { ...label, ...ends, text }
  return { ...label, ...ends, text, side: label.side === 'left' ? 'right' : 'left' }
}

/** An arrow leads its word the way it points. */
function mirrorLine(line: Line): Line {
  if (!line.some((run) => run.kind === 'shape' && run.shape === 'arrow')) return line
  return line.toReversed().map((run): Run => {
    if (run.kind === 'shape' && run.shape === 'arrow') return { ...run, shape: 'arrow-left' }
    return run.kind === 'word' ? { ...run, text: ` ${run.text.trim()}` } : run
  })
}
