import { destination, type Logger, pino } from 'pino';

/** Structured logs on stderr; stdout is for what a person reads at start. */
export function createLogger(level: string): Logger {
  return pino(
    {
      level,
      base: { app: 'millpond' },
      timestamp: () => `,"time":"${new Date().toISOString()}"`,
      redact: {
        paths: [
          'password',
          'token',
          'secret',
          'headers.cookie',
          'headers.authorization',
          'req.headers',
          'res.headers',
          '*.password',
          '*.passwordHash',
          '*.token',
          'err.parameters',
          'err.query',
        ],
        censor: '[removed]',
      },
    },
    destination({ fd: 2, sync: true }),
  );
}
