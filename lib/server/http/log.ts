import pino from 'pino'

/** The server's log, one JSON line an event, on standard output. LOG_LEVEL takes another level than "info". */
export const log = pino({ level: process.env.LOG_LEVEL ?? (process.env.NODE_ENV === 'test' ? 'silent' : 'info') })
