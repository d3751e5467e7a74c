import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { Fault } from '../../planning/fault.ts';
import { unknownId } from '../unknown-id.ts';

/**
 * A configuration must be one of the aeroplane's, made for what is asked.
 *
 * @param use - what it must be for; absent: either
 */
export function checkConfigurationId(given: string, aeroplane: Aeroplane, use?: 'takeoff' | 'landing'): Fault[] {
  const found = Object.hasOwn(aeroplane.configurations, given) ? aeroplane.configurations[given] : undefined;
  if (found !== undefined && (use === undefined || found.for.includes(use))) return [];
  const configurations = Object.entries(aeroplane.configurations);
  const made = configurations
    .filter(([, configuration]) => use === undefined || configuration.for.includes(use))
    .map(([id]) => id);
  const kind = use === undefined ? 'configuration' : `${use} configuration`;
  if (found === undefined) return [unknownId('/configuration', `${kind} of ${aeroplane.id}`, given, made)];
  return [
    {
      pointer: '/configuration',
      code: 'contradiction',
      message: `${given} of ${aeroplane.id} is for ${found.for.join(' and ')} only.`,
      received: given,
      allowed: made.length > 0 ? made.join(', ') : `none: ${aeroplane.id} has no ${kind}`,
    },
  ];
}
