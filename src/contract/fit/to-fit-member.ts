import type { LandingFit, TakeoffFit } from '../../performance/fit/fit.ts';
import { perhaps, present } from '../present.ts';
import type { FitOnWire, LandingFitOnWire, TakeoffFitOnWire } from './fit-member.ts';

const degree = Math.PI / 180;

/** A fit of one configuration as a member that a definition may have, whatever the units of the answer: rounded to what it is worth. */
export function toFitMember(
  phase: 'takeoff' | 'landing',
  configuration: string,
  fit: TakeoffFit | LandingFit,
): FitOnWire {
  return phase === 'takeoff'
    ? { takeoff: { [configuration]: toTakeoff(fit as TakeoffFit) } }
    : { landing: { [configuration]: toLanding(fit as LandingFit) } };
}

function toTakeoff(fit: TakeoffFit): TakeoffFitOnWire {
  const { values, standardDeviations: sd, dryAir } = fit;
  return present<TakeoffFitOnWire>({
    fittedTo: fit.fittedTo,
    modelVersion: fit.modelVersion,
    thrustFactor: rounded(values.thrustFactor ?? 1),
    airDragShiftCoefficient: rounded(values.airDragShift ?? 0),
    altitudeLapseCoefficient: perhaps(rounded, values.altitudeLapseCoefficient),
    temperatureExponent: perhaps(rounded, values.temperatureExponent),
    dryAir: dryAir === true ? true : undefined,
    standardDeviations: present<TakeoffFitOnWire['standardDeviations']>({
      thrustFactor: perhaps(rounded, sd.thrustFactor),
      airDragShiftCoefficient: perhaps(rounded, sd.airDragShift),
      altitudeLapseCoefficient: perhaps(rounded, sd.altitudeLapseCoefficient),
      temperatureExponent: perhaps(rounded, sd.temperatureExponent),
    }),
    ...found(fit),
  });
}

function toLanding(fit: LandingFit): LandingFitOnWire {
  const { values, standardDeviations: sd } = fit;
  const angle = (radians: number) => ({ value: rounded(radians / degree), unit: 'deg' as const });
  return present<LandingFitOnWire>({
    fittedTo: fit.fittedTo,
    modelVersion: fit.modelVersion,
    brakingFrictionCoefficient: rounded(values.brakingFrictionCoefficient ?? 0),
    approachAngle: angle(values.approachAngle ?? 0),
    standardDeviations: present<LandingFitOnWire['standardDeviations']>({
      brakingFrictionCoefficient: perhaps(rounded, sd.brakingFrictionCoefficient),
      approachAngle: perhaps(angle, sd.approachAngle),
    }),
    ...found(fit),
  });
}

function found({ correlation, rms, greatest, hull }: TakeoffFit | LandingFit) {
  const range = <const Unit extends string>([from, to]: readonly [number, number], unit: Unit, shift = 0) => ({
    from: { value: rounded(from - shift), unit },
    to: { value: rounded(to - shift), unit },
  });
  return {
    correlation: correlation.map((row) => row.map(rounded)),
    errors: { rmsPercent: rounded(100 * rms), greatestPercent: rounded(100 * greatest) },
    conditions: {
      mass: range(hull.mass, 'kg'),
      pressureAltitude: range(hull.pressureAltitude, 'm'),
      temperature: range(hull.temperature, 'degC', 273.15),
    },
  };
}

/** To the sixth decimal: far below any standard deviation, and the same in every run. */
function rounded(value: number): number {
  return Math.round(value * 1e6) / 1e6 + 0;
}
