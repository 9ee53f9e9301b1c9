import pino from 'pino';
import { getEnv } from './env';

let logger: pino.Logger | undefined;

/**
 * The structured log of this process, one JSON line per event on standard output. Log ids and codes, never names,
 * addresses, numbers, tokens or form contents; the list below is a second net, not permission.
 */
export function getLog(): pino.Logger {
  logger ??= pino({
    level: getEnv().LOG_LEVEL,
    base: { pid: process.pid },
    redact: {
      paths: [
        'email',
        'name',
        'password',
        'token',
        'address',
        '*.email',
        '*.name',
        '*.password',
        '*.token',
        'params',
        '*.params',
      ],
      censor: '[kept out]',
    },
  });
  return logger;
}
