import type { Question } from '../question.ts';
import { takeoffSpeedRule } from '../rules/certification/takeoff-speed-rule.ts';
import type { RaisedSpeed } from '../takeoff-speeds.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** What this caution looks at. */
export interface RaisedSpeedsContext {
  readonly question: Pick<Question, 'aeroplane' | 'units'>;
  readonly raised: readonly RaisedSpeed[];
}

const names = { rotation: 'rotation speed', screen: 'speed at the screen' } as const;

/** A stated rotation speed or speed at the screen below the least of the certification basis. */
export const takeoffSpeedsRaised: CautionTest<RaisedSpeedsContext> = {
  code: 'takeoff-speeds-raised',
  severity: 'caution',
  meaning:
    'With more than one engine, the rotation speed or the speed at the screen of the schedule is below the least of the certification basis; the takeoff is computed with that. Below the minimum control speed only, at a low mass, it is a note.',
  source: 'Cfr23s51',
  test: (context) => {
    const { raised, question } = context;
    const [first] = raised;
    const rule = takeoffSpeedRule(question.aeroplane);
    if (first === undefined || rule === undefined) return undefined;
    const { basis } = question.aeroplane.certification;
    const speed = (si: number) => textIn(context, 'speed', si);
    const each = raised.map(
      ({ of, from, to }) =>
        `The ${names[of]} of the schedule is ${speed(from.cas)} calibrated at this mass; ${basis} asks for at least ${rule[of].phrase}. ${speed(to.cas)} is taken instead.`,
    );
    return {
      severity: raised.every(({ by }) => by === 'control') ? 'note' : 'caution',
      message: each.join(' '),
      at: '/configuration',
      value: { kind: 'speed', value: first.from.cas },
      threshold: { kind: 'speed', value: first.to.cas },
      source: rule.source,
    };
  },
};
