const radians = Math.PI / 180

export const toDegrees = (rad: number) => rad / radians

export const sinDeg = (deg: number) => Math.sin(deg * radians)
export const cosDeg = (deg: number) => Math.cos(deg * radians)
export const tanDeg = (deg: number) => Math.tan(deg * radians)

export const asinDeg = (ratio: number) => Math.asin(ratio) / radians
export const acosDeg = (ratio: number) => Math.acos(ratio) / radians

/** Slope in degrees of `up` over `along`; up is positive. */
export const atanDeg = (up: number, along = 1) => Math.atan2(up, along) / radians

/** Slope in degrees of so many inches in a foot. */
export const slopeDeg = (inchesPerFoot: number) => atanDeg(inchesPerFoot, 12)

/** Nearest mark of a saw dial that is graduated in `step` degrees; half a step goes up. */
export const toDial = (deg: number, step: number) => Math.round(deg / step) * step
