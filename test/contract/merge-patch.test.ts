import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { mergePatch } from '../../src/contract/merge-patch.ts';
import { mergeCases } from '../published/rfc-7396.ts';

describe('mergePatch', () => {
  it.each(mergeCases)('$target with $patch is $result [RFC 7396, appendix A; $status]', ({ target, patch, result }) => {
    const before = structuredClone(target);
    expect(mergePatch(target, patch)).toEqual(result);
    expect(target).toEqual(before);
  });

  it('takes no member from the prototype of an object', () => {
    expect(mergePatch({}, { toString: { a: 1 } })).toEqual({ toString: { a: 1 } });
  });

  const json = fc
    .jsonValue({ maxDepth: 3 })
    .map((value) => JSON.parse(JSON.stringify(value).replaceAll('__proto__', 'x')));
  test.prop([json, json])('is the same when done twice', (target, patch) => {
    const once = mergePatch(target, patch);
    expect(mergePatch(once, patch)).toEqual(once);
  });
});
