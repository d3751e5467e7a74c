import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './sources.ts';

/** The curl requests of the README and the blocks with their answers. */
export const readmeRequests = [
  { request: 'first-request', reply: 'first-reply' },
  { request: 'manual-page-proofread', reply: 'manual-page-proofread-reply', after: 'manual-page-typed' },
  { request: 'manual-page', reply: 'manual-page-reply', after: 'manual-page-typed' },
] as const;

/** What a shell is given for one of them: its own block, after the block that it needs. */
export function readmeScript(one: (typeof readmeRequests)[number]): string {
  return ('after' in one ? readmeBlock('sh', one.after) : '') + readmeBlock('sh', one.request);
}

/** The text of the README's fenced block with this language and name. */
export function readmeBlock(language: string, name: string): string {
  const readme = readFileSync(join(root, 'README.md'), 'utf8');
  const match = new RegExp(`^\`\`\`${language} ${name}\\n([\\s\\S]*?)^\`\`\`$`, 'm').exec(readme);
  if (match === null) throw new Error(`README.md has no block ${language} ${name}`);
  return match[1] as string;
}
