/** Binary fractions miss exact sums by less than this; no tape or dial can see it. Inches or degrees. */
export const hair = 1e-9

/** `value` reaches `limit`; a value on its limit does. */
export const atLeast = (value: number, limit: number) => value >= limit - hair

/** `value` stays within `limit`; a value on its limit does. */
export const atMost = (value: number, limit: number) => value <= limit + hair
