import { describe, expect, it } from 'vitest';
import type { Aeroplane } from '../../../src/performance/aeroplane.ts';
import { approachWithOneOut } from '../../../src/planning/engine-failure/approach-with-one-out.ts';
import { isRefused } from '../../../src/planning/fault.ts';
import { planLanding } from '../../../src/planning/plan-landing.ts';
import { prepareLanding } from '../../../src/planning/prepare-landing.ts';
import { plainLanding } from '../../support/landing-question.ts';
import { expectRatio } from '../../support/near.ts';

const g = 9.80665;
const thrusts = [40_000, 40_000];
/** A twin of 10 000 kg whose engines give 40 kN each at every speed, in the standard air of sea level. */
const twin: Aeroplane = {
  ...plainLanding.aeroplane,
  category: 'twin-jet',
  engines: 2,
  certification: { basis: 'cs-25', screenHeight: 10.668 },
  masses: { empty: 6000, maximumTakeoff: 11_000, maximumLanding: 10_500 },
  wing: { area: 40, span: 18, heightAboveGround: 1.5 },
  drag: { zeroLiftCoefficient: 0.02, oswaldFactor: 0.8 },
  configurations: {
    approach: { for: ['takeoff'], flap: 0.25, maximumLift: { kind: 'coefficient', coefficient: 1.8 } },
    landing: { for: ['landing'], flap: 0.6, maximumLift: { kind: 'coefficient', coefficient: 2.3 } },
  },
  propulsion: { kind: 'measured', airspeeds: [0, 200], thrusts, density: 1.225, densityExponent: 1, thrustFactor: 1 },
  engineOut: {
    vmc: 40,
    dragIncrementCoefficient: 0.005,
    approach: { configuration: 'approach', airDragIncrementCoefficient: 0.015 },
  },
};
const question = {
  ...plainLanding,
  aeroplane: twin,
  mass: 10_000,
  configuration: 'landing',
  runway: { ...plainLanding.runway, elevation: 0, declared: { lda: 5000 } },
  weather: { ...plainLanding.weather, temperature: 288.15, pressure: { kind: 'pressureAltitude' as const, value: 0 } },
};
const { dewPoint: _, ...dry } = question.weather;
const asked = { ...question, weather: dry };

function climbed(aeroplane: Aeroplane) {
  const prepared = prepareLanding({ ...asked, aeroplane });
  if (isRefused(prepared)) throw new Error(prepared.refused[0]?.message);
  return approachWithOneOut({ ...asked, aeroplane }, prepared);
}

describe('the climb of an approach with one engine out', () => {
  it('is (T - D)/W of the remaining engine at 1.4 stall speeds of the approach flap, gear up [25.121(d), read; arithmetic by hand]', () => {
    const stall = Math.sqrt((2 * 10_000 * g) / (1.225 * 40 * 1.8));
    const airspeed = 1.4 * stall;
    const q = 0.5 * 1.225 * airspeed ** 2 * 40;
    const lift = (10_000 * g) / q;
    const drag = q * (0.02 + 0.015 + 0.005 + lift ** 2 / (Math.PI * (18 ** 2 / 40) * 0.8));
    const sine = (40_000 - drag) / (10_000 * g);
    const found = climbed(twin);
    if ('why' in found) throw new Error(found.why);
    expectRatio(found.gradient, sine / Math.sqrt(1 - sine ** 2), 1e-6);
    expectRatio(found.rate, airspeed * sine, 1e-6);
  });

  it('is compared by the rules of class A with 2.1 % for two engines [25.121(d), read]', () => {
    const answer = planLanding({ ...asked, ruleSet: 'eu-class-a', stage: 'dispatch' });
    if (isRefused(answer)) throw new Error(answer.refused[0]?.message);
    const check = answer.assessment?.checks.find(({ code }) => code === 'climb-approach-engine-out');
    expect(check).toMatchObject({ required: 0.021, result: 'passes' });
  });

  it('is not computed where the definition names no configuration of the approach', () => {
    const { approach: __, ...without } = twin.engineOut ?? {};
    expect(climbed({ ...twin, engineOut: without })).toEqual({
      why: 'no configuration of the approach with one engine out is known',
    });
  });
});
