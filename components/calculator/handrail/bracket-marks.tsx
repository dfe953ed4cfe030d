'use client'

import type { BracketOffRail, FieldBracket, HandrailOutputs, SpacedBrackets } from '@/lib/trade/rail/types'
import { Tape } from '../../ui/tape'
import { CautionWord } from '../../ui/caution-word'
import { usePartLight } from './lit'
import type { Reading } from './reading-of'
import type { HandrailState } from './use-handrail'

interface BracketMarksProps extends Pick<HandrailState, 'cautions'> {
  brackets: HandrailOutputs['brackets']
  reading: Reading
}

const isSpaced = (bracket: SpacedBrackets | FieldBracket | BracketOffRail): bracket is SpacedBrackets =>
  'alongUndersideFromLowEnd' in bracket && Array.isArray(bracket.alongUndersideFromLowEnd)

/** Running marks for the brackets on the underside, each part from its own low corner. */
export function BracketMarks({ brackets, reading, cautions }: BracketMarksProps) {
  if (!brackets) return null
  return (
    <section aria-labelledby="bracket-marks">
      <h2 id="bracket-marks">Bracket centres</h2>
      <p className="rail-says">On the underside, hook the tape on the low end of each part.</p>
      <ul className="rail-lines">
        {brackets.map((bracket) =>
          isSpaced(bracket) ? (
            <SpacedLine key={bracket.part} bracket={bracket} reading={reading} />
          ) : (
            <FieldLine key={bracket.n} bracket={bracket} reading={reading} />
          ),
        )}
      </ul>
      {cautions
        .filter(({ beside }) => beside === 'brackets')
        .map(({ signal, text }) => (
          <p key={text} className="sheet-caution">
            <CautionWord signal={signal} /> {text}
          </p>
        ))}
    </section>
  )
}

const Length = ({ inches, reading: { precision, preferences } }: { inches: number; reading: Reading }) => (
  <Tape inches={inches} den={precision.tape} units={preferences.units} />
)

function SpacedLine({ bracket, reading }: { bracket: SpacedBrackets; reading: Reading }) {
  const light = usePartLight(bracket.part)
  return (
    <li {...light}>
      <b className="line-name">{bracket.part}</b>
      <span>
        <span className="running">
          {bracket.alongUndersideFromLowEnd.map((along, i) => (
            <b key={i} className="line-number">
              <Length inches={along} reading={reading} />
            </b>
          ))}
        </span>
        <small>
          along the top{' '}
          {bracket.alongTopFromLowEnd.map((along, i) => (
            <span key={i}>
              {i > 0 && ' · '}
              <Length inches={along} reading={reading} />
            </span>
          ))}
          {bracket.alongTopFromLowEnd.length > 1 && (
            <>
              ; <Length inches={bracket.spacing} reading={reading} /> apart
            </>
          )}
        </small>
      </span>
    </li>
  )
}

function FieldLine({ bracket, reading }: { bracket: FieldBracket | BracketOffRail; reading: Reading }) {
  const light = usePartLight('off' in bracket ? undefined : bracket.part)
  return (
    <li {...light} data-off={'off' in bracket || bracket.tooCloseToJoint || undefined}>
      <b className="line-name">{'off' in bracket ? bracket.n : `${bracket.n} on ${bracket.part}`}</b>
      {'off' in bracket ? (
        <span>beyond the rail</span>
      ) : (
        <span>
          <b className="line-number">
            <Length inches={bracket.alongUndersideFromLowEnd} reading={reading} />
          </b>
          {bracket.tooCloseToJoint && ' too close to a joint'}
          <small>
            along the top <Length inches={bracket.alongTopFromLowEnd} reading={reading} />
          </small>
        </span>
      )}
    </li>
  )
}
