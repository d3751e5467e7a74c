import type { Factor } from '../../answer.ts';
import { clearwayShare } from '../clearway-share.ts';
import { dryPavement } from '../named-surfaces.ts';
import type { Reading, Requirement, SlopeRule, TakeoffRules } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

const slope: SlopeRule = {
  unfavourable: 'uphill',
  factor: {
    code: 'slope',
    value: 1.05,
    because: '5 % of the takeoff distance for each 1 % of upward slope, as for class B',
    source: 'EuAirOps400',
    status: 'memory',
  },
  step: 0.01,
  growth: 'linear',
};

/** Overall factors for two, three and four engines. */
const byEngines = [1.33, 1.25, 1.18] as const;
const numbers = ['two', 'three', 'four'];

function requirement(value: number, number: string | undefined): Requirement {
  const factor: Factor = {
    code: 'overall',
    value,
    because: `takeoff distance to 50 ft with all engines, ${number} engines, against TORA, (b)`,
    source: 'EuAirOps400',
    status: 'read',
  };
  return {
    code: 'takeoff-run',
    of: 'takeoffDistance',
    against: 'tora',
    factor,
    presumesDryOrWet: true,
    source: 'EuAirOps400',
  };
}

const readings: readonly Reading[] = byEngines.flatMap((value, index) => {
  const one = requirement(value, numbers[index]);
  const hasEngines = (engines: number) => engines === index + 2;
  return [
    {
      when: `${numbers[index]} engines, dry pavement`,
      holds: (asked) => hasEngines(asked.aeroplane.engines) && dryPavement(asked),
      requirements: [one],
    },
    {
      when: `${numbers[index]} engines, any other surface`,
      holds: ({ aeroplane }) => hasEngines(aeroplane.engines),
      requirements: [{ ...one, notAssessed: 'class C has no factor for this surface here' }],
    },
  ];
});

/** CAT.POL.A.400(b): takeoff of class C aeroplanes whose flight manual has no data for an engine failure. */
export const euClassCTakeoff: TakeoffRules = {
  source: 'EuAirOps400',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('EuAirOps400', ', (d)(5)'),
  appliesTo: [
    {
      because: 'class C has takeoff factors for two, three and four engines',
      holds: ({ engines }) => engines >= 2 && engines <= 4,
      source: 'EuAirOps400',
    },
  ],
  surfaces: [{ when: 'dry pavement', holds: dryPavement, factors: [] }],
  slope,
  readings,
  clearwayShare,
  nothingBeyond: 'it changes nothing: TORA alone is compared',
};
