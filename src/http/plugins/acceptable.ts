import type { FastifyInstance } from 'fastify';
import { problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

const jsonAlone = ['application/json'];

/** Refuses a caller who accepts none of the media types of a path; the pages of the documentation are not asked. */
export function acceptable(app: FastifyInstance): void {
  app.addHook('onRequest', (request, reply, done) => {
    const { accept } = request.headers;
    const { offers = jsonAlone } = request.routeOptions.config;
    if (request.url.startsWith('/docs') || bestOffer(accept, offers) !== undefined) done();
    else sendProblem(reply, problemOf('not-acceptable', `The answer is ${inWords(offers)}.`));
  });
}

/**
 * The media type that an Accept field likes best of those offered: the one with the greatest weight, of equal ones the first.
 *
 * The most specific range that fits a media type decides its weight; ranges with parameters fit nothing.
 *
 * @param accept - absent: everything
 * @param offers - as 'text/csv'
 * @returns undefined where it takes none of them
 * @see references.Rfc9110, sec. 12.5.1
 */
export function bestOffer(accept: string | undefined, offers: readonly string[]): string | undefined {
  if (accept === undefined) return offers[0];
  const ranges = accept.split(',').map(readRange);
  let best: string | undefined;
  let most = 0;
  for (const offer of offers) {
    const weight = weightOf(offer, ranges);
    if (weight > most) {
      best = offer;
      most = weight;
    }
  }
  return best;
}

interface Range {
  readonly range: string;
  readonly weight: number;
}

function readRange(part: string): Range {
  const [range = '', ...parameters] = part.split(';').map((piece) => piece.trim().toLowerCase());
  const weight = parameters.find((parameter) => parameter.startsWith('q='));
  return { range, weight: weight === undefined ? 1 : Number(weight.slice(2)) || 0 };
}

function weightOf(offer: string, ranges: readonly Range[]): number {
  for (const fitting of [offer, `${offer.split('/')[0]}/*`, '*/*']) {
    const found = ranges.findLast(({ range }) => range === fitting);
    if (found !== undefined) return found.weight;
  }
  return 0;
}

function inWords(offers: readonly string[]): string {
  const last = offers.at(-1) as string;
  return offers.length === 1 ? last : `${offers.slice(0, -1).join(', ')} or ${last}`;
}
