import { describe, expect, it } from 'vitest';
import type { Aeroplane, CertificationBasis, MaximumLift, ScheduledSpeed } from '../../src/performance/aeroplane.ts';
import { referenceSpeedRules } from '../../src/planning/rules/certification/reference-speed.ts';
import { figures } from '../published/figures.ts';
import { type LandingChanges, landed, plainLanding } from '../support/landing-question.ts';
import { expectNear, expectRatio } from '../support/near.ts';
import { changed } from '../support/takeoff-question.ts';

const kt = 1852 / 3600;
const ratios = [
  ...figures({ source: '14 CFR 23.73', section: '(a)', status: 'read', quantity: 'VREF over VS0', unit: '1' }, [
    { id: 'vref-cs-23-amendment-4', inputs: { basis: 'cs-23-amendment-4' as const }, expected: 1.3, tolerance: 0 },
    { id: 'vref-cs-23-commuter', inputs: { basis: 'cs-23-commuter' as const }, expected: 1.3, tolerance: 0 },
  ]),
  ...figures({ source: 'CS 25.125', section: '(b)(2)', status: 'read', quantity: 'VREF over VSR0', unit: '1' }, [
    { id: 'vref-cs-25', inputs: { basis: 'cs-25' as const }, expected: 1.23, tolerance: 0 },
  ]),
];
const controls = figures(
  { source: '14 CFR 23.73', section: '(a), (b)', status: 'read', quantity: 'VREF over VMC at the least', unit: '1' },
  [
    { id: 'vref-vmc', inputs: { basis: 'cs-23-amendment-4' as const }, expected: 1, tolerance: 0 },
    { id: 'vref-vmc-commuter', inputs: { basis: 'cs-23-commuter' as const }, expected: 1.05, tolerance: 0 },
  ],
);

interface Asked {
  readonly basis?: CertificationBasis;
  readonly reference?: ScheduledSpeed;
  readonly lift?: MaximumLift;
  readonly vmc?: number;
}

function asked({ basis = 'cs-23-amendment-4', reference, lift, vmc }: Asked): LandingChanges {
  const touchdown: ScheduledSpeed = { kind: 'stall-ratio', ratio: 1.05 };
  const aeroplane: Partial<Aeroplane> = {
    certification: { basis, screenHeight: 15.24 },
    ...(vmc === undefined ? {} : { engineOut: { vmc } }),
  };
  return {
    aeroplane: {
      ...aeroplane,
      configurations: {
        landing: {
          ...plainLanding.aeroplane.configurations['landing'],
          for: ['landing'],
          flap: 0.6,
          maximumLift: lift ?? { kind: 'coefficient', coefficient: 2 },
          speeds: reference === undefined ? { touchdown } : { landingReference: reference, touchdown },
        },
      },
    },
  };
}
const speeds = (given: Asked) => landed(changed(plainLanding, asked(given))).speeds;
const codes = (given: Asked) => landed(changed(plainLanding, asked(given))).cautions.map(({ code }) => code);

describe('the landing reference speed', () => {
  it.each(ratios)('$title', ({ inputs, expected }) => {
    expectRatio(speeds({ basis: inputs.basis }).landingReference.stallRatio, expected, 1e-12);
  });
  it.each(controls)('$title', ({ inputs, expected }) => {
    const vmc = 70 * kt;
    expectRatio(speeds({ basis: inputs.basis, vmc }).landingReference.cas, expected * vmc, 1e-9);
    const low = speeds({ basis: inputs.basis, vmc: 40 * kt }).landingReference;
    expectRatio(low.stallRatio, 1.3, 1e-12);
  });
  it('is of the older minimum speed, 0.94 of the 1-g one, where the definition states that [memory]', () => {
    const lift = { kind: 'stall-speed', cas: 45 * kt, mass: 1010, definition: 'minimum' } as const;
    expectRatio(speeds({ lift }).landingReference.eas, 1.3 * 45 * kt, 1e-9);
    expectRatio(speeds({ lift, basis: 'cs-25' }).landingReference.eas, (1.23 * 45 * kt) / 0.94, 1e-9);
  });
  it('does not look at VMC on the basis of CS-25, whose VMCL is another speed', () => {
    expectRatio(speeds({ basis: 'cs-25', vmc: 70 * kt }).landingReference.stallRatio, 1.23, 1e-12);
  });
  it('stands as stated above the least, and is raised to it below, which is said', () => {
    const at = (ratio: number) => ({ reference: { kind: 'stall-ratio', ratio } }) as const;
    expectRatio(speeds(at(1.4)).landingReference.stallRatio, 1.4, 1e-12);
    expect(codes(at(1.4))).not.toContain('reference-speed-raised');
    expectRatio(speeds(at(1.2)).landingReference.stallRatio, 1.3, 1e-12);
    expect(codes(at(1.2))).toContain('reference-speed-raised');
  });
  it('stands as stated where there is no certification basis', () => {
    const short = { basis: 'none', reference: { kind: 'stall-ratio', ratio: 1.15 } } as const;
    expectRatio(speeds(short).landingReference.stallRatio, 1.15, 1e-12);
    expect(codes(short)).not.toContain('reference-speed-raised');
    expect(referenceSpeedRules.none.binds).toBe(false);
  });
  it('of a calibrated speed goes with the square root of mass', () => {
    const reference = { kind: 'cas', cas: 80 * kt, mass: 1010 } as const;
    const light = landed(changed(plainLanding, { ...asked({ reference }), question: { mass: 810 } }));
    expectRatio(light.speeds.landingReference.cas, 80 * kt * Math.sqrt(810 / 1010), 1e-9);
  });
  it('takes an increment on top in calibrated airspeed, and touches down where it did', () => {
    const faster = landed(changed(plainLanding, { question: { procedure: { approachSpeedIncrement: 6 * kt } } }));
    const { landingReference, touchdown } = landed(plainLanding).speeds;
    expectNear(faster.speeds.landingReference.cas - landingReference.cas, 6 * kt, 1e-9);
    expect(faster.speeds.touchdown).toEqual(touchdown);
  });
});
