import type { CodeRow } from '@/lib/trade/code-rows'

const names: Readonly<Record<string, string>> = {
  'height-34-38': 'Rail height',
  'height-30-38-osha': 'Rail height',
  'top-extension-12': 'Extension at the top',
  'bottom-extension-tread': 'Extension at the bottom',
  'grip-1.25-2': 'Grip',
  'wall-clearance-1.5': 'Clearance to the wall',
  'finger-clearance-2.25-osha': 'Clearance for fingers',
  'riser-tread-ibc': 'Riser and tread',
  'riser-tread-irc': 'Riser and tread',
  'stair-angle-osha': 'Angle of the stair',
  'riser-spread': 'Spread of the risers',
}

const verdict = (ok: boolean | null) => (ok === null ? 'not measured' : ok ? 'within' : 'off')

function valueText(value: CodeRow['value']): string {
  if (value === null) return '–'
  return typeof value === 'number' ? `${Number(value.toFixed(3))} in` : value
}

/** Figures of this rail beside limits as printed. */
export function CodeRows({ rows }: { rows: readonly CodeRow[] }) {
  return (
    <section aria-labelledby="code-rows">
      <h2 id="code-rows">Code rows</h2>
      <p className="rail-says">
        Your figures beside limits as printed. The adopted local code and a licensed professional decide.
      </p>
      <div className="table-scroll" tabIndex={0} role="region" aria-label="Rows, limits and sources">
        <table>
          <thead>
            <tr>
              {['Row', 'Yours', 'Limit', '', 'Source'].map((head) => (
                <th key={head} scope="col">
                  {head || <span className="sr-only">Stands</span>}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ id, ok, value, limit, source }) => (
              <tr key={id}>
                <td>{names[id] ?? id}</td>
                <td className="font-mono">{valueText(value)}</td>
                <td>{limit}</td>
                <td className="code-word" data-off={ok === false || undefined}>
                  {verdict(ok)}
                </td>
                <td>{source}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  )
}
