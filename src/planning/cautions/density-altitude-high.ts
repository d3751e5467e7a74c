import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Density altitude that is high in itself [m]: 5 000 ft. */
const high = 5000 * 0.3048;
/** Density altitude above the runway that is worth knowing [m]: 2 000 ft. */
const aboveRunway = 2000 * 0.3048;

/** Thin air: a caution above 5 000 ft, a note where the runway alone does not tell it. */
export const densityAltitudeHigh: CautionTest<AnswerContext> = {
  code: 'density-altitude-high',
  severity: 'caution',
  meaning: 'The density altitude is above 5 000 ft (a caution), or more than 2 000 ft above the runway (a note).',
  threshold: { kind: 'altitude', value: high },
  source: 'Judgement',
  test: (context) => {
    const { air, question, phase, wheelSpeed } = context;
    const above = air.densityAltitude - question.runway.elevation;
    const isHigh = air.densityAltitude > high;
    if (!isHigh && above <= aboveRunway) return undefined;
    const over =
      above > 0 ? `${textIn(context, 'altitude', above)} above` : `${textIn(context, 'altitude', -above)} below`;
    return {
      severity: isHigh ? 'caution' : 'note',
      message: `Density altitude ${textIn(context, 'altitude', air.densityAltitude)}, ${over} the elevation of runway ${question.runway.designator}. The ${phase === 'takeoff' ? 'lift-off' : 'touchdown'} speed of ${textIn(context, 'speed', wheelSpeed.cas)} calibrated is ${textIn(context, 'speed', wheelSpeed.tas)} true.`,
      at: '/weather/temperature',
      value: { kind: 'altitude', value: air.densityAltitude },
      threshold: { kind: 'altitude', value: isHigh ? high : question.runway.elevation + aboveRunway },
    };
  },
};
