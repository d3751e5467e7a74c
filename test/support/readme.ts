import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './sources.ts';

/** The text of the README's fenced block with this language and name. */
export function readmeBlock(language: string, name: string): string {
  const readme = readFileSync(join(root, 'README.md'), 'utf8');
  const match = new RegExp(`^\`\`\`${language} ${name}\\n([\\s\\S]*?)^\`\`\`$`, 'm').exec(readme);
  if (match === null) throw new Error(`README.md has no block ${language} ${name}`);
  return match[1] as string;
}
