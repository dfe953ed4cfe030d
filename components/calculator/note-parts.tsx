import Link from 'next/link'
import type { ReactNode } from 'react'
import { isCalculatorId } from '@/lib/calculators/load'
import { CautionPanel } from '../ui/caution-panel'
import type { SignalWord } from '../ui/caution-word'

/** A way from prose to the calculator that does it. Prose that names none that exists stops the build. */
function Way({ id, children }: { id: string; children: ReactNode }) {
  if (!isCalculatorId(id)) throw new RangeError(`A note names the calculator ${id}, which does not exist.`)
  return (
    <p className="note-way">
      <Link href={`/handbook/${id}`} prefetch={false}>
        {children}
      </Link>
    </p>
  )
}

const Signal = ({ signal, children }: { signal: SignalWord; children: ReactNode }) => (
  <CautionPanel signal={signal} className="my-7">
    {children}
  </CautionPanel>
)

/** Parts that prose in content/notes may use. */
export const noteParts = { Way, Signal }
