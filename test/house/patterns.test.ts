import { checkSync } from 'recheck';
import { parseAst } from 'vite';
import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../support/sources.ts';

interface Pattern {
  readonly path: string;
  readonly source: string;
  readonly flags: string;
}

/** Every regular expression written in a file, and the number of those it builds. */
function patternsIn(path: string, text: string): { readonly written: Pattern[]; readonly built: number } {
  const written: Pattern[] = [];
  let built = 0;
  const visit = (node: unknown): void => {
    if (typeof node !== 'object' || node === null) return;
    const { type, regex, callee } = node as {
      type?: string;
      regex?: { pattern: string; flags: string };
      callee?: { name?: string };
    };
    if (type === 'Literal' && regex !== undefined) written.push({ path, source: regex.pattern, flags: regex.flags });
    if ((type === 'NewExpression' || type === 'CallExpression') && callee?.name === 'RegExp') built++;
    for (const child of Object.values(node)) visit(child);
  };
  visit(parseAst(text, { lang: 'ts' }));
  return { written, built };
}

const found = sourceFiles('src').map(({ path, text }) => ({ path, ...patternsIn(path, text) }));
const patterns = [
  ...new Map(found.flatMap(({ written }) => written).map((one) => [`${one.source}/${one.flags}`, one])).values(),
];

/** The word of the checker: safe, or how a text can make the pattern run long. */
function verdict(source: string, flags: string): string {
  const found = checkSync(source, flags, { timeout: 5000, attackTimeout: 200, incubationTimeout: 200 });
  return found.status === 'vulnerable' ? `${found.status}, ${found.complexity.summary}` : found.status;
}

/**
 * The pattern without upper bounds of ten or more on a repetition: it can be matched in at least as many ways, so that where it is
 * safe the bounded one is too; and the checker is quick on it.
 */
function unbounded(source: string): string {
  return source.replace(/\{(\d+)(?:,(\d+))?\}/g, (bounds, least: string, most = least) => {
    if (Number(most) < 10) return bounds;
    return Number(least) === 0 ? '*' : '+';
  });
}

describe('the patterns of the sources', () => {
  it('are all found', () => {
    expect(patterns.length).toBeGreaterThan(50);
    expect(patterns.some(({ path }) => path.startsWith('src/weather/'))).toBe(true);
  });

  it('are written out, but for two: one joins checked names, one repeats a written pattern with a flag', () => {
    expect(found.filter(({ built }) => built > 0).map(({ path, built }) => [path, built])).toEqual([
      ['src/contract/reading/settle-tree.ts', 1],
      ['src/http/plugins/known-paths.ts', 1],
    ]);
  });

  it('are checked by a checker that knows a bad one', () => {
    expect(verdict('^(?:a+)+$', '')).toMatch(/^vulnerable/);
    expect(verdict('^(?:a|a)*$', '')).toMatch(/^vulnerable/);
  });

  it.each(patterns)('$path: /$source/$flags cannot run long', ({ source, flags }) => {
    if (verdict(unbounded(source), flags) !== 'safe') expect(verdict(source, flags)).toBe('safe');
  });
});
