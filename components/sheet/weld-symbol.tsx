import { tubeJointSymbol } from '@/lib/print/sheet/weld-symbol'

const { width, height, lines, circle, arrowhead, words } = tubeJointSymbol
const path = (spots: readonly (readonly [number, number])[]) => `M${spots.map(([x, y]) => `${x} ${y}`).join('L')}`

/** The welding symbol of a mitered tube joint. */
export function WeldSymbol() {
  return (
    <svg
      className="printed-symbol"
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label="Welding symbol: square groove, all around, flush, ground"
    >
      <g fill="none" stroke="currentColor" strokeWidth="1.5">
        {lines.map((spots, i) => (
          <path key={i} d={path(spots)} />
        ))}
        <circle cx={circle.at[0]} cy={circle.at[1]} r={circle.radius} />
      </g>
      <path d={`${path(arrowhead)}Z`} fill="currentColor" />
      {words.map(({ at, text, size, centred }) => (
        <text
          key={text}
          x={at[0]}
          y={at[1]}
          fontSize={size}
          textAnchor={centred ? 'middle' : 'start'}
          fill="currentColor"
        >
          {text}
        </text>
      ))}
    </svg>
  )
}
