/** Signal words of ANSI Z535, with their colours. */
export type SignalWord = 'danger' | 'warning' | 'caution' | 'notice'

export const signalColours: Record<SignalWord, string> = {
  danger: 'bg-signal-danger text-white',
  warning: 'bg-signal-warning text-black',
  caution: 'bg-signal-caution text-black',
  notice: 'bg-signal-notice text-white',
}

/** The signal word alone, small, before a sentence beside a number. */
export const CautionWord = ({ signal }: { signal: SignalWord }) => (
  <b className={`rounded-[2px] px-1.5 font-head text-[15px] font-semibold tracking-[.05em] ${signalColours[signal]}`}>
    {signal.toUpperCase()}
  </b>
)
