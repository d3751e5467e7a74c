import type { z } from 'zod';
import type { TrajectoryPoint } from '../performance/trajectory.ts';
import type { Sensitivity } from '../planning/detail/detail.ts';
import type { WorkingLine } from '../planning/working/working-line.ts';
import { roundTo, shown, unitFor } from '../units/presentation.ts';
import type { trajectory, working } from './detail.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';
import { toMeasure } from './to-advisory.ts';

type ShownLine = z.infer<typeof working>[number];

/** The working as an answer shows it: in SI and unrounded, whatever is asked for, so that its formulas hold. */
export function toWorking(how: Presentation, lines: readonly WorkingLine[]): ShownLine[] {
  return lines.map(({ part, symbol, name, value, unit, origin, formula, from, at, source, shownAs }) => {
    const line = { part, symbol, name, value: value + 0 } as Draft<ShownLine>;
    if (unit !== undefined) line.unit = unit;
    line.origin = origin;
    if (formula !== undefined) line.formula = formula;
    line.from = [...from];
    if (at !== undefined) line.at = at;
    if (source !== undefined) line.source = source;
    if (shownAs !== undefined) line.shown = shownQuantity(how, shownAs.kind, value, shownAs.direction);
    return line;
  });
}

/** A trajectory as columns with units and rows. */
export function toTrajectory(
  { units, rounding }: Presentation,
  points: readonly TrajectoryPoint[],
): z.infer<typeof trajectory> {
  return {
    columns: [
      { name: 'distance', unit: unitFor(units, 'distance') },
      { name: 'time', unit: unitFor(units, 'time') },
      { name: 'groundSpeed', unit: unitFor(units, 'speed') },
      { name: 'trueAirspeed', unit: unitFor(units, 'speed') },
      { name: 'height', unit: unitFor(units, 'altitude') },
    ],
    rows: points.map(({ distance, time, groundSpeed, trueAirspeed, height }) => [
      shown(units, 'distance', distance, 'up', rounding),
      shown(units, 'time', time, 'nearest', rounding),
      shown(units, 'speed', groundSpeed, 'nearest', rounding),
      shown(units, 'speed', trueAirspeed, 'nearest', rounding),
      shown(units, 'altitude', height, 'nearest', rounding),
    ]),
  };
}

/**
 * Sensitivities as an answer shows them.
 *
 * @param wholeDistance - what the answer calls its takeoff or landing distance
 */
export function toSensitivities<const Whole extends string>(
  how: Presentation,
  sensitivities: readonly Sensitivity[],
  wholeDistance: Whole,
) {
  return sensitivities.map(({ of, at, per, change }) => {
    const named = { of, at, per: toMeasure(how, per) };
    if (change === undefined) return named;
    const changes = {
      groundRoll: toChange(how, change.groundRoll),
      airDistance: toChange(how, change.airDistance),
      [wholeDistance]: toChange(how, change.wholeDistance),
    } as Record<'groundRoll' | 'airDistance' | Whole, ReturnType<typeof toChange>>;
    return { ...named, change: changes };
  });
}

/** The change of a distance, to a hundredth: a metre would hide most of them. */
function toChange({ units, rounding }: Presentation, si: number) {
  const value = shown(units, 'distance', si, 'nearest', 'none');
  return { value: rounding === 'none' ? value : roundTo(value, 0.01, 'nearest'), unit: unitFor(units, 'distance') };
}
