import { all, create, type ConfigOptions } from 'mathjs/number'

/** mathjs as shown formulas are read: numbers only, trig in degrees. */
export function degreesMath() {
  const math = create(all ?? {}, {} satisfies ConfigOptions)
  const turn = Math.PI / 180
  math.import(
    {
      sin: (x: number) => Math.sin(x * turn),
      cos: (x: number) => Math.cos(x * turn),
      tan: (x: number) => Math.tan(x * turn),
      asin: (x: number) => Math.asin(x) / turn,
      acos: (x: number) => Math.acos(x) / turn,
      atan: (x: number) => Math.atan(x) / turn,
    },
    { override: true },
  )
  return math
}
