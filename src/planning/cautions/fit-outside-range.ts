import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

const axes = [
  { axis: 'mass', kind: 'mass', names: 'masses', at: '/mass' },
  { axis: 'pressureAltitude', kind: 'altitude', names: 'pressure altitudes', at: '/weather/pressure' },
  { axis: 'temperature', kind: 'temperature', names: 'temperatures', at: '/weather/temperature' },
] as const;

/** Fitted physics beyond the conditions it was fitted to. */
export const fitOutsideRange: CautionTest<AnswerContext> = {
  code: 'fit-outside-range',
  severity: 'caution',
  meaning: 'The physics of the answer was fitted to conditions that do not reach what is asked.',
  source: 'HouseFit',
  test: (context) => {
    const { question, phase, air, wholeDistance } = context;
    const fit = question.aeroplane.fit?.[phase]?.[question.configuration];
    if (fit === undefined || wholeDistance?.method !== 'fitted') return undefined;
    const given = { mass: question.mass, pressureAltitude: air.pressureAltitude, temperature: air.temperature };
    for (const { axis, kind, names, at } of axes) {
      const [low, high] = fit.hull[axis];
      const value = given[axis];
      if (value >= low - 1e-6 * Math.abs(low) && value <= high + 1e-6 * Math.abs(high)) continue;
      const bound = value < low ? low : high;
      return {
        message: `The physics was fitted to ${names} from ${textIn(context, kind, low)} to ${textIn(context, kind, high)}, and ${textIn(context, kind, value)} is asked: the ${phase} distance of ${textIn(context, 'distance', wholeDistance.value)} is beyond what it was fitted to.`,
        at,
        value: { kind, value },
        threshold: { kind, value: bound },
      };
    }
    return undefined;
  },
};
