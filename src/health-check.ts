import { get } from 'node:http';
import process from 'node:process';
import { defaultAddress } from './http/default-address.ts';

/** A readiness answer takes milliseconds; one that takes this long is none. Our choice. */
const longestWait = 2000;

/**
 * Asks the service beside it whether it can compute, as a container's engine does with `node dist/health-check.js`:
 * ends with 0 for yes, and with 1 and one line for no.
 *
 * It reads HOST and PORT itself, for it runs every half minute and reading all settings would take most of its time.
 */
const { HOST: host = defaultAddress.host, PORT: port = defaultAddress.port } = process.env;

function end(state: string): void {
  if (state !== '200') process.stderr.write(`not ready: ${state}\n`);
  process.exit(state === '200' ? 0 : 1);
}

get({ host, port, path: '/health/ready', signal: AbortSignal.timeout(longestWait) }, ({ statusCode }) =>
  end(String(statusCode)),
).on('error', ({ message }) => end(message));
