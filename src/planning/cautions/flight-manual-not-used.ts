import { manualBoundText } from '../manual/manual-bound-text.ts';
import { isPhysicsByName } from '../method.ts';
import { measureText } from '../sentences/measure-text.ts';
import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Physics was asked for though the flight manual has a table. */
export const flightManualNotUsed: CautionTest<AnswerContext> = {
  code: 'flight-manual-not-used',
  severity: 'strong',
  meaning:
    'Physics was asked for by name although the flight manual has a table for this configuration; strong where the table does not reach what is asked.',
  source: 'HouseManual',
  test: ({ found: { outside, flightManual, noSheet, unscaled, method, other }, question, surface, wholeDistance }) => {
    if (noSheet && wholeDistance !== undefined) {
      return {
        message: `Every distance here is physics on ${method} figures: the flight manual has 0 tables for ${surface}, and none for dry pavement to carry from.`,
        at: '/runway/surface',
      };
    }
    if (unscaled && wholeDistance !== undefined && !isPhysicsByName(question)) {
      return {
        message: `Every distance here, ${measureText(question.units, 'distance', wholeDistance.value, 'up')} in all, is physics on ${method} figures: the aeroplane on file cannot be asked the same, so that no ratio carries its manual's figures to the changed one.`,
        at: '/aeroplane/changes',
      };
    }
    if (wholeDistance === undefined || !isPhysicsByName(question)) return undefined;
    if (outside !== undefined) {
      const each = outside.bounds.map((bound) => manualBoundText(bound, question.units));
      return {
        message: `Every distance here is physics on ${method} figures, as asked. The flight manual has none: ${each.join('; ')}.`,
        at: '/method',
      };
    }
    if (flightManual === undefined || other === undefined) return undefined;
    return {
      severity: 'caution',
      message: `Every distance here is physics on ${method} figures, as asked. The flight manual has its own, ${measureText(question.units, 'distance', other.distance, 'up')} for ${measureText(question.units, 'distance', wholeDistance.value, 'up')}, and goes before it.`,
      at: '/method',
    };
  },
};
