import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
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

/** A server that answers every request with one status, or never; says afterwards what it was asked. */
async function answering(status: number | 'never', run: (port: string) => Promise<void>): Promise<string[]> {
  const asked: string[] = [];
  const server = createServer(({ method, url }, response) => {
    asked.push(`${method} ${url}`);
    if (status !== 'never') response.writeHead(status).end();
  });
  await new Promise<void>((resolve) => server.listen(0, '0.0.0.0', resolve));
  try {
    await run(String((server.address() as AddressInfo).port));
  } finally {
    server.closeAllConnections();
    await new Promise((resolve) => server.close(resolve));
  }
  return asked;
}

describe('the health check', () => {
  it('asks where PORT and HOST say, and finds the service ready or gone', async () => {
    let last = '';
    const asked = await answering(200, async (PORT) => {
      last = PORT;
      expect(await healthCheck({ PORT })).toEqual({ code: 0, stderr: '' });
      expect(await healthCheck({ PORT, HOST: '0.0.0.0' })).toEqual({ code: 0, stderr: '' });
    });
    expect(asked).toEqual(['GET /health/ready', 'GET /health/ready']);
    const { code, stderr } = await healthCheck({ PORT: last });
    expect(code).toBe(1);
    expect(stderr).toMatch(/^not ready: .*ECONNREFUSED.*\n$/);
  });

  it('asks for what the service says of itself when it can compute', () => {
    const { paths } = JSON.parse(readFileSync(join(root, 'openapi', 'openapi.json'), 'utf8'));
    expect(paths['/health/ready'].get.operationId).toBe('ready');
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
