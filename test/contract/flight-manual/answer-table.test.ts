import { describe, expect, it } from 'vitest';
import { answerTable } from '../../../src/contract/flight-manual/answer-table.ts';
import { type TableRequest, tableRequest, tableResponse } from '../../../src/contract/flight-manual/table-request.ts';
import { writeTableCsv } from '../../../src/contract/flight-manual/write-table-csv.ts';
import { isRefused } from '../../../src/planning/fault.ts';
import { handbookTakeoff, knowledgeTestLanding } from '../../support/printed-manuals.ts';
import { named, sampleDefinition, sampleLookup } from '../../support/sample-questions.ts';

function requestOf({ columns, rows, ...members } = handbookTakeoff()): TableRequest {
  return { ...members, csv: writeTableCsv({ columns, rows }) };
}

const answer = (request: TableRequest) => {
  expect(tableRequest.safeParse(request).error).toBeUndefined();
  return answerTable(request, sampleLookup());
};
function found(request: TableRequest) {
  const answered = answer(request);
  if (isRefused(answered)) throw new Error(JSON.stringify(answered));
  expect(tableResponse.safeParse(answered).error).toBeUndefined();
  return answered;
}
function refused(request: TableRequest) {
  const answered = answer(request);
  return isRefused(answered) ? answered.refused : [];
}

describe('a table from CSV', () => {
  it('is the one that a definition has', () => {
    expect(found(requestOf()).table).toEqual(handbookTakeoff());
    expect(found(requestOf(knowledgeTestLanding())).table).toEqual(knowledgeTestLanding());
  });

  it('comes with what is worth knowing of it', () => {
    expect(found(requestOf()).findings).toEqual([
      {
        code: 'not-every-combination',
        message: '42 of 45 combinations are printed; next to a blank one there is no figure.',
      },
      { code: 'not-spoken-of', message: 'No column and no note speaks of uphill or downhill.' },
      { code: 'not-checked', message: 'Without an aeroplane its configurations are not checked.' },
    ]);
    const flat = requestOf({
      ...knowledgeTestLanding(),
      notes: [],
      rows: [
        [0, 59, 445, 1075],
        [2500, 50, 445, 1075],
        [5000, 41, 445, 1075],
      ],
    });
    expect(found(flat).findings.map(({ message }) => message)).toContain(
      'No column and no note speaks of headwind, tailwind, uphill, downhill, other surfaces or days warmer than standard.',
    );
  });

  it('is checked against its aeroplane where that is given', () => {
    const aeroplane = { definition: sampleDefinition() };
    expect(found({ aeroplane, ...requestOf() }).findings.map(({ code }) => code)).not.toContain('not-checked');
    expect(named([...refused({ aeroplane, ...requestOf(), configurations: ['takeoff-11'] })])).toEqual([
      'unknown-id /configurations/0',
    ]);
    expect(named([...refused({ aeroplane: { id: 'no-such-tourer' }, ...requestOf() })])).toEqual([
      'unknown-id /aeroplane/id',
    ]);
  });

  it.each<[string, (request: TableRequest) => TableRequest, string, RegExp]>([
    [
      'a cell out of order',
      (request) => ({ ...request, csv: request.csv.replace('2000,20,1115,2060', '2000,20,1115,2600') }),
      'contradiction /csv',
      /^Line 14, column 4: takeoffDistance is 2600 ft/,
    ],
    [
      'a row twice',
      (request) => ({ ...request, csv: `${request.csv}0,0,795,1460\r\n` }),
      'contradiction /csv',
      /^Line 44: A row before it/,
    ],
    [
      'a column twice',
      (request) => ({ ...request, csv: request.csv.replace('temperature [degC]', 'pressureAltitude [m]') }),
      'contradiction /csv',
      /^Line 1, column 2: /,
    ],
    [
      'a number beyond every table',
      (request) => ({ ...request, csv: request.csv.replace('1460', '14600000') }),
      'out-of-range /csv',
      /^Line 2, column 4: /,
    ],
    [
      'a note of the wrong sign',
      (request) => ({ ...request, notes: request.notes?.map((note) => ({ ...note, changePercent: 10 })) ?? [] }),
      'implausible /notes/0/changePercent',
      /headwind/,
    ],
    [
      'an example that does not come out',
      (request) => ({ ...request, csv: request.csv.replace('3000,20,1230', '3000,20,1240') }),
      'contradiction /workedExamples/0/reads/groundRoll',
      /gives 1178 ft/,
    ],
    [
      'no mass',
      (request) => ({ ...request, conditions: { surface: { kind: 'paved', state: 'dry' } } }),
      'missing /conditions/mass',
      /mass/,
    ],
  ])('with %s is refused where that stands', (_, slip, fault, says) => {
    const faults = refused(slip(requestOf()));
    expect(named([...faults])).toEqual([fault]);
    expect(faults[0]?.message).toMatch(says);
  });

  it('of indicated speeds needs the calibration of its aeroplane', () => {
    const { columns, rows, ...rest } = handbookTakeoff();
    const speeds = {
      ...rest,
      airspeed: 'ias' as const,
      columns: [...columns, { name: 'liftOff' as const, unit: 'kt' }],
      rows: rows.map((row) => [...row, 51]),
    };
    const { airspeedCalibration: _, ...bare } = sampleDefinition();
    expect(named([...refused({ aeroplane: { definition: bare }, ...requestOf(speeds) })])).toEqual([
      'missing /airspeed',
    ]);
    expect(found({ aeroplane: { definition: sampleDefinition() }, ...requestOf(speeds) }).findings).toHaveLength(2);
    expect(found(requestOf(speeds)).findings.at(-1)?.message).toMatch(/indicated speeds/);
  });
});
