import { describe, expect, it } from 'vitest';
import { codeOnly, sourceFiles } from '../support/sources.ts';

const pureRooms = [
  'references',
  'units',
  'numerics',
  'physics',
  'performance',
  'planning',
  'weather',
  'contract',
  'drawings',
];
const impure: Record<string, RegExp> = {
  'the clock': /\bDate\b|\bperformance\.now\b|\bsetTimeout\b|\bsetInterval\b|\bsetImmediate\b/,
  randomness: /\bMath\.random\b|\bcrypto\b/,
  'the locale': /\bIntl\b|\btoLocale\w+\b|\blocaleCompare\b/,
  'the environment': /\bprocess\b|\bglobalThis\b/,
  'the console': /\bconsole\b/,
};

describe('rooms below http and catalogue are pure', () => {
  const files = sourceFiles('src').filter(({ path }) =>
    pureRooms.some((room) => path.startsWith(`src/${room}/`) || path === `src/${room}.ts`),
  );

  it.each(Object.entries(impure))('none of them reads %s', (_, pattern) => {
    expect(files.length).toBeGreaterThan(40);
    expect(files.filter(({ text }) => pattern.test(codeOnly(text))).map(({ path }) => path)).toEqual([]);
  });

  it('no file says any, ignores the type checker or uses eval', () => {
    const loose = sourceFiles('src').filter(({ text }) =>
      /@ts-(ignore|nocheck|expect-error)|\beval\(|new Function\(|: any\b|<any>|as any\b/.test(codeOnly(text)),
    );
    expect(loose.map(({ path }) => path)).toEqual([]);
  });
});
