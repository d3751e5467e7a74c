import type { FastifyInstance } from 'fastify';
import type { AeroplaneLookup } from '../../contract/aeroplane-lookup.ts';
import { answerTable } from '../../contract/flight-manual/answer-table.ts';
import { type TableRequest, tableRequest, tableResponse } from '../../contract/flight-manual/table-request.ts';
import { definitionBody } from '../body-limits.ts';
import { addOperation, type WarmUp } from '../operation.ts';

/** Invented, for the document. */
const example: TableRequest = {
  id: 'takeoff-flap-10',
  for: 'takeoff',
  configurations: ['takeoff-10'],
  page: '5-11',
  conditions: { surface: { kind: 'paved', state: 'dry' }, mass: { value: 1050, unit: 'kg' } },
  notes: [
    {
      about: 'headwind',
      per: { value: 9, unit: 'kt' },
      changePercent: -10,
      multiplies: 'both',
      text: 'Decrease distances 10 % for each 9 knots of headwind.',
    },
  ],
  workedExamples: [
    {
      given: {
        pressureAltitude: { value: 1000, unit: 'ft' },
        temperature: { value: 10, unit: 'degC' },
        headwind: { value: 9, unit: 'kt' },
      },
      reads: { takeoffDistance: { value: 441, unit: 'm' } },
      within: { value: 1, unit: 'm' },
    },
  ],
  csv: [
    'pressureAltitude [ft],temperature [degC],groundRoll [m],takeoffDistance [m]',
    '0,0,235,430',
    '0,20,270,490',
    '2000,0,275,505',
    '2000,20,315,535',
    '',
  ].join('\r\n'),
};

export function tables(app: FastifyInstance, lookup: AeroplaneLookup): WarmUp {
  return addOperation(app, {
    url: '/v1/aeroplanes/tables',
    operationId: 'manualTable',
    summary: "What is this page of the flight manual as part of an aeroplane's definition?",
    description:
      'A table of a flight manual as CSV with name [unit] headings, and what is printed around it; gives the table as a definition has it, under flightManual.tables, once every cell, note and worked example agrees.',
    tag: 'questions',
    request: tableRequest,
    response: tableResponse,
    example,
    ownText: ['/csv'],
    limits: definitionBody,
    warmUp: [example],
    answer: (request) => answerTable(request, lookup),
  });
}
