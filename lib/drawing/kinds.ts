/** What a line stands for; its width and colour follow. */
export type Ink = 'object' | 'dim' | 'ext' | 'ghost' | 'post' | 'cut' | 'off' | 'centre' | 'hatch' | 'flag' | 'tape'
export type Fill = 'face' | 'solid' | 'off-face' | 'tape' | 'shade' | 'ground'
export type LabelInk = 'text' | 'quiet' | 'cut' | 'off' | 'on-tape'
export type LabelSize = 'answer' | 'number' | 'note'
/** Drawn among words: fonts lack them. */
export type Shape = 'arrow' | 'arrow-left' | 'triangle-down' | 'triangle-up'

/** How the reader's tape and dial read, and how much to show. */
export interface Show {
  tape: 8 | 16 | 32 | 64
  dial: 0.25 | 0.5 | 1
  metric?: boolean
  detail: 'full' | 'compact'
}
