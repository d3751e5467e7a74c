import { arithmeticSlack } from '../arithmetic-slack.ts';
import { countingDistances } from '../declared-distances.ts';
import { type AnswerContext, measureDown } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A named point from which as much is declared as from the beginning of the runway. */
export const pointAtFullLength: CautionTest<AnswerContext> = {
  code: 'point-at-full-length',
  severity: 'caution',
  meaning: 'As much is declared from the named point as for the whole runway; one of the two may be the wrong figure.',
  source: 'Judgement',
  test: (context) => {
    const { runway } = context.question;
    const { start, declared = {}, onFile } = runway;
    if (start.kind !== 'point' || onFile?.full === undefined) return undefined;
    const { full } = onFile;
    const name = countingDistances[context.phase].find((one) => {
      const [length, whole] = [declared[one], full[one]];
      return length !== undefined && whole !== undefined && length >= whole - arithmeticSlack;
    });
    const length = name && declared[name];
    if (name === undefined || length === undefined) return undefined;
    return {
      message: `${name.toUpperCase()} from ${start.name} is ${measureDown(context, length)}, no less than for the whole of runway ${runway.designator}. A point along a runway leaves less of it, unless it lies at its very beginning.`,
      at: `/runway/declared/${name}`,
      value: { kind: 'distance', value: length, direction: 'down' },
    };
  },
};
