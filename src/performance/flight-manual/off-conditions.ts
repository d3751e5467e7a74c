import type { ManualAxis, ManualNote, ManualSheet } from './flight-manual.ts';
import type { ManualAsked, ManualBound, ManualSilence } from './manual-figures.ts';
import { nothing } from './note-amount.ts';

/** A temperature nearer to the standard one than this is the standard one [K]; room for rounding. */
const sameTemperature = 1e-6;

/**
 * Where mass and temperature leave what a sheet is for, as far as no axis and no note speaks of that.
 *
 * A sheet for one mass stands as an edge for a lighter one; a sheet for standard days stands as an edge for a colder one; heavier
 * and warmer are outside.
 *
 * @param axes - of the sheet
 * @param standardTemperature - as the sheet prints it, or of the standard atmosphere [K]
 */
export function offConditions(
  { id, conditions, notes }: ManualSheet,
  axes: readonly ManualAxis[],
  asked: ManualAsked,
  standardTemperature: number,
): { readonly edges: ManualBound[]; readonly outside: ManualBound[] } {
  const edges: ManualBound[] = [];
  const outside: ManualBound[] = [];
  const { mass = asked.mass } = conditions;
  if (!axes.includes('mass')) {
    compare('mass', asked.mass, mass, nothing * mass, ['aboveMass', 'belowMass']);
  }
  if (!axes.includes('temperature') && !axes.includes('temperatureDeviation')) {
    const about = ['aboveStandard', 'belowStandard'] as const;
    compare('temperature', asked.temperature, standardTemperature, sameTemperature, about);
  }
  return { edges, outside };

  function compare(
    axis: ManualAxis,
    given: number,
    bound: number,
    room: number,
    [above, below]: readonly [ManualNote['about'], ManualNote['about']],
  ): void {
    if (given > bound + room && !speaks(notes, above)) outside.push({ sheet: id, axis, given, bound, side: 'above' });
    if (given < bound - room && !speaks(notes, below)) {
      (asked.edges === 'use' ? edges : outside).push({ sheet: id, axis, given, bound, side: 'below' });
    }
  }
}

/** Wind and slope that no axis and no note speaks of; calm and level are always spoken of. */
export function silentOn(
  { notes }: ManualSheet,
  axes: readonly ManualAxis[],
  { creditedHeadwind, slope }: ManualAsked,
): ManualSilence[] {
  const silent: ManualSilence[] = [];
  const wind = creditedHeadwind < 0 ? 'tailwind' : 'headwind';
  if (Math.abs(creditedHeadwind) > nothing && !axes.includes('headwind') && !speaks(notes, wind)) silent.push('wind');
  if (Math.abs(slope) > nothing && !speaks(notes, slope < 0 ? 'downhill' : 'uphill')) silent.push('slope');
  return silent;
}

export function speaks(notes: readonly ManualNote[], about: ManualNote['about']): boolean {
  return notes.some((note) => note.about === about);
}
