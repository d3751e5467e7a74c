import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { si } from '../quantity.ts';
import { written } from '../written.ts';

/** An empty mass is plausible between these parts of the greatest takeoff mass; our choice. */
const leastEmptyRatio = 0.2;
const greatestEmptyRatio = 0.97;
/** Masses against each other. */
export function checkMasses({ masses }: AeroplaneDefinition, at: string): Fault[] {
  const faults: Fault[] = [];
  const { empty, maximumTakeoff, maximumLanding } = masses;
  const takeoff = si('mass', maximumTakeoff);
  if (empty !== undefined) {
    const ratio = si('mass', empty) / takeoff;
    if (ratio >= 1) {
      faults.push({
        pointer: `${at}/masses/empty`,
        code: 'contradiction',
        message: `The empty mass ${written(empty)} is not below the maximum takeoff mass ${written(maximumTakeoff)}.`,
        received: empty.value,
      });
    } else if (ratio < leastEmptyRatio || ratio > greatestEmptyRatio) {
      faults.push({
        pointer: `${at}/masses/empty`,
        code: 'implausible',
        message: `The empty mass ${written(empty)} is ${Math.round(100 * ratio)} % of the maximum takeoff mass.`,
        received: empty.value,
        allowed: `${100 * leastEmptyRatio} to ${100 * greatestEmptyRatio} % of ${written(maximumTakeoff)}`,
        hint: 'Check the units of both.',
      });
    }
  }
  if (maximumLanding !== undefined) {
    const landing = si('mass', maximumLanding);
    if (landing > takeoff * (1 + 1e-9)) {
      faults.push({
        pointer: `${at}/masses/maximumLanding`,
        code: 'contradiction',
        message: `The maximum landing mass ${written(maximumLanding)} is above the maximum takeoff mass ${written(maximumTakeoff)}.`,
        received: maximumLanding.value,
      });
    }
    if (empty !== undefined && si('mass', empty) < takeoff && landing <= si('mass', empty)) {
      faults.push({
        pointer: `${at}/masses/maximumLanding`,
        code: 'contradiction',
        message: `The maximum landing mass ${written(maximumLanding)} is not above the empty mass ${written(empty)}.`,
        received: maximumLanding.value,
      });
    }
  }
  return faults;
}
