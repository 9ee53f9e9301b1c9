import pino from 'pino';
import { getEnv } from './env';

let logger: pino.Logger | undefined;

/**
 * An error for the log. What PostgreSQL quotes of a row in its own words (five-character SQLSTATE codes) may be a name
 * or an address, so of such an error only the code and the places are kept.
 */
export function describeError(error: Error): Record<string, unknown> {
  const { code, table, constraint } = error as { code?: unknown; table?: unknown; constraint?: unknown };
  if (typeof code !== 'string' || !/^(?=.*\d)[0-9A-Z]{5}$/.test(code))
    return { ...pino.stdSerializers.err(error) };
  const at = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line));
  return { type: error.name, code, table, constraint, stack: at.join('\n') };
}

/**
 * The structured log of this process, one JSON line per event on standard output. Log ids and codes, never names,
 * addresses, numbers, tokens or form contents; the list below is a second net, not permission.
 */
export function getLog(): pino.Logger {
  logger ??= pino({
    level: getEnv().LOG_LEVEL,
    base: { pid: process.pid },
    serializers: { err: describeError },
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
