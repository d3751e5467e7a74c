import { describe, expect, it } from 'vitest';
import { digest } from '../../src/catalogue/digest.ts';
import type { AeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import { orderOfIds } from '../../src/contract/order-of-ids.ts';
import { sampleDefinition } from '../support/sample-questions.ts';

const settings = { b: { fullPowerRatio: 0.9 }, a: { fullPowerRatio: 0.8 } };

function backwards(definition: AeroplaneDefinition): AeroplaneDefinition {
  const configurations = Object.fromEntries(Object.entries(definition.configurations).reverse());
  return { ...definition, configurations, propulsion: { ...definition.propulsion, powerSettings: settings } };
}

function forwards(definition: AeroplaneDefinition): AeroplaneDefinition {
  const { a, b } = settings;
  return { ...definition, propulsion: { ...definition.propulsion, powerSettings: { a, b } } };
}

describe('the order of ids', () => {
  const first = forwards(sampleDefinition());
  const second = backwards(sampleDefinition());

  it('is that of the ids, however they are written', () => {
    expect(JSON.stringify(orderOfIds(second).configurations)).toBe(JSON.stringify(orderOfIds(first).configurations));
    expect(Object.keys(orderOfIds(second).configurations)).toEqual(['landing-full', 'takeoff-10']);
    expect(Object.keys(orderOfIds(second).propulsion.powerSettings ?? {})).toEqual(['a', 'b']);
  });

  it('loses nothing', () => {
    expect(orderOfIds(second)).toEqual(second);
    expect(orderOfIds(sampleDefinition())).toEqual(sampleDefinition());
  });

  it('gives power settings written in another order the same digest', () => {
    expect(digest(second)).toBe(digest(first));
  });
});
