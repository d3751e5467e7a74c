import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** The question is asked at a stage for which the rules have no figures of their own. */
export const stageNotKnown: CautionTest<AnswerContext> = {
  code: 'stage-not-known',
  severity: 'caution',
  meaning: 'The rules asked for have no figures for the stage of the question; those of the other stage are used.',
  source: 'Judgement',
  test: (context) => {
    const { question, rules, ruleSet, checks } = context;
    const { stage } = question;
    if (stage === undefined || rules.stage === undefined || stage === rules.stage) return undefined;
    const have =
      rules.stage === 'dispatch'
        ? 'have no figures of their own for in flight. Those for before departure are used'
        : 'have figures for the time of arrival alone, and a rule for before departure may ask for more. They are used';
    const required = checks.find((one) => one.required !== undefined);
    const effect =
      required === undefined
        ? ''
        : `: ${required.code} requires ${textIn(context, 'distance', required.required as number)}`;
    return { message: `The rules asked for (${ruleSet.title}) ${have}${effect}.`, at: '/stage', source: rules.source };
  },
};
