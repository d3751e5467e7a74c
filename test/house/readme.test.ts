import { execFile } from 'node:child_process';
import { readFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { promisify } from 'node:util';
import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { testHouse } from '../support/house.ts';
import { readmeBlock, readmeRequests, readmeScript } from '../support/readme.ts';
import { root } from '../support/sources.ts';

const run = promisify(execFile);

describe('README.md', () => {
  let app: FastifyInstance;
  let port = 0;
  beforeAll(async () => {
    app = await testHouse();
    await app.listen({ port: 0, host: '127.0.0.1' });
    port = (app.server.address() as AddressInfo).port;
  });
  afterAll(() => app.close());

  const here = (text: string) => text.replaceAll('127.0.0.1:3000', `127.0.0.1:${port}`);

  it.each(readmeRequests)('shows the real answer to its curl request $request', async (one) => {
    const { stdout } = await run('sh', ['-c', here(readmeScript(one))]);
    expect(stdout).toBe(JSON.stringify(JSON.parse(readmeBlock('json', one.reply))));
  });

  it('has no curl request that is not tried', () => {
    const requests = readFileSync(join(root, 'README.md'), 'utf8').match(/^curl .*127\.0\.0\.1:3000/gm) ?? [];
    expect(requests).toHaveLength(readmeRequests.length);
  });

  it('shows what its Python script prints', async () => {
    const { stdout } = await run('python3', ['-c', here(readmeBlock('python', 'first-request'))]);
    expect(stdout.trimEnd()).toBe(readmeBlock('text', 'first-reply').trimEnd());
  });

  it('names each run-time dependency and what it earns', () => {
    const { dependencies } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as { dependencies: object };
    const section = readFileSync(join(root, 'README.md'), 'utf8').split('## Dependencies')[1] as string;
    const named = section.match(/^\| [^|]+ \|/gm)?.flatMap((cell) => cell.replaceAll(/[| ]/g, '').split(',')) ?? [];
    expect(named.filter((name) => name !== 'package').sort()).toEqual(Object.keys(dependencies).sort());
  });
});
