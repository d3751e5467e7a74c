import type { FastifyServerOptions } from 'fastify';
import type { Config } from './config.ts';

/** One JSON line an event on standard output, with ISO time and the level's name. */
export function logOptions(level: Config['logLevel']): Exclude<FastifyServerOptions['logger'], boolean | undefined> {
  return {
    level,
    base: null,
    timestamp: () => `,"time":"${new Date().toISOString()}"`,
    formatters: { level: (name: string) => ({ level: name }) },
  };
}
