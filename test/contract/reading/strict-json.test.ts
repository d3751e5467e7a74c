import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { readStrictJson, type StrictJson } from '../../../src/contract/reading/strict-json.ts';
import { type Fault, isRefused } from '../../../src/planning/fault.ts';

function read(text: string | Uint8Array): StrictJson {
  const result = readStrictJson(typeof text === 'string' ? Buffer.from(text) : text);
  if (isRefused(result)) throw new TypeError(JSON.stringify(result.refused));
  return result;
}

function refusal(text: string | Uint8Array): Fault {
  const result = readStrictJson(typeof text === 'string' ? Buffer.from(text) : text);
  if (!isRefused(result)) throw new TypeError(`was read: ${JSON.stringify(result.value)}`);
  expect(result.refused).toHaveLength(1);
  return result.refused[0] as Fault;
}

describe('readStrictJson reads', () => {
  test.prop([fc.jsonValue({ maxDepth: 8 })])('whatever JSON.stringify wrote, whichever the spacing', (tree) => {
    const names = JSON.stringify(tree);
    fc.pre(!names.includes('__proto__'));
    for (const text of [names, JSON.stringify(tree, undefined, 2)]) {
      expect(read(text).value).toEqual(JSON.parse(JSON.stringify(tree)));
    }
  });

  it.each(['1', '"a"', 'null', 'true', '[]', '{}', ' {"a":[1,{"b":2}]} \r\n'])('%s', (text) => {
    expect(read(text)).toEqual({ value: JSON.parse(text), slips: [] });
  });

  it('-0 as 0, at the top, in a list and in an object', () => {
    expect(read('-0').value).toBe(0);
    expect((read('[-0.0]').value as number[])[0]).toBe(0);
    expect((read('{"a":{"b":-0e3}}').value as { a: { b: number } }).a.b).toBe(0);
  });

  it('colons, braces and escapes inside strings as text', () => {
    const tree = { 'a:b': '{[::,"\\', c: ['\\"', ':'] };
    expect(read(JSON.stringify(tree)).value).toEqual(tree);
  });

  it('exactly 12 levels and 20 000 tokens', () => {
    expect(read('['.repeat(12) + ']'.repeat(12)).slips).toEqual([]);
    expect(read(`[${Array(19_999).fill(0).join(',')}]`).slips).toEqual([]);
  });
});

describe('readStrictJson refuses as unreadable', () => {
  it.each([
    ['an empty body', '', ''],
    ['NaN', '{"a":NaN}', '/a'],
    ['Infinity', '{"a":[1,-Infinity]}', '/a/1'],
    ['a trailing comma', '{"a":1,}', ''],
    ['a trailing comma in a list', '[1,]', '/1'],
    ['a comment', '{"a":1 /* x */}', ''],
    ['a leading zero', '{"a":{"b":01}}', '/a/b'],
    ['single quotes', "{'a':1}", ''],
    ['a bare name', '{a:1}', ''],
    ['two values', '{} {}', ''],
    ['a missing end', '{"a":{"b":1}', ''],
    ['a raw control character', '{"a":"\u0001"}', '/a'],
    ['a lone escape', '{"a":"\\x"}', '/a'],
    ['a vertical tab as space', '{\v}', ''],
  ])('%s, saying where', (_, text, pointer) => {
    const fault = refusal(text);
    expect(fault).toMatchObject({ code: 'unreadable', pointer });
    expect(fault.message).toMatch(text === '' ? /empty/ : /from character \d+ on/);
  });

  it('the character from which it is not JSON', () => {
    expect(refusal('{"a": tru}').message).toBe('The body is not JSON from character 7 on.');
  });

  it.each([
    ['an overlong slash', [0x22, 0xc0, 0xaf, 0x22]],
    ['a lone continuation byte', [0x22, 0x80, 0x22]],
    ['a surrogate in UTF-8', [0x22, 0xed, 0xa0, 0x80, 0x22]],
    ['beyond U+10FFFF', [0x22, 0xf4, 0x90, 0x80, 0x80, 0x22]],
    ['a cut sequence', [0x22, 0xe2, 0x82]],
    ['UTF-16', [0xff, 0xfe, 0x7b, 0x00, 0x7d, 0x00]],
  ])('%s', (_, bytes) => {
    expect(refusal(Uint8Array.from(bytes))).toMatchObject({ code: 'unreadable', message: 'The body is not UTF-8.' });
  });

  it('a byte order mark', () => {
    expect(refusal(Uint8Array.from([0xef, 0xbb, 0xbf, 0x7b, 0x7d])).message).toMatch(/byte order mark/);
  });

  it.each([
    ['__proto__', '{"a":{"__proto__":{"x":1}}}', '/a/__proto__'],
    ['__proto__ escaped', '{"\\u005f_proto__":1}', '/__proto__'],
    ['constructor.prototype', '[{"constructor":{"prototype":{}}}]', '/0/constructor'],
  ])('%s', (_, text, pointer) => {
    expect(refusal(text)).toMatchObject({ code: 'unreadable', pointer });
    expect(({} as Record<string, unknown>)['x']).toBeUndefined();
  });
});

describe('readStrictJson refuses as duplicate-member', () => {
  it.each([
    ['the same name twice', '{"a":1,"a":1}', '/a'],
    ['a name and its escape', '{"a":1,"b":{"\\u0061":1,"a":2}}', '/b/a'],
    ['an object that the second one hides', '{"m":{"x":1,"y":2},"m":3}', '/m'],
    ['inside a list', '[{"q/r":1,"q/r":2}]', '/0/q~1r'],
  ])('%s', (_, text, pointer) => {
    expect(refusal(text)).toMatchObject({ code: 'duplicate-member', pointer });
  });

  test.prop([fc.jsonValue({ maxDepth: 5 }), fc.string(), fc.jsonValue(), fc.jsonValue()])(
    'wherever it stands',
    (tree, name, one, two) => {
      const key = JSON.stringify(name);
      const text = `{"tree":${JSON.stringify(tree)},"pair":{${key}:${JSON.stringify(one)},${key}:${JSON.stringify(two)}}}`;
      fc.pre(!text.includes('__proto__'));
      expect(refusal(text).code).toBe('duplicate-member');
    },
  );
});

describe('readStrictJson bounds', () => {
  it.each([13, 5_000, 500_000])('%i levels', (levels) => {
    expect(refusal('['.repeat(levels) + ']'.repeat(levels)).code).toBe('too-deep');
    expect(refusal(`${'{"a":'.repeat(levels)}1${'}'.repeat(levels)}`).code).toBe('too-deep');
  });

  it('values and names together', () => {
    expect(refusal(`[${Array(20_000).fill(0).join(',')}]`).code).toBe('too-many-tokens');
    const members = Array.from({ length: 10_000 }, (_, i) => `"${i}":1`).join(',');
    expect(refusal(`{${members}}`).code).toBe('too-many-tokens');
  });
});

describe('readStrictJson notes text that cannot be shown', () => {
  it.each([
    ['NUL', '{"a":"x\\u0000"}', '/a'],
    ['a line break', '{"a":["x\\r\\ny"]}', '/a/0'],
    ['DEL', '{"a":"\x7f"}', '/a'],
    ['a C1 control', '{"a":"\u0085"}', '/a'],
    ['half a surrogate pair', '{"a":{"b":"\\ud800"}}', '/a/b'],
    ['half a pair in a name', '{"\\udc00":1}', '/\ufffd'],
  ])('%s', (_, text, pointer) => {
    expect(read(text).slips).toMatchObject([{ code: 'wrong-type', pointer }]);
  });

  it('and leaves whole pairs, accents and a no-break space alone', () => {
    expect(read('{"a":"\\ud83d\\ude00 \u00e9\u00a0\u20ac"}').slips).toEqual([]);
  });
});
