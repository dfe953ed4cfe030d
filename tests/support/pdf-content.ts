import { textOf, type ReadFont } from './pdf-font'
import { isBytes, isDict, isOperator, Scanner, type Value } from './pdf-syntax'

type Matrix = readonly [a: number, b: number, c: number, d: number, e: number, f: number]
export interface Spot {
  x: number
  y: number
}
/** A letter where it stands, points from the lower left corner of the page. */
export interface Letter {
  /** Undefined where the file does not say what it is. */
  text: string | undefined
  font: string
  size: number
  drawn: boolean
  /** Edges of its outline from where it is set, points, up positive. */
  left: number
  bottom: number
  right: number
  top: number
  from: Spot
  to: Spot
  /** Corners of its outline on the page. */
  corners: readonly Spot[]
  colour: string
}
/** A path that is seen, its curves by their control points. */
export interface Path {
  points: readonly Spot[]
  stroked: boolean
  filled: boolean
  /** Of its inside: red, green, blue. */
  colour: string
}
export interface Content {
  letters: Letter[]
  paths: Path[]
  text: string
}

const same: Matrix = [1, 0, 0, 1, 0, 0]
const times = (m: Matrix, n: Matrix): Matrix => [
  m[0] * n[0] + m[1] * n[2],
  m[0] * n[1] + m[1] * n[3],
  m[2] * n[0] + m[3] * n[2],
  m[2] * n[1] + m[3] * n[3],
  m[4] * n[0] + m[5] * n[2] + n[4],
  m[4] * n[1] + m[5] * n[3] + n[5],
]
const at = (m: Matrix, x: number, y: number): Spot => ({ x: m[0] * x + m[2] * y + m[4], y: m[1] * x + m[3] * y + m[5] })

interface State {
  matrix: Matrix
  colour: string
}

/** Follows what a page draws: where each letter and each path comes to lie, and what the page says in its order. */
export function readContent(source: string, fonts: ReadonlyMap<string, ReadFont | null>): Content {
  const scanner = new Scanner(source)
  const letters: Letter[] = []
  const paths: Path[] = []
  const saved: State[] = []
  let state: State = { matrix: same, colour: '' }
  let [text, font, size]: [Matrix, ReadFont | null, number] = [same, null, 0]
  let points: Spot[] = []
  let values: Value[] = []
  const say = sayer()

  const show = (list: Value[]) => {
    for (const piece of list) {
      if (typeof piece === 'number') text = times([1, 0, 0, 1, (-piece * size) / 1000, 0], text)
      else if (isBytes(piece) && font)
        for (let i = 0; i + 1 < piece.bytes.length; i += 2) {
          const code = piece.bytes.charCodeAt(i) * 256 + piece.bytes.charCodeAt(i + 1)
          const width = (font.widthOf(code) * size) / 1000
          const all = times(text, state.matrix)
          const outline = font.outlineOf(code)
          const [left = 0, bottom = 0, right = 0, top = 0] = [
            outline.left,
            outline.bottom,
            outline.right,
            outline.top,
          ].map((edge) => (edge * size) / 1000)
          const letter: Letter = {
            ...{ text: font.textOf(code), font: font.name, size, colour: state.colour, drawn: outline.drawn },
            ...{ left, bottom, right, top, from: at(all, 0, 0), to: at(all, width, 0) },
            corners: [at(all, left, bottom), at(all, right, bottom), at(all, left, top), at(all, right, top)],
          }
          letters.push(letter)
          say.letter(letter)
          text = times([1, 0, 0, 1, width, 0], text)
        }
    }
  }
  const painted = (stroked: boolean, filled: boolean) => {
    if (points.length > 0) paths.push({ points, stroked, filled, colour: state.colour })
    points = []
  }
  const operators: Record<string, (n: number[]) => void> = {
    q: () => saved.push(state),
    Q: () => (state = saved.pop() ?? state),
    cm: (n) => (state = { ...state, matrix: times(n as unknown as Matrix, state.matrix) }),
    scn: (n) => (state = { ...state, colour: n.join(' ') }),
    BT: () => (text = same),
    Tm: (n) => (text = n as unknown as Matrix),
    Tf: ([, given = 0]) => {
      font = fonts.get(String(values[0])) ?? null
      size = given
    },
    TJ: () => Array.isArray(values[0]) && show(values[0]),
    Tj: () => show(values),
    BDC: () => {
      const said = isDict(values[1]) ? values[1].get('/ActualText') : undefined
      say.open(isBytes(said) ? textOf(said.bytes) : undefined)
    },
    BMC: () => say.open(undefined),
    EMC: () => say.close(),
    re: ([x = 0, y = 0, w = 0, h = 0]) =>
      points.push(
        ...[
          [x, y],
          [x + w, y],
          [x + w, y + h],
          [x, y + h],
        ].map(([px = 0, py = 0]) => at(state.matrix, px, py)),
      ),
    S: () => painted(true, false),
    f: () => painted(false, true),
    B: () => painted(true, true),
    n: () => (points = []),
  }
  for (const move of ['m', 'l', 'c', 'v', 'y'])
    operators[move] = (n) => n.forEach((x, i) => i % 2 === 0 && points.push(at(state.matrix, x, n[i + 1] ?? 0)))
  Object.assign(operators, { 'f*': operators.f, 'B*': operators.B, s: operators.S, b: operators.B })

  for (let value = scanner.next(); value !== undefined; value = scanner.next()) {
    if (!isOperator(value)) {
      values.push(value)
      continue
    }
    operators[value.operator]?.(values.map(Number))
    values = []
  }
  return { letters, paths, text: say.all() }
}

/** Joins letters to what is read: a gap is a blank, and what a span says of itself stands for its letters. */
function sayer() {
  let said = ''
  let last: Letter | undefined
  const spans: { says: string | undefined; isSaid: boolean }[] = []
  const gap = (letter: Letter) => {
    if (!last) return ''
    const away = Math.hypot(letter.from.x - last.to.x, letter.from.y - last.to.y)
    return away > 0.15 * Math.min(letter.size, last.size) && !said.endsWith(' ') ? ' ' : ''
  }
  return {
    open: (says: string | undefined) => spans.push({ says, isSaid: false }),
    close: () => spans.pop(),
    letter: (letter: Letter) => {
      const span = spans.find(({ says }) => says !== undefined)
      if (!span) said += gap(letter) + (letter.text ?? '')
      else if (!span.isSaid) {
        said += gap(letter) + (span.says ?? '')
        span.isSaid = true
      }
      last = letter
    },
    all: () => said.replace(/\s+/g, ' ').trim(),
  }
}
