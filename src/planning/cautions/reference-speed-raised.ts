import type { LandingSpeeds } from '../landing-speeds.ts';
import type { Question } from '../question.ts';
import { referenceSpeedRules } from '../rules/certification/reference-speed.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** What this caution looks at. */
export interface ReferenceSpeedContext extends Pick<LandingSpeeds, 'reference' | 'raised'> {
  readonly question: Pick<Question, 'aeroplane' | 'units'>;
}

/** A stated landing reference speed below the least of the certification basis. */
export const referenceSpeedRaised: CautionTest<ReferenceSpeedContext> = {
  code: 'reference-speed-raised',
  severity: 'caution',
  meaning:
    'The stated landing reference speed is below the least of the certification basis; the distances are computed with that. Below the minimum control speed only, at a low mass, it is a note.',
  source: 'Cfr23s73',
  test: (context) => {
    const { raised, reference, question } = context;
    if (raised === undefined) return undefined;
    const { basis } = question.aeroplane.certification;
    const { phrase, source } = referenceSpeedRules[basis];
    return {
      severity: raised.by === 'control' ? 'note' : 'caution',
      message: `The stated landing reference speed is ${textIn(context, 'speed', raised.from.cas)} calibrated at this mass; ${basis} asks for at least ${phrase}. ${textIn(context, 'speed', reference.cas)} is taken instead.`,
      at: '/configuration',
      value: { kind: 'speed', value: raised.from.cas },
      threshold: { kind: 'speed', value: reference.cas },
      source,
    };
  },
};
