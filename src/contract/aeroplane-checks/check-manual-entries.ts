import type { ManualAxis, ManualOutput, ManualPhase } from '../../performance/flight-manual/flight-manual.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { written } from '../written.ts';

/** What a sheet is entered with: pressure altitude always, mass as an axis or as a condition, temperature in one form. */
export function checkEntries(
  axes: readonly ManualAxis[],
  { mass }: ManualTableOnWire['conditions'],
  at: string,
  conditionsAt: string,
): Fault[] {
  const faults: Fault[] = [];
  if (!axes.includes('pressureAltitude')) {
    faults.push({
      pointer: at,
      code: 'missing',
      message: 'Nothing here is entered with pressureAltitude.',
      allowed: 'pressureAltitude and what else the manual enters with',
    });
  }
  if (mass === undefined && !axes.includes('mass')) {
    faults.push({
      pointer: `${conditionsAt}/mass`,
      code: 'missing',
      message: 'The mass is neither entered nor stated.',
      allowed: 'a mass in conditions, or mass among what it is entered with',
    });
  }
  if (mass !== undefined && axes.includes('mass')) {
    faults.push({
      pointer: `${conditionsAt}/mass`,
      code: 'contradiction',
      message: `The mass is entered, and stated as ${written(mass)} too.`,
      received: mass.value,
      hint: 'Leave one of the two away.',
    });
  }
  if (axes.includes('temperature') && axes.includes('temperatureDeviation')) {
    faults.push({
      pointer: at,
      code: 'exactly-one-of',
      message: 'temperature and temperatureDeviation do not go together.',
      allowed: 'exactly one of temperature or temperatureDeviation, or neither',
    });
  }
  return faults;
}

const outputsOf: Readonly<Record<ManualPhase, readonly ManualOutput[]>> = {
  takeoff: ['groundRoll', 'takeoffDistance', 'liftOff', 'screen'],
  landing: ['groundRoll', 'landingDistance', 'landingReference'],
  climb: ['climbGradient', 'climbRate'],
};
const speeds: readonly ManualOutput[] = ['liftOff', 'screen', 'landingReference'];

/** What a sheet gives: something, and nothing of another phase. */
export function checkOutputs(outputs: readonly ManualOutput[], phase: ManualPhase, at: string): Fault[] {
  const allowed = outputsOf[phase];
  const strange = outputs.find((output) => !allowed.includes(output));
  if (strange !== undefined) {
    return [
      {
        pointer: at,
        code: 'contradiction',
        message: `${strange} is no figure of a ${phase}.`,
        received: strange,
        allowed: allowed.join(', '),
      },
    ];
  }
  if (outputs.some((output) => !speeds.includes(output))) return [];
  return [
    {
      pointer: at,
      code: 'missing',
      message: `Nothing here is a figure of the ${phase}.`,
      allowed: allowed.filter((output) => !speeds.includes(output)).join(' or '),
    },
  ];
}
