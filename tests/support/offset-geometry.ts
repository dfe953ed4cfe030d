import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js'
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js'
import LineSegment from 'jsts/org/locationtech/jts/geom/LineSegment.js'
import BufferOp from 'jsts/org/locationtech/jts/operation/buffer/BufferOp.js'
import BufferParameters from 'jsts/org/locationtech/jts/operation/buffer/BufferParameters.js'

/** A general geometry library, used as a second opinion on what the trade formulas say. */
export interface Spot {
  x: number
  y: number
}
export type Segment = readonly [Spot, Spot]

const coordinate = ({ x, y }: Spot) => new Coordinate(x, y)

/** Where the lines through two segments cross. */
export function crossing([a, b]: Segment, [c, d]: Segment): Spot {
  const first = new LineSegment(coordinate(a), coordinate(b))
  const { x, y }: Spot = first.lineIntersection(new LineSegment(coordinate(c), coordinate(d)))
  return { x, y }
}

/** Corners of the band of `depth` under a line, mitered at its knuckles and square at its ends. */
export function bandUnder(line: readonly Spot[], depth: number): Spot[] {
  const style = new BufferParameters(8, BufferParameters.CAP_FLAT, BufferParameters.JOIN_MITRE, 1000)
  style.setSingleSided(true)
  // Left as it is, shallow knuckles would be simplified away.
  style.setSimplifyFactor(0)
  const path = new GeometryFactory().createLineString(line.map(coordinate))
  const ring: Spot[] = BufferOp.bufferOp(path, -depth, style).getCoordinates()
  return ring.slice(1).map(({ x, y }) => ({ x, y }))
}
