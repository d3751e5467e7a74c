import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './sources.ts';

/** One request of openapi/examples with the answer it must get. */
export interface Example {
  readonly name: string;
  readonly title: string;
  readonly method: 'GET' | 'POST';
  readonly path: string;
  /** the request's JSON, absent for GET */
  readonly body?: unknown;
  readonly status: number;
  readonly answer: unknown;
}

const folder = join(root, 'openapi', 'examples');

/** All examples in the order of their names. */
export function readExamples(): Example[] {
  return readdirSync(folder)
    .filter((file) => file.endsWith('.json'))
    .sort()
    .map((file) => ({ name: file.replace(/\.json$/, ''), ...JSON.parse(readFileSync(join(folder, file), 'utf8')) }));
}

export function exampleFile(name: string): string {
  return join(folder, `${name}.json`);
}
