import type { RunwayConditionCode } from '../../../physics/runway-condition-code.ts';
import type { Factor } from '../../answer.ts';
import { clearwayShare } from '../clearway-share.ts';
import { isJet, isTurboprop } from '../named-aeroplanes.ts';
import type { Asked, NotApplied, PhaseRules, Requirement, RuleSet, SurfaceRule, TakeoffRules } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

interface Row {
  readonly when: string;
  readonly holds: (asked: Asked) => boolean;
  /** by code; of 5 the one for a smooth runway */
  readonly factors: Readonly<Record<Exclude<RunwayConditionCode, 0>, number>>;
  /** of code 5 on a grooved or porous runway */
  readonly grooved: number;
  readonly status: string;
}

const unassisted = { 6: 1.67, 5: 2.6, 4: 2.8, 3: 3.2, 2: 4, 1: 5.1 } as const;
const isJetAsked = ({ aeroplane }: Asked) => isJet(aeroplane);

/** Landing distance factors: of the landing distance on a paved, dry, level runway without factors; 15 % is inside. */
const rows: readonly Row[] = [
  {
    when: 'turbojet, reverse thrust used',
    holds: (asked) => isJetAsked(asked) && asked.reverse,
    factors: { 6: 1.67, 5: 2.2, 4: 2.3, 3: 2.5, 2: 2.9, 1: 3.4 },
    grooved: 1.92,
    status: 'secondary',
  },
  { when: 'turbojet, no reverse thrust', holds: isJetAsked, factors: unassisted, grooved: 2.3, status: 'secondary' },
  {
    when: 'turboprop',
    holds: ({ aeroplane }) => isTurboprop(aeroplane),
    factors: { 6: 1.67, 5: 2, 4: 2.2, 3: 2.4, 2: 2.7, 1: 2.9 },
    grooved: 1.92,
    status: 'secondary',
  },
  { when: 'piston or electric engine', holds: () => true, factors: unassisted, grooved: 2.3, status: 'memory' },
];

const codes = [6, 5, 4, 3, 2, 1] as const;

const surfaces: readonly SurfaceRule[] = rows.flatMap(({ when, holds, factors, status }) =>
  codes.map((code) => ({
    when: `${when}, runway condition code ${code}`,
    holds: (asked) => asked.conditionCode === code && holds(asked),
    factors: [
      {
        code: 'condition-code',
        value: factors[code],
        because: `runway condition code ${code}${code === 5 ? ', taken as smooth' : ''}, ${when}; a margin of 15 % is inside`,
        source: 'Safo19001',
        status,
      },
    ],
  })),
);

const notApplied: readonly NotApplied[] = rows.map(({ when, grooved }) => ({
  factor: {
    code: 'condition-code',
    value: grooved,
    because: `runway condition code 5, grooved or porous, ${when}`,
    source: 'Safo19001',
    status: 'memory',
  },
  why: 'no question can state that a runway is grooved; it is taken as smooth',
}));

const margin: Factor = {
  code: 'overall',
  value: 1.15,
  because: 'a margin of 15 % on the landing distance on the runway as it is',
  source: 'Safo06012',
  status: 'read',
};

const requirement: Requirement = {
  code: 'landing-distance',
  of: 'landingDistance',
  against: 'lda',
  onRunway: margin,
  source: 'Safo19001',
};

const windCredit = halfAndOneAndAHalf('Cfr25s125');

const landing: PhaseRules = {
  source: 'Safo19001',
  stage: 'in-flight',
  windCredit,
  surfaces,
  readings: [{ when: 'always', holds: () => true, requirements: [requirement] }],
  notApplied,
};

const takeoff: TakeoffRules = {
  source: 'Safo19001',
  windCredit,
  appliesTo: [{ because: 'these factors are for landings', holds: () => false, source: 'Safo19001' }],
  surfaces: [],
  readings: [{ when: 'never', holds: () => true, requirements: [] }],
  clearwayShare,
  nothingBeyond: 'nothing: these factors are for landings',
};

/** Landing distance factors by runway condition code, for the time of arrival, as the United States authority publishes them. */
export const usLandingByConditionCode: RuleSet = {
  id: 'us-landing-by-condition-code',
  title: 'United States, landing distance factors by runway condition code',
  phrase: 'by the factor for the runway condition code',
  source: 'Safo19001',
  operations: ['commercial', 'private'],
  appliesTo: [],
  thinMargin,
  takeoff,
  landing,
};
