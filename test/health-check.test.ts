import { spawn } from 'node:child_process';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { testHouse } from './support/house.ts';
import { root } from './support/sources.ts';

/** Runs the health check with the address of a service. */
function healthCheck(variables: Record<string, string>): Promise<{ code: number | null; stderr: string }> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, ['--import', 'tsx', join(root, 'src', 'health-check.ts')], {
      cwd: root,
      env: { PATH: process.env['PATH'], ...variables },
    });
    let stderr = '';
    child.stderr.on('data', (piece) => (stderr += piece));
    child.on('close', (code) => resolve({ code, stderr }));
  });
}

/** A server that answers every request in one way, or never. */
async function answering(status: number | 'never', run: (port: string) => Promise<void>): Promise<void> {
  const server = createServer((_, response) => {
    if (status !== 'never') response.writeHead(status).end();
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  try {
    await run(String((server.address() as AddressInfo).port));
  } finally {
    server.closeAllConnections();
    server.close();
  }
}

describe('the health check', () => {
  it('finds the service ready where PORT and HOST say, and gone once it has closed', async () => {
    const app = await testHouse();
    await app.listen({ port: 0, host: '0.0.0.0' });
    const PORT = String((app.server.address() as AddressInfo).port);
    expect(await healthCheck({ PORT })).toEqual({ code: 0, stderr: '' });
    expect(await healthCheck({ PORT, HOST: '0.0.0.0' })).toEqual({ code: 0, stderr: '' });
    await app.close();
    const { code, stderr } = await healthCheck({ PORT });
    expect(code).toBe(1);
    expect(stderr).toMatch(/^not ready: .*ECONNREFUSED.*\n$/);
  });

  it('takes any other status than 200 for not ready', async () => {
    await answering(503, async (PORT) => {
      expect(await healthCheck({ PORT })).toEqual({ code: 1, stderr: 'not ready: 503\n' });
    });
  });

  it('waits for two seconds, not longer', async () => {
    await answering('never', async (PORT) => {
      const { code, stderr } = await healthCheck({ PORT });
      expect([code, stderr]).toEqual([1, expect.stringMatching(/^not ready: .*(?:abort|timeout).*\n$/)]);
    });
  });
});
