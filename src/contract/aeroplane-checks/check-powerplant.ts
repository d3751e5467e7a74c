import type { Category } from '../../performance/aeroplane.ts';
import { g0 } from '../../physics/constants.ts';
import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { si } from '../quantity.ts';
import { figure } from '../written.ts';

type Kind = AeroplaneDefinition['propulsion']['kind'];

/** What can drive each category; measured thrust is of any engine. */
const kindsOf: Record<string, readonly Kind[]> = {
  piston: ['fixed-pitch', 'constant-speed', 'measured'],
  electric: ['electric', 'fixed-pitch', 'measured'],
  turboprop: ['turboprop', 'measured'],
  jet: ['jet', 'measured'],
};

/** Static thrust over weight and shaft power over mass [W/kg] of aeroplanes that take off from runways; our choice. */
const thrustToWeight = { lowest: 0.04, highest: 1.5 };
const powerToMass = { lowest: 20, highest: 1500 };

/** Category, number of engines, certification and propulsion against each other, and their size against the mass. */
export function checkPowerplant(definition: AeroplaneDefinition, at: string): Fault[] {
  const { category, engines, certification, propulsion, engineOut } = definition;
  const [number, engine] = category.split('-') as [string, string];
  const faults: Fault[] = [];
  if (engines !== (number === 'twin' ? 2 : 1)) {
    faults.push({
      pointer: `${at}/engines`,
      code: 'contradiction',
      message: `The category is ${category}, with ${engines} engine${engines === 1 ? '' : 's'} given.`,
      received: engines,
      allowed: number === 'twin' ? '2' : '1',
    });
  }
  const kinds = kindsOf[engine] as readonly Kind[];
  if (!kinds.includes(propulsion.kind)) {
    faults.push({
      pointer: `${at}/propulsion/kind`,
      code: 'contradiction',
      message: `A ${category satisfies Category} is not driven by ${propulsion.kind} propulsion.`,
      received: propulsion.kind,
      allowed: kinds.join(', '),
    });
  }
  if (number !== 'twin' && (certification.basis === 'cs-25' || certification.basis === 'cs-23-commuter')) {
    faults.push({
      pointer: `${at}/certification/basis`,
      code: 'contradiction',
      message: `The basis ${certification.basis} is for aeroplanes with two or more engines; the category is ${category}.`,
      received: certification.basis,
      allowed: 'cs-23-amendment-4, none',
    });
  }
  if (certification.stopRule !== undefined && certification.basis !== 'cs-25') {
    faults.push({
      pointer: `${at}/certification/stopRule`,
      code: 'contradiction',
      message: `A rule of the transport category for the rejected takeoff is stated; the basis is ${certification.basis}.`,
      received: certification.stopRule,
      hint: 'Leave stopRule away.',
    });
  }
  if (number !== 'twin' && engineOut !== undefined) {
    faults.push({
      pointer: `${at}/engineOut`,
      code: 'contradiction',
      message: `A ${category} has no second engine to go on with.`,
      hint: 'Leave engineOut away.',
    });
  }
  faults.push(...checkSize(definition, at));
  return faults;
}

function checkSize({ propulsion, masses, engines }: AeroplaneDefinition, at: string): Fault[] {
  const mass = si('mass', masses.maximumTakeoff);
  if (propulsion.kind === 'fixed-pitch' || propulsion.kind === 'jet') {
    const ratio = (engines * si('force', propulsion.staticThrust)) / (mass * g0);
    if (ratio >= thrustToWeight.lowest && ratio <= thrustToWeight.highest) return [];
    return [
      {
        pointer: `${at}/propulsion/staticThrust`,
        code: 'implausible',
        message: `The static thrust of all engines is ${figure(ratio)} of the weight at the maximum takeoff mass.`,
        received: propulsion.staticThrust.value,
        allowed: `${thrustToWeight.lowest} to ${thrustToWeight.highest} of the weight`,
        hint: 'Static thrust is of one engine; check its unit.',
      },
    ];
  }
  if (propulsion.kind === 'measured') return [];
  const ratio = (engines * si('power', propulsion.power)) / mass;
  if (ratio >= powerToMass.lowest && ratio <= powerToMass.highest) return [];
  return [
    {
      pointer: `${at}/propulsion/power`,
      code: 'implausible',
      message: `The power of all engines is ${figure(ratio)} W for each kilogram of the maximum takeoff mass.`,
      received: propulsion.power.value,
      allowed: `${powerToMass.lowest} to ${powerToMass.highest} W/kg`,
      hint: 'Power is of one engine; check its unit.',
    },
  ];
}
