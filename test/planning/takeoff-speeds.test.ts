import { describe, expect, it } from 'vitest';
import type { CertificationBasis } from '../../src/performance/aeroplane.ts';
import { references } from '../../src/references.ts';
import { answered, changed, plainQuestion } from '../support/takeoff-question.ts';

const kt = 1852 / 3600;

/** At sea level on a standard day calibrated, equivalent and true airspeed are one within 0.02 %. */
const atSeaLevel = changed(plainQuestion, { runway: { elevation: 0 } });
const stall = answered(atSeaLevel).speeds.stall.eas;

function twin(basis: CertificationBasis, rotation: number, screen: number, vmc?: number) {
  return answered(
    changed(atSeaLevel, {
      aeroplane: {
        engines: 2,
        certification: { basis, screenHeight: 15.24 },
        ...(vmc === undefined ? {} : { engineOut: { vmc } }),
      },
      configuration: {
        speeds: {
          rotation: { kind: 'stall-ratio', ratio: rotation },
          liftOff: { kind: 'stall-ratio', ratio: rotation + 0.03 },
          screen: { kind: 'stall-ratio', ratio: screen },
        },
      },
    }),
  ).speeds;
}

/** Stall ratios of rotation, lift-off and screen by hand: the greater of the schedule, the stall and 1.05 or 1.10 VMC over it. */
const cases = [
  { basis: 'cs-23-amendment-4', given: [1.05, 1.15], vmc: undefined, expected: [1.1, 1.13, 1.2], source: 'Cfr23s51' },
  { basis: 'cs-23-amendment-4', given: [1.12, 1.25], vmc: 1.2, expected: [1.26, 1.29, 1.32], source: 'Cfr23s51' },
  { basis: 'cs-23-commuter', given: [1.12, 1.25], vmc: 1, expected: [1.12, 1.15, 1.25], source: 'Cfr23s51' },
  { basis: 'cs-25', given: [1.05, 1.1], vmc: undefined, expected: [1.05, 1.08, 1.13], source: 'Cfr25s107' },
  { basis: 'cs-25', given: [1.05, 1.16], vmc: 1.08, expected: [1.134, 1.164, 1.188], source: 'Cfr25s107' },
  { basis: 'none', given: [1.05, 1.1], vmc: 1.2, expected: [1.05, 1.08, 1.1], source: 'Judgement' },
] as const;

describe('the least takeoff speeds of a certification basis', () => {
  it.each(cases)('$basis, VMC $vmc of the stall speed: $given become $expected ($source, 1e-3)', (one) => {
    const [rotation, screen] = one.given;
    const found = twin(one.basis, rotation, screen, one.vmc === undefined ? undefined : one.vmc * stall);
    const ratios = [found.rotation, found.liftOff, found.screen].map(({ stallRatio }) => stallRatio);
    for (const [i, ratio] of ratios.entries()) expect(ratio).toBeCloseTo(one.expected[i] as number, 3);
    expect(references[one.source].title).toBeDefined();
  });
  it('is no slower at the screen than at a lift-off that was raised', () => {
    const speeds = twin('none', 1.05, 1.2, 60 * kt);
    expect(speeds.screen.stallRatio).toBeCloseTo(1.2, 9);
    const raised = twin('cs-25', 1.3, 1.33, 1.4 * stall);
    expect(raised.liftOff.stallRatio).toBeCloseTo(1.05 * 1.4 + 0.03, 3);
    expect(raised.screen.stallRatio).toBeCloseTo(1.1 * 1.4, 3);
  });
  it('leaves a single alone', () => {
    const single = answered(
      changed(atSeaLevel, {
        configuration: {
          speeds: {
            rotation: { kind: 'stall-ratio', ratio: 1.02 },
            liftOff: { kind: 'stall-ratio', ratio: 1.05 },
            screen: { kind: 'stall-ratio', ratio: 1.15 },
          },
        },
      }),
    ).speeds;
    expect(single.rotation.stallRatio).toBeCloseTo(1.02, 9);
    expect(single.screen.stallRatio).toBeCloseTo(1.15, 9);
  });
});
