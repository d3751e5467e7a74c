import { createHash } from 'node:crypto';
import type { FastifyInstance } from 'fastify';
import type { AeroplaneLookup } from '../../contract/aeroplane-lookup.ts';
import { answerProof } from '../../contract/proof/answer-proof.ts';
import { proofCsv } from '../../contract/proof/proof-csv.ts';
import { proofPage } from '../../contract/proof/proof-page.ts';
import { proofRequest } from '../../contract/proof/proof-request.ts';
import { proofResponse } from '../../contract/proof/proof-response.ts';
import { proofStyle } from '../../contract/proof/proof-style.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { definitionBody } from '../body-limits.ts';
import { exampleDefinition } from '../document/example-definition.ts';
import { addLongOperation, type WarmUp } from '../operation.ts';

const styleDigest = createHash('sha256').update(proofStyle).digest('base64');

/** Nothing runs and nothing is fetched: the page holds its own style, by its digest, and no more. */
const pageHeaders = {
  'content-security-policy': `default-src 'none'; style-src 'sha256-${styleDigest}'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'`,
  'referrer-policy': 'no-referrer',
};

/** Each cell of a table back as computed, to be compared with the manual and signed. */
export function proof(app: FastifyInstance, lookup: AeroplaneLookup, stamp: Stamp): WarmUp {
  const example = { aeroplane: { definition: exampleDefinition }, table: 'takeoff-10-short-field' };
  return addLongOperation(app, {
    url: '/v1/aeroplanes/proof',
    operationId: 'proof',
    summary: 'Does the service read this table as it is printed?',
    description:
      'Answers with each cell of a table of the flight manual as printed, as looked up at its own conditions, and as computed by physics, as JSON, as CSV (Accept: text/csv), or as a page to print, to compare with the manual and to sign (Accept: text/html).',
    tag: 'questions',
    request: proofRequest,
    response: proofResponse,
    example,
    limits: definitionBody,
    forms: {
      'text/csv': {
        mediaType: 'text/csv; charset=utf-8; header=present',
        write: proofCsv,
        description: 'RFC 4180: a header of names with units, one record a row of the table.',
      },
      'text/html': {
        mediaType: 'text/html; charset=utf-8',
        headers: pageHeaders,
        write: proofPage,
        description: 'A page of A4 to print and to sign.',
      },
    },
    warmUp: [example],
    work: (request) => answerProof(request, lookup, stamp),
  });
}
