import { pino } from 'pino';
import type { DestinationStream, Logger } from 'pino';

export type { Logger } from 'pino';

// Where a password, a token or a cookie could stand. Bodies are never logged at all.
const SECRETS = [
  'password',
  '*.password',
  'token',
  '*.token',
  'code',
  'cookie',
  'req.headers.cookie',
  'req.headers.authorization',
  'req.headers["x-csrf-token"]',
  'res.headers["set-cookie"]',
];

export function makeLogger(level: string, destination?: DestinationStream): Logger {
  const options = { level, base: null, redact: { paths: SECRETS, censor: '[redacted]' } };
  return destination ? pino(options, destination) : pino(options);
}
