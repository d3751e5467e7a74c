import { z } from 'zod';

const logLevels = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'] as const;

const environment = z.object({
  PORT: z
    .string()
    .regex(/^\d{1,5}$/)
    .transform(Number)
    .refine((port) => port <= 65_535)
    .default(3000),
  HOST: z
    .string()
    .regex(/^[A-Za-z0-9.:_-]{1,253}$/)
    .default('127.0.0.1'),
  LOG_LEVEL: z.enum(logLevels).default('info'),
});

const allowed: Readonly<Record<string, string>> = {
  PORT: 'a whole number from 0 to 65535',
  HOST: 'a host name or an IP address',
  LOG_LEVEL: `one of ${logLevels.join(', ')}`,
};

export interface Config {
  readonly port: number;
  readonly host: string;
  readonly logLevel: (typeof logLevels)[number];
}

/**
 * Reads the environment variables of the service.
 *
 * @throws RangeError with one line that names each wrong variable and what it may be
 */
export function readConfig(variables: Readonly<Record<string, string | undefined>>): Config {
  const read = environment.safeParse(variables);
  if (!read.success) {
    const wrong = [...new Set(read.error.issues.map((issue) => String(issue.path[0])))];
    throw new RangeError(
      wrong.map((name) => `${name} is ${JSON.stringify(variables[name])}; it must be ${allowed[name]}`).join('. '),
    );
  }
  return { port: read.data.PORT, host: read.data.HOST, logLevel: read.data.LOG_LEVEL };
}
