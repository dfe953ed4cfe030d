const day = new Intl.DateTimeFormat('en-US', { dateStyle: 'medium', timeZone: 'UTC' })

/** A moment or a day as people read it: Dec 1, 2026. Times are kept in UTC and read so. */
export const dayInWords = (iso: string) => day.format(new Date(iso))
