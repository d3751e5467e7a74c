import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { Fault } from '../../planning/fault.ts';
import { unknownId } from '../unknown-id.ts';

/** A configuration must be one of the aeroplane's, made for what is asked. */
export function checkConfigurationId(given: string, aeroplane: Aeroplane, use: 'takeoff' | 'landing'): Fault[] {
  const configurations = Object.entries(aeroplane.configurations);
  const made = configurations.filter(([, configuration]) => configuration.for.includes(use)).map(([id]) => id);
  const found = configurations.find(([id]) => id === given)?.[1];
  if (found === undefined) return [unknownId('/configuration', `${use} configuration of ${aeroplane.id}`, given, made)];
  if (found.for.includes(use)) return [];
  return [
    {
      pointer: '/configuration',
      code: 'contradiction',
      message: `${given} of ${aeroplane.id} is for ${found.for.join(' and ')} only.`,
      received: given,
      allowed: made.join(', ') || `none: ${aeroplane.id} has no ${use} configuration`,
    },
  ];
}
