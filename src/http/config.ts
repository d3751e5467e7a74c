import { z } from 'zod';
import type { CatalogueSource } from '../catalogue/read-catalogue.ts';
import { slipsBetween } from '../contract/reading/nearest-name.ts';
import { defaultAddress } from './default-address.ts';

const logLevels = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'] as const;

const environment = z.object({
  PORT: z
    .string()
    .regex(/^\d{1,5}$/)
    .transform(Number)
    .refine((port) => port <= 65_535)
    .default(defaultAddress.port),
  HOST: z
    .string()
    .regex(/^[A-Za-z0-9.:_-]{1,253}$/)
    .default(defaultAddress.host),
  LOG_LEVEL: z.enum(logLevels).default('info'),
  CATALOGUE: z
    .string()
    .regex(/^[^\p{Cc}]{1,4096}$/u)
    .optional(),
  CATALOGUE_BUILT_IN: z.enum(['on', 'off']).default('on'),
});

const allowed: Readonly<Record<string, string>> = {
  PORT: 'a whole number from 0 to 65535',
  HOST: 'a host name or an IP address',
  LOG_LEVEL: `one of ${logLevels.join(', ')}`,
  CATALOGUE: 'a folder of sealed aeroplane files',
  CATALOGUE_BUILT_IN: 'on or off',
};

export interface Config {
  readonly port: number;
  readonly host: string;
  readonly logLevel: (typeof logLevels)[number];
  readonly catalogue: CatalogueSource;
}

/** Names of the catalogue's settings, which are long enough to be misspelt. */
const longNames = ['CATALOGUE', 'CATALOGUE_BUILT_IN'];

/**
 * Reads the environment variables of the service.
 *
 * A variable that is nearly one of the catalogue's is refused: its slip would leave the wrong aeroplanes on file unseen.
 *
 * @throws RangeError with one line that names each wrong variable and what it may be
 */
export function readConfig(variables: Readonly<Record<string, string | undefined>>): Config {
  const read = environment.safeParse(variables);
  const wrong = new Set(read.error?.issues.map((issue) => String(issue.path[0])));
  const faults = [...wrong].map((name) => `${name} is ${JSON.stringify(variables[name])}; it must be ${allowed[name]}`);
  for (const name of Object.keys(variables)) {
    const meant = Object.hasOwn(allowed, name) ? undefined : longNames.find((known) => isSlip(name, known));
    if (meant !== undefined) faults.push(`there is no setting ${name}; perhaps ${meant} was meant`);
  }
  if (!read.success || faults.length > 0) throw new RangeError(faults.join('. '));
  const { PORT: port, HOST: host, LOG_LEVEL: logLevel, CATALOGUE: folder, CATALOGUE_BUILT_IN: builtIn } = read.data;
  return {
    port,
    host,
    logLevel,
    catalogue: { builtIn: builtIn === 'on', ...(folder === undefined ? {} : { folder }) },
  };
}

function isSlip(name: string, known: string): boolean {
  return Math.abs(name.length - known.length) <= 2 && slipsBetween(name.toUpperCase(), known) <= 2;
}
