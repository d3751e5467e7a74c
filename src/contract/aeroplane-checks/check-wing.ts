import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { si } from '../quantity.ts';
import { figure, written } from '../written.ts';

/** Aspect ratios from a flying disc to a sailplane; our choice. */
const aspectRatios = { lowest: 3, highest: 40 };

/** Wing loadings of fixed-wing aeroplanes that carry people, with room to spare [kg/m2]; our choice. */
const wingLoadings = { lowest: 10, highest: 800 };

/** Wing area against the mass it carries: what is wrong here spoils every check that needs the area. */
export function checkWingLoading({ masses, wing }: AeroplaneDefinition, at: string): Fault[] {
  const loading = si('mass', masses.maximumTakeoff) / si('area', wing.area);
  if (loading >= wingLoadings.lowest && loading <= wingLoadings.highest) return [];
  return [
    {
      pointer: `${at}/wing/area`,
      code: 'implausible',
      message: `${written(masses.maximumTakeoff)} on ${written(wing.area)} is a wing loading of ${figure(loading)} kg/m2.`,
      received: wing.area.value,
      allowed: `${wingLoadings.lowest} to ${wingLoadings.highest} kg/m2`,
      hint: 'Check the units of the wing area and of the mass.',
    },
  ];
}

/** The wing's own proportions. */
export function checkWing({ wing }: AeroplaneDefinition, at: string): Fault[] {
  const faults: Fault[] = [];
  const span = si('length', wing.span);
  const aspectRatio = span ** 2 / si('area', wing.area);
  if (aspectRatio < aspectRatios.lowest || aspectRatio > aspectRatios.highest) {
    faults.push({
      pointer: `${at}/wing/span`,
      code: 'implausible',
      message: `A span of ${written(wing.span)} with ${written(wing.area)} is an aspect ratio of ${figure(aspectRatio)}.`,
      received: wing.span.value,
      allowed: `an aspect ratio of ${aspectRatios.lowest} to ${aspectRatios.highest}`,
      hint: 'Check the units of span and area.',
    });
  }
  if (si('length', wing.heightAboveGround) > span / 2) {
    faults.push({
      pointer: `${at}/wing/heightAboveGround`,
      code: 'implausible',
      message: `A wing ${written(wing.heightAboveGround)} above the ground is higher than half the span of ${written(wing.span)}.`,
      received: wing.heightAboveGround.value,
      allowed: 'at most half the span',
      hint: 'It is the height above the runway of the quarter chord of the mean chord; check its unit.',
    });
  }
  return faults;
}
