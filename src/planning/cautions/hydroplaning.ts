import { hydroplaningSpeed } from '../../physics/hydroplaning-speed.ts';
import { looseContaminant } from '../../physics/runway-surface.ts';
import { assumedHydroplaningPressure } from '../rules/contaminated-runway.ts';
import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Wheels that leave or meet a wet pavement faster than their tyres hold it. */
export const hydroplaning: CautionTest<AnswerContext> = {
  code: 'hydroplaning',
  severity: 'caution',
  meaning:
    'On wet pavement the wheels leave or meet the runway at a ground speed above that at which the tyres begin to hydroplane.',
  source: 'HorneDreher1963',
  test: (context) => {
    const { phase, question, wheelSpeed, wind } = context;
    const { surface } = question.runway;
    const loose = looseContaminant(surface);
    const isUnderWater =
      surface.state === 'wet' || surface.state === 'flooded' || (loose !== undefined && loose !== 'dry-snow');
    if (surface.kind !== 'paved' || !isUnderWater) return undefined;
    const pressure = question.aeroplane.wheels?.tyrePressure;
    const onset = hydroplaningSpeed(pressure ?? assumedHydroplaningPressure, phase);
    const speed = wheelSpeed.tas - wind.headwind;
    if (speed <= onset) return undefined;
    const tyres = pressure === undefined ? 'tyres of 30 psi, since no tyre pressure is stated,' : 'the tyres';
    return {
      message: `The ${phase === 'takeoff' ? 'lift-off' : 'touchdown'} ground speed of ${textIn(context, 'speed', speed)} is above ${textIn(context, 'speed', onset)}, at which ${tyres} begin to hydroplane: brakes and nose wheel may not hold.`,
      at: '/runway/surface',
      value: { kind: 'speed', value: speed },
      threshold: { kind: 'speed', value: onset },
      source: phase === 'takeoff' ? 'HorneDreher1963' : 'HorneSpinUp',
    };
  },
};
