/** Writes the replies of README.md anew: part of `npm run examples`. */
import { execFile } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { testHouse } from './house.ts';
import { readmeBlock, readmeRequests, readmeScript } from './readme.ts';
import { root } from './sources.ts';

const run = promisify(execFile);
const app = await testHouse();
await app.listen({ port: 0, host: '127.0.0.1' });
const { port } = app.server.address() as AddressInfo;
const here = (text: string) => text.replaceAll('127.0.0.1:3000', `127.0.0.1:${port}`);

for (const one of readmeRequests) {
  const curl = await run('sh', ['-c', here(readmeScript(one))]);
  replace('json', one.reply, JSON.stringify(JSON.parse(curl.stdout), null, 2));
}
const python = await run('python3', ['-c', here(readmeBlock('python', 'first-request'))]);
replace('text', 'first-reply', python.stdout.trimEnd());
await app.close();

function replace(language: string, name: string, text: string): void {
  const file = join(root, 'README.md');
  const fence = `\`\`\`${language} ${name}\n`;
  const before = readFileSync(file, 'utf8');
  writeFileSync(
    file,
    before.replace(`${fence}${readmeBlock(language, name)}`, () => `${fence}${text}\n`),
  );
}
