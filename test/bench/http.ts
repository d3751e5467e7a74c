import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, openSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Pool } from 'undici';
import { readExamples } from '../support/examples.ts';
import { root } from '../support/sources.ts';

const connections = 16;
const warmUp = 5_000;
const burst = 2_000;
const pairs = 9;

/** POST routes as shipped (log, strict reading, response check) as a ratio to a bare parse-and-stringify route. */
export async function benchHttp(names: readonly string[]): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'bench-'));
  const children: ChildProcess[] = [];
  try {
    const port = await freePort();
    const log = openSync(join(folder, 'log'), 'w');
    const service = spawn(process.execPath, ['dist/main.js'], {
      cwd: root,
      env: { ...process.env, PORT: String(port), HOST: '127.0.0.1' },
      stdio: ['ignore', log, log],
    });
    children.push(service);
    await ready(port);
    for (const example of readExamples().filter(({ name }) => names.includes(name))) {
      const body = JSON.stringify(example.body);
      const answer = JSON.stringify(example.answer);
      const file = join(folder, `${example.name}.json`);
      writeFileSync(file, answer);
      const baseline = spawn(process.execPath, ['--import', 'tsx', 'test/bench/baseline-server.ts', file], {
        cwd: root,
        stdio: ['ignore', 'pipe', 'inherit'],
      });
      children.push(baseline);
      const baselinePort = Number(await firstLine(baseline));
      const ours = new Pool(`http://127.0.0.1:${port}`, { connections, pipelining: 1 });
      const bare = new Pool(`http://127.0.0.1:${baselinePort}`, { connections, pipelining: 1 });
      await rate(ours, example.path, body, warmUp);
      await rate(bare, '/', body, warmUp);
      const ratios: number[] = [];
      let last = { ours: 0, bare: 0 };
      for (let pair = 0; pair < pairs; pair++) {
        last = { bare: await rate(bare, '/', body, burst), ours: await rate(ours, example.path, body, burst) };
        ratios.push(last.ours / last.bare);
      }
      ratios.sort((a, b) => a - b);
      const median = ratios[Math.floor(pairs / 2)] as number;
      process.stdout.write(
        `POST ${example.path} (${example.name}, ${body.length} B in, ${answer.length} B out): ` +
          `${median.toFixed(2)} of a parse-and-stringify route (${(ratios[0] as number).toFixed(2)} to ${(ratios[pairs - 1] as number).toFixed(2)}); ` +
          `last pair ${last.ours.toFixed(0)} and ${last.bare.toFixed(0)} requests a second\n`,
      );
      await ours.close();
      await bare.close();
      baseline.kill();
    }
  } finally {
    for (const child of children) child.kill();
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Requests a second over `count` requests, `connections` of them at a time. */
async function rate(pool: Pool, path: string, body: string, count: number): Promise<number> {
  let left = count;
  const started = performance.now();
  await Promise.all(
    Array.from({ length: connections }, async () => {
      while (left-- > 0) {
        const response = await pool.request({
          method: 'POST',
          path,
          headers: { 'content-type': 'application/json' },
          body,
        });
        if (response.statusCode !== 200) throw new Error(`${path} answered ${response.statusCode}`);
        await response.body.dump();
      }
    }),
  );
  return (count / (performance.now() - started)) * 1000;
}

async function ready(port: number): Promise<void> {
  for (let attempt = 0; attempt < 200; attempt++) {
    const answered = await fetch(`http://127.0.0.1:${port}/health/ready`).catch(() => undefined);
    if (answered?.status === 200) return;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('the service did not become ready in 10 s');
}

function firstLine(child: ChildProcess): Promise<string> {
  return new Promise((resolve, reject) => {
    child.stdout?.once('data', (data: Buffer) => resolve(data.toString().trim()));
    child.once('exit', (code) => reject(new Error(`the yardstick ended with ${code}`)));
  });
}

function freePort(): Promise<number> {
  return new Promise((resolve) => {
    const server = createServer();
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' && address !== null ? address.port : 0));
    });
  });
}
