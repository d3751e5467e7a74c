import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { aeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import { airRequest, airResponse } from '../../src/contract/air.ts';
import { airspeedRequest, airspeedResponse } from '../../src/contract/airspeed.ts';
import { fitRequest } from '../../src/contract/fit/fit-request.ts';
import { fitResponse } from '../../src/contract/fit/fit-response.ts';
import { speedsRequest, speedsResponse } from '../../src/contract/speeds.ts';
import { takeoffRequest } from '../../src/contract/takeoff-request.ts';
import { takeoffResponse } from '../../src/contract/takeoff-response.ts';

const requests = { aeroplaneDefinition, airRequest, airspeedRequest, fitRequest, speedsRequest, takeoffRequest };
const responses = { airResponse, airspeedResponse, fitResponse, speedsResponse, takeoffResponse };

type Node = Record<string, unknown>;

/** Every node of a JSON Schema with the path to it. */
function* nodes(node: unknown, path: string): Generator<[Node, string]> {
  if (typeof node !== 'object' || node === null) return;
  if (!Array.isArray(node)) yield [node as Node, path];
  for (const [name, child] of Object.entries(node)) yield* nodes(child, `${path}/${name}`);
}

function documented(schema: z.ZodType): [Node, string][] {
  return [...nodes(z.toJSONSchema(schema), '')];
}

describe('schemas of the contract', () => {
  it.each(Object.entries({ ...requests, ...responses }))('%s compiles without falling back', (_, schema) => {
    expect(() => z.compile(schema as z.ZodType, { strict: true })).not.toThrow();
  });

  it.each(Object.entries(requests))('%s has no unbounded number, text, list or table', (_, schema) => {
    const loose = documented(schema).filter(([node]) => {
      switch (node['type']) {
        case 'number':
        case 'integer':
          return typeof node['minimum'] !== 'number' || typeof node['maximum'] !== 'number';
        case 'string':
          return node['enum'] === undefined && node['const'] === undefined && !((node['maxLength'] as number) <= 512);
        case 'array':
          return node['prefixItems'] === undefined && !((node['maxItems'] as number) <= 1000);
        case 'object':
          return typeof node['additionalProperties'] === 'object' && !((node['maxProperties'] as number) <= 100);
        default:
          return false;
      }
    });
    expect(loose.map(([, path]) => path)).toEqual([]);
  });

  it.each(Object.entries({ ...requests, ...responses }))('%s takes no member it does not name', (_, schema) => {
    const open = documented(schema).filter(
      ([node]) =>
        node['type'] === 'object' && node['properties'] !== undefined && node['additionalProperties'] !== false,
    );
    expect(open.map(([, path]) => path)).toEqual([]);
  });

  it.each(Object.entries({ ...requests, ...responses }))('%s describes each of its named parts', (_, schema) => {
    const parts = Object.entries((z.toJSONSchema(schema) as { $defs: Record<string, Node> }).$defs);
    expect(parts.length).toBeGreaterThan(2);
    expect(parts.filter(([, part]) => !part['description']).map(([name]) => name)).toEqual([]);
  });

  it('every quantity of a question names its unit: no bare number but coefficients, ratios and the like', () => {
    const bare = new Set<string>();
    for (const schema of Object.values(requests)) {
      for (const [node, path] of documented(schema)) {
        if (node['type'] !== 'number' && node['type'] !== 'integer') continue;
        const member = path.split('/').at(-1) as string;
        if (member !== 'value' && !/(Coefficient|coefficient|Ratio|Factor|Exponent)$/.test(member)) bare.add(member);
      }
    }
    const ofColumns = ['items', 'parameter', 'reference'];
    const counts = ['0', '1', '2', 'engines', 'mach', 'passengerSeats', 'tyres'];
    const percents = [
      'changePercent',
      'greatestPercent',
      'rmsPercent',
      'speedUncertaintyPercent',
      'uncertaintyPercent',
    ];
    expect([...bare].sort()).toEqual([...counts, ...ofColumns, ...percents, 'factor'].sort());
  });
});
