import { isPhysicsByName } from '../method.ts';
import { physicsSpread } from '../rules/physics-spread.ts';
import { percentText } from '../sentences/measure-text.ts';
import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** The flight manual and the aeroplane's physics give different distances. */
export const flightManualAndPhysicsDiffer: CautionTest<AnswerContext> = {
  code: 'flight-manual-and-physics-differ',
  severity: 'caution',
  meaning:
    "The flight manual and the aeroplane's physics differ by more than twice what the physics is usually off; a table, a unit or the definition may be wrong. Not where the manual is the longer because the edge of its table stands for what lies beyond.",
  source: 'HouseManual',
  test: (context) => {
    const { found, wholeDistance, phase, question, roll } = context;
    const { other, method, flightManual } = found;
    if (other === undefined || wholeDistance === undefined) return undefined;
    const physics = [method, other.method].includes('fitted') ? 'fitted' : 'stated';
    const threshold = physicsSpread[physics];
    const isRollApart = Math.abs(Math.log(other.rollRatio)) > threshold;
    if (Math.abs(Math.log(other.ratio)) <= threshold && !isRollApart) return undefined;
    const isByPhysics = isPhysicsByName(question);
    const ratio = Math.abs(Math.log(other.ratio)) > threshold ? other.ratio : other.rollRatio;
    const isManualLonger = ratio > 1 === isByPhysics;
    const isHeldAtEdge = (flightManual?.figures.edges.length ?? 0) > 0;
    // the edge of a table is used because it is the longer
    if (isHeldAtEdge && isManualLonger) return undefined;
    const [names, otherName] = isByPhysics ? ['Physics', 'the flight manual'] : ['The flight manual', 'physics'];
    const off = ratio - 1;
    if (ratio === other.rollRatio && roll !== undefined) {
      return {
        message: `${names} gives a ground roll of ${textIn(context, 'distance', roll)}, ${otherName} ${textIn(context, 'distance', roll * ratio)}: ${percentText(Math.abs(off))} ${off < 0 ? 'less' : 'more'}.`,
        at: '/aeroplane',
        value: ratio,
        threshold: Math.exp(threshold),
      };
    }
    return {
      message: `${names} gives a ${phase} distance of ${textIn(context, 'distance', wholeDistance.value)}, ${otherName} ${textIn(context, 'distance', other.distance)}: ${percentText(Math.abs(off))} ${off < 0 ? 'less' : 'more'}.`,
      at: '/aeroplane',
      value: other.ratio,
      threshold: Math.exp(threshold),
    };
  },
};
