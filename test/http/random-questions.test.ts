import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { answerSlips } from '../support/answer-slips.ts';
import { type Dice, dice } from '../support/dice.ts';
import { post, testHouse } from '../support/house.ts';
import { type Phase, randomQuestion } from '../support/random-question.ts';

/** RANDOM_SEED=7 asks two thousand others; the title of a failure names the seed of the one question. */
const seed = Number(process.env['RANDOM_SEED'] ?? 20_261_201);
const onFile = readCatalogue({ builtIn: true })
  .list()
  .map(({ definition }) => definition);

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

/** The same JSON with the members of every object in another order. */
function shuffled(node: unknown, { roll }: Dice): unknown {
  if (Array.isArray(node)) return node.map((item) => shuffled(item, { roll } as Dice));
  if (typeof node !== 'object' || node === null) return node;
  const members = Object.entries(node).map(([name, inner]) => [roll(), name, inner] as const);
  return Object.fromEntries(
    members.sort(([a], [b]) => a - b).map(([, name, inner]) => [name, shuffled(inner, { roll } as Dice)]),
  );
}

function resolves(pointer: string, body: unknown): boolean {
  let node = body;
  for (const step of pointer.split('/').slice(1)) {
    const name = step.replaceAll('~1', '/').replaceAll('~0', '~');
    if (typeof node !== 'object' || node === null || !Object.hasOwn(node, name)) return false;
    node = (node as Record<string, unknown>)[name];
  }
  return true;
}

interface Refusal {
  readonly errors: readonly { readonly pointer: string; readonly code: string; readonly message: string }[];
}

/** Each fault once, of meaning and not of form, at a place that is there or, if missing, whose parent is. */
function refusalSlips({ errors }: Refusal, body: unknown): string[] {
  const slips = errors
    .filter(({ code }) => !['contradiction', 'implausible', 'missing', 'out-of-range'].includes(code))
    .map(({ code, pointer }) => `${code} at ${pointer} in a question of the contract`);
  for (const { pointer, code } of errors) {
    const place = code === 'missing' ? pointer.slice(0, pointer.lastIndexOf('/')) : pointer;
    const given = resolves(place, body);
    // what a default brings about is told where it could be stated
    if (!given && !/\/speeds\/\w+$/.test(place)) slips.push(`${code} at ${pointer}, which is not there`);
  }
  const told = new Set(errors.map((fault) => `${fault.code} ${fault.pointer} ${fault.message}`));
  if (errors.length === 0 || told.size < errors.length)
    slips.push(`${errors.length} faults, ${told.size} of them different`);
  return slips;
}

describe.each([
  ['takeoff', 1300],
  ['landing', 700],
] as const)(`%s: %d random questions as wide as the contract, seed ${seed}`, (phase: Phase, count) => {
  const met = new Map<string, number>();
  const meet = (what: string) => met.set(what, (met.get(what) ?? 0) + 1);

  it('each have a lawful answer or a refusal that says why', { timeout: 60_000 }, async () => {
    const slips: string[] = [];
    for (let i = 0; i < count; i++) {
      const own = (seed + i * 7919) >>> 0;
      const body = randomQuestion(dice(own), onFile, phase);
      const reply = await post(app, `/v1/${phase}`, body);
      const found: string[] = [];
      meet(String(reply.statusCode));
      if (reply.statusCode === 200) {
        const answer = reply.json();
        found.push(...answerSlips(answer));
        meet(answer.outcome);
        if (i % 8 === 0) {
          const turned = await post(app, `/v1/${phase}`, shuffled(body, dice(own)));
          if (turned.body !== reply.body) found.push('another order of members gives another answer');
          const again = (await post(app, `/v1/${phase}`, answer.question)).json();
          // units and rounding are no longer assumed
          const { assumed: _, ...basis } = answer.basis;
          if (again.basis !== undefined) delete again.basis.assumed;
          if (JSON.stringify(again) !== JSON.stringify({ ...answer, basis })) found.push('its own question differs');
        }
      } else if (reply.statusCode === 422) found.push(...refusalSlips(reply.json(), body));
      else found.push(`status ${reply.statusCode}: ${reply.body}`);
      slips.push(...found.map((slip) => `seed ${own}: ${slip}`));
    }
    expect(slips).toEqual([]);
  });

  it('reach most outcomes, and are mostly answered', () => {
    expect(met.get('200')).toBeGreaterThan(0.85 * count);
    expect(met.get('422')).toBeGreaterThan(0);
    expect(met.size).toBeGreaterThan(9);
  });
});
