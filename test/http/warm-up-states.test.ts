import { describe, expect, it } from 'vitest';
import { checkAeroplane } from '../../src/contract/check-aeroplane.ts';
import { propulsion } from '../../src/contract/propulsion.ts';
import { warmUpStates } from '../../src/http/warm-up-states.ts';

describe('warmUpStates', () => {
  const states = warmUpStates('takeoff');

  it('brings an aeroplane of its own under every kind of propulsion', () => {
    const kinds = propulsion._zod.def.options.map((option) => option._zod.def.shape.kind._zod.def.values[0]);
    expect(states.map(({ aeroplane: { definition } }) => definition.propulsion.kind).sort()).toEqual(kinds.sort());
  });

  it('brings none with a fault in it', () => {
    expect(states.flatMap(({ aeroplane: { definition } }) => checkAeroplane(definition, ''))).toEqual([]);
  });
});
