/** Joins class names, leaving out what does not apply. */
export const classNames = (...names: (string | false | undefined)[]): string => names.filter(Boolean).join(' ')
