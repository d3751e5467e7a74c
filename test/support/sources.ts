import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's root folder. */
export const root = fileURLToPath(new URL('../..', import.meta.url));

export interface SourceFile {
  /** path below the root, with forward slashes */
  readonly path: string;
  readonly text: string;
}

/** Every TypeScript file below a folder of the repository, in the order of their paths. */
export function sourceFiles(folder: string): SourceFile[] {
  return readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith('.ts'))
    .map((entry) => join(entry.parentPath, entry.name))
    .sort()
    .map((file) => ({ path: relative(root, file).replaceAll('\\', '/'), text: readFileSync(file, 'utf8') }));
}

/** The specifiers a file imports or re-exports, types included, at once or later. */
export function importsOf(text: string): string[] {
  const pattern = /(?:^\s*(?:import|export)\b(?:[^'";]*?\bfrom)?\s*|\bimport\()['"]([^'"]+)['"]/gm;
  return [...text.matchAll(pattern)].map((match) => match[1] as string);
}

/** A file's code without comments and string contents, for searches that must not hit prose. */
export function codeOnly(text: string): string {
  return text
    .replace(/\/\*[\s\S]*?\*\//g, '')
    .replace(/(^|[^:])\/\/.*$/gm, '$1')
    .replace(/'(?:[^'\\\n]|\\.)*'|"(?:[^"\\\n]|\\.)*"/g, "''");
}
