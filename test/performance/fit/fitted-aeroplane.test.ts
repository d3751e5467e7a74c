import { describe, expect, it } from 'vitest';
import { completed } from '../../../src/numerics/work.ts';
import type { Aeroplane } from '../../../src/performance/aeroplane.ts';
import { fitTakeoff } from '../../../src/performance/fit/fit-takeoff.ts';
import { fittedForLanding, fittedForTakeoff } from '../../../src/performance/fit/fitted-aeroplane.ts';
import { toFit } from '../../../src/performance/fit/to-fit.ts';
import { madeTables } from '../../published/made-tables.ts';
import { takeoffAsked } from '../../support/fit-asked.ts';

const made = madeTables.tables[0];
if (made === undefined) throw new Error('no table');
const asked = takeoffAsked(made);
const result = completed(fitTakeoff(asked));
if (result.outcome !== 'fitted') throw new Error('not fitted');
const fit = toFit(result, 'sha-256:0', '1.0.0');
const hull = fit.hull;
const landing = {
  ...fit,
  values: { brakingFrictionCoefficient: 0.33, approachAngle: 0.06 },
  standardDeviations: {},
  correlation: [],
  hull,
};
const aeroplane: Aeroplane = {
  id: 'invented',
  revision: '1',
  name: 'Invented',
  ...asked.aeroplane,
  configurations: {
    short: { for: ['takeoff'], airDragIncrementCoefficient: 0.01, ...asked.configuration },
    other: { for: ['takeoff'], ...asked.configuration },
    full: { for: ['landing'], ...asked.configuration, floatDecelerationRatio: 0.12 },
  },
  brakes: { brakingFrictionCoefficient: 0.4, loadFactor: 0.85, antiSkid: 'none' },
  fit: { takeoff: { short: fit }, landing: { full: landing } },
};

describe('a fit kept with the aeroplane', () => {
  it('holds values, standard deviations and their correlation, and the range it was fitted to', () => {
    expect(fit.values).toEqual(Object.fromEntries(result.parameters.map(({ name, value }) => [name, value])));
    expect(Object.keys(fit.standardDeviations)).toHaveLength(4);
    expect(fit.correlation.map((row, j) => row[j])).toEqual([1, 1, 1, 1]);
    expect(hull.pressureAltitude[1]).toBeCloseTo(1828.8, 6);
  });

  it('makes the aeroplane of its configuration: thrust, lapses, drag, pull-up, no loss by moisture', () => {
    const fitted = fittedForTakeoff(aeroplane, 'short');
    expect(fitted?.propulsion).toMatchObject({
      thrustFactor: fit.values.thrustFactor,
      altitudeLapseCoefficient: fit.values.altitudeLapseCoefficient,
      temperatureExponent: fit.values.temperatureExponent,
      humidityFactor: 0,
    });
    expect(fitted?.configurations.short).toMatchObject({ pullUpLoadFactor: 1.15 });
    expect(fitted?.configurations.short?.airDragIncrementCoefficient).toBeCloseTo(
      0.01 + (fit.values.airDragShift ?? 0),
      12,
    );
    expect(fitted?.configurations.other).toBe(aeroplane.configurations.other);
  });

  it('lets moisture take its power where the tables state dry air', () => {
    const dry = { ...aeroplane, fit: { takeoff: { short: { ...fit, dryAir: true } } } };
    expect(fittedForTakeoff(dry, 'short')?.propulsion).toMatchObject({ humidityFactor: 1.5 });
  });

  it('makes the aeroplane of its landing: braking on the whole weight, the angle, the arc alone', () => {
    const fitted = fittedForLanding(aeroplane, 'full');
    expect(fitted?.brakes).toEqual({ brakingFrictionCoefficient: 0.33, loadFactor: 1, antiSkid: 'none' });
    expect(fitted?.configurations.full).toMatchObject({ approachAngle: 0.06, flareFitted: true });
    expect(fitted?.propulsion).toBe(aeroplane.propulsion);
  });

  it('is nothing where the configuration has no fit', () => {
    expect(fittedForTakeoff(aeroplane, 'other')).toBeUndefined();
    expect(fittedForLanding(aeroplane, 'short')).toBeUndefined();
  });
});
