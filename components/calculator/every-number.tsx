import type { Values } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { Output, OutputGroup, Outputs } from '@/lib/calculators/outputs'
import { Reading } from './reading'

interface EveryNumberProps {
  outputs: Outputs
  solved: Values
  precision: Precision
  units: 'in' | 'mm'
}

/** Everything the entry says, with its label: lists as tables, sets within sets indented. */
export function EveryNumber({ outputs, solved, precision, units }: EveryNumberProps) {
  return (
    <dl className="every-number">
      {Object.entries(outputs)
        .filter(([name, output]) => output.kind !== 'shape' && solved[name] !== undefined)
        .map(([name, output]) => (
          <div key={name}>
            <dt>{output.label}</dt>
            <dd>
              <Shown output={output} value={solved[name]} precision={precision} units={units} />
            </dd>
          </div>
        ))}
    </dl>
  )
}

interface ShownProps {
  output: Output
  value: unknown
  precision: Precision
  units: 'in' | 'mm'
}

function Shown({ output, value, precision, units }: ShownProps) {
  if (value === null || output.kind === 'shape') return <>none</>
  if (output.kind === 'value') return <Reading output={output} value={value} precision={precision} units={units} />
  if (output.kind === 'group')
    return <EveryNumber outputs={output.of} solved={value as Values} precision={precision} units={units} />
  const items = Array.isArray(value) ? (value as unknown[]) : []
  if (items.length === 0) return <>none</>
  if (output.of.kind === 'group') return <Rows of={output.of} items={items} precision={precision} units={units} />
  const { of } = output
  return (
    <ul className="flex flex-wrap gap-x-4 gap-y-1">
      {items.map((item, i) => (
        <li key={i}>
          <Shown output={of} value={item} precision={precision} units={units} />
        </li>
      ))}
    </ul>
  )
}

/** A list of alike sets: a row each. */
function Rows({
  of,
  items,
  precision,
  units,
}: {
  of: OutputGroup
  items: readonly unknown[]
  precision: Precision
  units: 'in' | 'mm'
}) {
  const columns = Object.entries(of.of).filter(([, column]) => column.kind !== 'shape')
  return (
    <div className="table-scroll" tabIndex={0} role="region" aria-label={of.label}>
      <table>
        <thead>
          <tr>
            {columns.map(([name, { label }]) => (
              <th key={name} scope="col">
                {label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {items.map((item, i) => (
            <tr key={i}>
              {columns.map(([name, column]) => (
                <td key={name}>
                  <Shown output={column} value={(item as Values)[name] ?? null} precision={precision} units={units} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
