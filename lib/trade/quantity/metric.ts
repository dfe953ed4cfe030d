/** Exact by definition of the inch. */
export const mmPerInch = 25.4

/** Inches as whole millimetres, or tenths under 10 mm: `1892 mm`, `1.6 mm`. */
export function showMetric(inches: number): string {
  const mm = inches * mmPerInch
  const digits = mm.toFixed(Math.abs(mm) < 10 ? 1 : 0)
  return `${Number(digits) === 0 ? '0' : digits} mm`
}
