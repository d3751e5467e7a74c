import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { columnKinds } from '../../../src/contract/flight-manual/manual-columns.ts';
import { type CsvTable, readTableCsv } from '../../../src/contract/flight-manual/read-table-csv.ts';
import { writeTableCsv } from '../../../src/contract/flight-manual/write-table-csv.ts';
import { manualAxes, manualOutputs } from '../../../src/performance/flight-manual/flight-manual.ts';
import { handbookTakeoff } from '../../support/printed-manuals.ts';

const text = 'pressureAltitude [ft],temperature [degC],groundRoll [ft]\r\n0,0,795\r\n0,-10.5,860\r\n';

describe('a table as CSV', () => {
  it('is headings of name and unit, then numbers', () => {
    expect(readTableCsv(text, '/csv')).toEqual({
      columns: [
        { name: 'pressureAltitude', unit: 'ft' },
        { name: 'temperature', unit: 'degC' },
        { name: 'groundRoll', unit: 'ft' },
      ],
      rows: [
        [0, 0, 795],
        [0, -10.5, 860],
      ],
    });
  });

  it('comes back as it was written', () => {
    const { columns, rows } = handbookTakeoff();
    expect(readTableCsv(writeTableCsv({ columns, rows }), '/csv')).toEqual({ columns, rows });
  });

  const name = fc.constantFrom(...manualAxes, ...manualOutputs);
  const column = name.chain((one) =>
    fc.constantFrom(...columnKinds[one].units).map((unit) => ({ name: one, unit: unit as string })),
  );
  const anyTable: fc.Arbitrary<CsvTable> = fc.array(column, { minLength: 2, maxLength: 12 }).chain((columns) => {
    const cell = fc.integer({ min: -99_999_999, max: 99_999_999 }).map((whole) => whole / 1000);
    const row = fc.array(cell, { minLength: columns.length, maxLength: columns.length });
    return fc.record({ columns: fc.constant(columns), rows: fc.array(row, { minLength: 2, maxLength: 20 }) });
  });
  test.prop([anyTable])('of any columns and numbers comes back the same', (table) => {
    expect(readTableCsv(writeTableCsv(table), '/csv')).toEqual(table);
  });

  it.each([
    ['a byte order mark', `\ufeff${text}`, 'unreadable', 'Line 1, column 1', /without one/],
    ['semicolons', text.replaceAll(',', ';'), 'out-of-range', 'Line 1, column 1', /commas/],
    ['no row', text.split('\r\n')[0] as string, 'out-of-range', 'Line 1, column 1', /0 lines/],
    ['a heading without a unit', text.replace(' [degC]', ''), 'wrong-type', 'Line 1, column 2', /name \[unit\]/],
    ['a heading without a name', text.replace('temperature ', ' '), 'unknown-id', 'Line 1, column 2', /no name/],
    [
      'a misspelt name',
      text.replace('temperature', 'temprature'),
      'unknown-id',
      'Line 1, column 2',
      /Perhaps temperature/,
    ],
    ['a unit of another quantity', text.replace('degC', 'ft'), 'unknown-unit', 'Line 1, column 2', /degC, degF, K/],
    ['a unit in words', text.replace('degC', 'celsius'), 'unknown-unit', 'Line 1, column 2', /Perhaps degC/],
    ['a blank cell', text.replace('860', ''), 'missing', 'Line 3, column 3', /has no line/],
    ['a decimal comma', text.replace('-10.5', '"10,5"'), 'wrong-type', 'Line 3, column 2', /behind a point/],
    ['a number with an exponent', text.replace('795', '7.95e2'), 'wrong-type', 'Line 2, column 3', /not a number/],
    ['a blank around a number', text.replace('795', ' 795'), 'wrong-type', 'Line 2, column 3', /not a number/],
    ['a cell too many', text.replace('795', '795,1'), 'contradiction', 'Line 2, column 3', /4 cells for 3 headings/],
    ['an empty line', text.replace('\r\n0', '\r\n\r\n0'), 'contradiction', 'Line 2, column 1', /1 cell for 3/],
  ])('with %s has one fault, with its line and column', (_, slipped, code, place, says) => {
    const faults = readTableCsv(slipped, '/csv');
    if (!Array.isArray(faults)) throw new Error('no fault');
    expect(faults.map((fault) => `${fault.code} ${fault.pointer}`)).toEqual([`${code} /csv`]);
    const [fault] = faults;
    expect(fault?.message.startsWith(`${place}: `)).toBe(true);
    expect(`${fault?.message} ${fault?.allowed} ${fault?.hint}`).toMatch(says);
  });

  it('tells every fault at once, a hundred at most', () => {
    const faults = readTableCsv(`${text.replaceAll('ft', 'feet')}${'x,y,z\n'.repeat(50)}`, '/csv');
    expect(Array.isArray(faults) && faults.length).toBe(100);
  });
});
