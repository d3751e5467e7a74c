import type { Fit, FitOf, LandingFit, TakeoffFit } from '../../performance/fit/fit.ts';
import { perhaps, present } from '../present.ts';
import { si } from '../quantity.ts';
import type { FitOnWire, LandingFitOnWire, TakeoffFitOnWire } from './fit-member.ts';

const degree = Math.PI / 180;

/** The fits of a definition in SI. */
export function toFit({ takeoff, landing }: FitOnWire): Fit {
  return present<Fit>({
    takeoff: perhaps((fits) => mapped(fits, toTakeoffFit), takeoff),
    landing: perhaps((fits) => mapped(fits, toLandingFit), landing),
  });
}

function mapped<Wire, Made>(fits: Readonly<Record<string, Wire>>, make: (fit: Wire) => Made): Record<string, Made> {
  return Object.fromEntries(Object.entries(fits).map(([id, fit]) => [id, make(fit)]));
}

function toTakeoffFit(given: TakeoffFitOnWire): TakeoffFit {
  const { thrustFactor, airDragShiftCoefficient, altitudeLapseCoefficient, temperatureExponent, dryAir } = given;
  const sd = given.standardDeviations;
  return {
    ...common(given),
    values: present<TakeoffFit['values']>({
      thrustFactor,
      airDragShift: airDragShiftCoefficient,
      altitudeLapseCoefficient,
      temperatureExponent,
    }),
    standardDeviations: present<TakeoffFit['standardDeviations']>({
      thrustFactor: sd.thrustFactor,
      airDragShift: sd.airDragShiftCoefficient,
      altitudeLapseCoefficient: sd.altitudeLapseCoefficient,
      temperatureExponent: sd.temperatureExponent,
    }),
    ...(dryAir === undefined ? {} : { dryAir }),
  };
}

function toLandingFit(given: LandingFitOnWire): LandingFit {
  const { brakingFrictionCoefficient, approachAngle, standardDeviations: sd } = given;
  return {
    ...common(given),
    values: { brakingFrictionCoefficient, approachAngle: si('angle', approachAngle) },
    standardDeviations: present<LandingFit['standardDeviations']>({
      brakingFrictionCoefficient: sd.brakingFrictionCoefficient,
      approachAngle: perhaps(({ value }) => value * degree, sd.approachAngle),
    }),
  };
}

function common({
  fittedTo,
  modelVersion,
  correlation,
  errors,
  conditions,
}: TakeoffFitOnWire | LandingFitOnWire): Omit<FitOf<never>, 'values' | 'standardDeviations'> {
  const { mass, pressureAltitude, temperature } = conditions;
  return {
    fittedTo,
    modelVersion,
    correlation,
    rms: errors.rmsPercent / 100,
    greatest: errors.greatestPercent / 100,
    hull: {
      mass: [si('mass', mass.from), si('mass', mass.to)],
      pressureAltitude: [si('length', pressureAltitude.from), si('length', pressureAltitude.to)],
      temperature: [si('temperature', temperature.from), si('temperature', temperature.to)],
    },
  };
}
