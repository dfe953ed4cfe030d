'use client'

import { CautionPanel } from '../../ui/caution-panel'
import type { HandrailState } from './use-handrail'

/** The cautions that stand with the whole rail. */
export function RailCautions({ cautions }: Pick<HandrailState, 'cautions'>) {
  return cautions
    .filter(({ beside }) => beside === undefined)
    .map(({ signal, text }) => (
      <CautionPanel key={text} signal={signal}>
        {text}
      </CautionPanel>
    ))
}
