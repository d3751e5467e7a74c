import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { Fault } from '../../planning/fault.ts';
import { fittingUnit } from '../fitting-unit.ts';
import { type Q, si } from '../quantity.ts';
import { written } from '../written.ts';

/** Outside these parts of the empty and the greatest mass a mass is a slip, inside a caution at most; our choice. */
const leastOfEmpty = 0.9;
const mostOfMaximum = 1.1;
/** where no empty mass is on file */
const leastOfMaximum = 0.25;
const units = ['kg', 'lb', 't'] as const;

/** A mass that this aeroplane cannot have. */
export function checkMass(mass: Q<'kg' | 't' | 'lb'>, { masses }: Aeroplane): Fault[] {
  const lowest = masses.empty === undefined ? leastOfMaximum * masses.maximumTakeoff : leastOfEmpty * masses.empty;
  const highest = mostOfMaximum * masses.maximumTakeoff;
  const fits = (kilograms: number) => kilograms >= lowest && kilograms <= highest;
  if (fits(si('mass', mass))) return [];
  const meant = fittingUnit('mass', mass, units, fits);
  return [
    {
      pointer: '/mass',
      code: 'implausible',
      message: `${written(mass)} is not a mass of this aeroplane, whose greatest takeoff mass is ${Math.round(masses.maximumTakeoff)} kg${masses.empty === undefined ? '' : ` and whose empty mass is ${Math.round(masses.empty)} kg`}.`,
      received: mass.value,
      allowed: `${Math.ceil(lowest)} to ${Math.floor(highest)} kg`,
      ...(meant === undefined ? {} : { hint: `${mass.value} ${meant} would fit.` }),
    },
  ];
}
