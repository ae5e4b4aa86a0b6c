import 'server-only'

import pino, { type Logger } from 'pino'

/** Structured log lines. Secrets, bodies and links never go in; what could slip in is cut out here. */
export function createLog(level: string): Logger {
  return pino({
    level,
    base: null,
    redact: { paths: ['password', 'token', 'secret', '*.password', '*.token', '*.secret'], censor: '[cut]' },
  })
}
