import pino, { type Logger } from 'pino';

/** Structured logs on standard output; secrets are removed wherever they could appear. */
export function createLogger(level = process.env['DEXTRAL_LOG_LEVEL'] ?? 'info'): Logger {
  return pino({
    level,
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: { paths: ['req.headers.authorization', 'req.headers.cookie', 'res.headers["set-cookie"]', '*.password', '*.secret'], censor: '[removed]' },
  });
}
