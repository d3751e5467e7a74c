import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { mostPowerSettings } from '../propulsion.ts';

/** So many configurations at most; our choice. */
export const mostConfigurations = 24;

/** How many configurations and power settings there may be. */
export function checkCounts({ configurations, propulsion }: AeroplaneDefinition, at: string): Fault[] {
  const { powerSettings } = propulsion;
  return [
    ...checkCount(configurations, mostConfigurations, 'configurations', `${at}/configurations`),
    ...(powerSettings === undefined
      ? []
      : checkCount(powerSettings, mostPowerSettings, 'power settings', `${at}/propulsion/powerSettings`)),
  ];
}

function checkCount(byId: object, most: number, what: string, pointer: string): Fault[] {
  const count = Object.keys(byId).length;
  if (count >= 1 && count <= most) return [];
  return [
    {
      pointer,
      code: count === 0 ? 'missing' : 'out-of-range',
      message: `${count} ${what} are given.`,
      received: count,
      allowed: `1 to ${most} ${what}`,
    },
  ];
}
