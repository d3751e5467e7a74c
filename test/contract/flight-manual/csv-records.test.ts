import { describe, expect, it } from 'vitest';
import { csvRecords } from '../../../src/contract/flight-manual/csv-records.ts';

const cells = (text: string) => {
  const read = csvRecords(text);
  return Array.isArray(read) ? read.map((record) => record.cells) : read;
};

/** Forms of RFC 4180, sec. 2, by its rules' numbers; written from memory. */
describe('CSV', () => {
  it.each([
    [
      '1: each record on a line, CR LF',
      'aaa,bbb\r\nzzz,yyy\r\n',
      [
        ['aaa', 'bbb'],
        ['zzz', 'yyy'],
      ],
    ],
    [
      '2: the last line without an end',
      'aaa,bbb\r\nzzz,yyy',
      [
        ['aaa', 'bbb'],
        ['zzz', 'yyy'],
      ],
    ],
    [
      'LF alone, as most programs write it',
      'aaa,bbb\nzzz,yyy\n',
      [
        ['aaa', 'bbb'],
        ['zzz', 'yyy'],
      ],
    ],
    ['4: blanks belong to the cell, and a cell may be empty', ' a,,b ', [[' a', '', 'b ']]],
    ['5 and 6: quotation marks around a comma', '"a,b",c', [['a,b', 'c']]],
    ['7: a quotation mark doubled within them', '"a ""b"" c",', [['a "b" c', '']]],
    ['an empty line is one empty cell', 'a\n\nb', [['a'], [''], ['b']]],
  ])('%s', (_, text, records) => {
    expect(cells(text)).toEqual(records);
  });

  it.each([
    ['a quotation mark inside a bare cell', 'a,b\r\nc,d"e', 2, 2, /quotation mark/],
    ['a quotation mark that is not closed', '"a,b\r\nc', 1, 1, /not closed/],
    ['something behind a closing one', 'x,"a"b', 1, 2, /follows a closing/],
    ['a control character', 'a\nb,c\u0007', 2, 2, /control character/],
    ['a bare CR', 'a,b\rc,d', 1, 2, /control character/],
    ['half of a surrogate pair', 'a,\ud800', 1, 2, /surrogate/],
  ])('%s is told with its line and column', (_, text, line, column, says) => {
    expect(csvRecords(text)).toEqual({ line, column, message: expect.stringMatching(says) });
  });
});
