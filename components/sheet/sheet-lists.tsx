import type { List, SheetReading } from '@/lib/print/sheet/sheet'
import { Pieces } from './pieces'
import { WeldSymbol } from './weld-symbol'

/** Lists beside each other, under each other on a phone. */
export function SheetLists({ lists, reading }: { lists: readonly List[]; reading: SheetReading }) {
  return (
    <div className="printed-lists">
      {lists.map((list) => (
        <section key={list.title}>
          {list.symbol && <WeldSymbol />}
          <h3>{list.title}</h3>
          <dl>
            {list.rows.map(({ name, line, under }, i) => (
              <div key={i}>
                <dt>{name}</dt>
                <dd>
                  <Pieces line={line} reading={reading} />
                  {under && (
                    <small>
                      <Pieces line={under} reading={reading} />
                    </small>
                  )}
                </dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
    </div>
  )
}
