import { describe, expect, it } from 'vitest';
import { csvText } from '../../../src/contract/proof/csv-text.ts';

describe('csvText', () => {
  it('writes records as RFC 4180, sec. 2 shows them: CR LF, and quotation marks doubled inside quotation marks', () => {
    expect(
      csvText([
        ['aaa', 'b,bb'],
        ['x"y', 3],
        ['a\r\nb', ''],
      ]),
    ).toBe('aaa,"b,bb"\r\n"x""y",3\r\n"a\r\nb",\r\n');
  });
});
