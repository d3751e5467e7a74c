import type { AeroplaneDefinition } from '../contract/aeroplane-definition.ts';
import type { Q } from '../contract/quantity.ts';

type Propulsion = Pick<AeroplaneDefinition, 'category' | 'propulsion'>;

/** An aeroplane at a mass in a configuration: what a warm-up asks of. */
export interface WarmUpState {
  readonly aeroplane: { readonly definition: AeroplaneDefinition };
  readonly mass: Q<'kg'>;
  readonly configuration: string;
}

/** One small invented aeroplane under each kind of propulsion, since each kind has its own arithmetic. */
const propulsions: readonly Propulsion[] = [
  {
    category: 'single-piston',
    propulsion: {
      kind: 'fixed-pitch',
      staticThrust: { value: 2600, unit: 'N' },
      propellerDiameter: { value: 1.9, unit: 'm' },
    },
  },
  {
    category: 'single-piston',
    propulsion: {
      kind: 'constant-speed',
      power: { value: 150, unit: 'kW' },
      propellerDiameter: { value: 1.95, unit: 'm' },
    },
  },
  {
    category: 'single-turboprop',
    propulsion: {
      kind: 'turboprop',
      power: { value: 200, unit: 'kW' },
      propellerDiameter: { value: 2.05, unit: 'm' },
    },
  },
  {
    category: 'single-electric',
    propulsion: {
      kind: 'electric',
      power: { value: 140, unit: 'kW' },
      propellerDiameter: { value: 1.9, unit: 'm' },
    },
  },
  { category: 'single-jet', propulsion: { kind: 'jet', staticThrust: { value: 3400, unit: 'N' } } },
  {
    category: 'single-piston',
    propulsion: {
      kind: 'measured',
      columns: [
        { name: 'trueAirspeed', unit: 'kt' },
        { name: 'thrust', unit: 'N' },
      ],
      rows: [
        [0, 2800],
        [45, 2450],
        [130, 1500],
      ],
      density: { value: 1.2, unit: 'kg/m3' },
      densityExponent: 1,
    },
  },
];

function definition({ category, propulsion }: Propulsion): AeroplaneDefinition {
  return {
    id: `warm-up-${propulsion.kind}`,
    revision: '1',
    name: 'Warm-up (invented)',
    category,
    engines: 1,
    certification: { basis: 'cs-23-amendment-4', screenHeight: { value: 50, unit: 'ft' } },
    masses: { maximumTakeoff: { value: 1040, unit: 'kg' }, maximumLanding: { value: 1040, unit: 'kg' } },
    wing: {
      area: { value: 15.2, unit: 'm2' },
      span: { value: 10.5, unit: 'm' },
      heightAboveGround: { value: 1.1, unit: 'm' },
    },
    drag: { zeroLiftCoefficient: 0.035, oswaldFactor: 0.75 },
    configurations: {
      takeoff: {
        for: ['takeoff'],
        flap: { value: 10, unit: 'deg' },
        maximumLift: { coefficient: 1.6 },
      },
      landing: {
        for: ['landing'],
        flap: { value: 30, unit: 'deg' },
        maximumLift: { stallSpeed: { value: 47, unit: 'kt' }, type: 'cas', mass: { value: 1040, unit: 'kg' } },
      },
    },
    propulsion,
  };
}

/**
 * What each operation is asked before the service is ready: questions that bring their own aeroplane, for the catalogue may
 * hold none, or one with which nothing can be computed.
 */
export function warmUpStates(phase: 'takeoff' | 'landing'): WarmUpState[] {
  return propulsions.map((one) => ({
    aeroplane: { definition: definition(one) },
    mass: { value: 1000, unit: 'kg' },
    configuration: phase,
  }));
}
