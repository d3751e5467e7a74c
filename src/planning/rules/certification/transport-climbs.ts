import type { ReferenceKey } from '../../../references.ts';
import { isTransport } from '../named-aeroplanes.ts';
import type { ClimbDemand } from '../rule-set.ts';

/** Gradients with one engine out for two, three and four engines. */
type ByEngines = readonly [number, number, number];

const ft = 0.3048;
const numbers = ['two', 'three', 'four'];

function climb(
  code: string,
  of: ClimbDemand['of'],
  gradients: ByEngines,
  configuration: string,
  source: ReferenceKey,
  atHeight?: number,
): readonly ClimbDemand[] {
  return gradients.map((gradient, index) => ({
    code,
    of,
    engines: 'one-out',
    gradient,
    ...(gradient === 0 ? { positive: true } : {}),
    ...(atHeight === undefined ? {} : { atHeight }),
    configuration,
    appliesTo: (aeroplane) => isTransport(aeroplane) && aeroplane.engines === index + 2,
    when: `transport category, ${numbers[index]} engines`,
    source,
    status: 'read',
  }));
}

/**
 * Gradients of climb of the transport category after takeoff.
 *
 * @see references.Cfr25s121, (a) to (c)
 */
export const transportTakeoffClimbs: readonly ClimbDemand[] = [
  ...climb('climb-gear-down-engine-out', 'takeoff', [0, 0.003, 0.005], 'takeoff flap, gear down, (a)', 'Cfr25s121'),
  ...climb(
    'climb-gear-up-engine-out',
    'takeoff',
    [0.024, 0.027, 0.03],
    'takeoff flap, gear up, (b)',
    'Cfr25s121',
    400 * ft,
  ),
  ...climb('climb-final-engine-out', 'takeoff', [0.012, 0.015, 0.017], 'flap and gear up, (c)', 'Cfr25s121', 1500 * ft),
];

/**
 * Gradients of climb of the transport category on the approach and after a balked landing.
 *
 * @see references.Cfr25s121, (d); references.Cfr25s119
 */
export const transportLandingClimbs: readonly ClimbDemand[] = [
  ...climb('climb-approach-engine-out', 'approach', [0.021, 0.024, 0.027], 'approach flap, gear up, (d)', 'Cfr25s121'),
  {
    code: 'climb-balked-landing-all-engines',
    of: 'balked-landing',
    engines: 'all',
    gradient: 0.032,
    configuration: 'landing flap, gear down',
    appliesTo: isTransport,
    when: 'transport category',
    source: 'Cfr25s119',
    status: 'memory',
  },
];
