import type { FastifyInstance } from 'fastify';
import { answerDecode } from '../../contract/answer-decode.ts';
import { decodeRequest, decodeResponse } from '../../contract/decode.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { addOperation, type WarmUp } from '../operation.ts';

const example = {
  report: 'METAR ZZKV 111150Z 23009G21KT 200V270 9999 SCT030 18/09 Q1009 NOSIG',
  asOf: '2026-06-11T12:10:00Z',
};

/** A report of the weather, read group by group. */
export function decode(app: FastifyInstance, stamp: Stamp): WarmUp {
  return addOperation(app, {
    url: '/v1/weather/decode',
    operationId: 'decode',
    summary: 'What does this report of the weather say?',
    description:
      'Reads a METAR, SPECI or TAF group by group: wind, temperature, pressure with what each rounds, all else kept as text, and what was not understood. The same reading is taken where a question has a report for its weather.',
    tag: 'questions',
    request: decodeRequest,
    response: decodeResponse,
    example,
    warmUp: [example],
    answer: (request) => answerDecode(request, stamp),
  });
}
