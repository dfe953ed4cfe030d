import type { Sheet } from '@/lib/print/sheet/sheet'
import { Pieces } from './pieces'
import { Qr } from './qr'

/** Where the sheet is found again, what to mind, and the ruler that tells whether the printer kept the size. */
export function SheetFoot({ sheet: { address, cautions, reading } }: { sheet: Sheet }) {
  return (
    <footer className="printed-foot">
      <Qr address={address} label="QR code of this sheet’s address" />
      <div className="printed-cautions">
        {cautions.map((line, i) => (
          <p key={i}>
            <Pieces line={line} reading={reading} />
          </p>
        ))}
      </div>
      <svg className="printed-ruler" viewBox="0 0 288 34" role="img" aria-label="Print check: 3 inches exactly">
        <path d="M.5 8V28M.5 18H287.5M287.5 8V28M96 12V24M192 12V24" stroke="currentColor" fill="none" />
        <text x="144" y="10" textAnchor="middle" fontSize="12" fill="currentColor">
          print check: 3 in exactly
        </text>
      </svg>
    </footer>
  )
}
