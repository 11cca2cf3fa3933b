import pino from 'pino';
import { env } from '@/lib/env';

let made: pino.Logger | undefined;

export function log(): pino.Logger {
  made ??= pino({ level: env().LOG_LEVEL });
  return made;
}
