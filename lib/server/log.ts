import 'server-only';
import pino from 'pino';

/**
 * Structured log to stdout. Pass ids, codes and counts only: no names, addresses, tokens or health data.
 * The redaction is a second net, not the rule.
 */
export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  base: { app: 'combwood' },
  timestamp: pino.stdTimeFunctions.isoTime,
  redact: {
    paths: [
      'password',
      'token',
      'email',
      'name',
      'cookie',
      'authorization',
      'payload',
      '*.password',
      '*.token',
      '*.email',
    ],
    censor: '[left out]',
  },
});
