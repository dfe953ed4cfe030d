import pino from 'pino'

/** One JSON line an event, on standard output. Never given bodies, cookies or passwords. */
export const log = pino({ level: process.env.LOG_LEVEL || (process.env.NODE_ENV === 'test' ? 'silent' : 'info') })
