import type { FindingTest, Raised } from './finding-test.ts';

/** Drag coefficients at zero lift and Oswald factors of whole aeroplanes. @see references.Raymer, ch. 12 */
const usual = {
  zeroLift: { jet: [0.012, 0.035], other: [0.018, 0.06] },
  oswald: [0.6, 0.92],
} as const;

/** A drag polar that few aeroplanes have. */
export const dragUnusual: FindingTest = {
  code: 'drag-unusual',
  severity: 'caution',
  meaning:
    'The zero-lift drag coefficient is outside 0.018 to 0.060 (jets 0.012 to 0.035), or the Oswald factor outside 0.60 to 0.92.',
  source: 'Raymer',
  test: ({ aeroplane: { drag, category } }) => {
    const found: Raised[] = [];
    const [low, high] = usual.zeroLift[category.endsWith('jet') ? 'jet' : 'other'];
    const { zeroLiftCoefficient, oswaldFactor } = drag;
    if (zeroLiftCoefficient < low || zeroLiftCoefficient > high) {
      found.push({
        message: `The drag coefficient at zero lift is ${zeroLiftCoefficient}; usual is ${low} to ${high}.`,
        at: '/drag/zeroLiftCoefficient',
        value: zeroLiftCoefficient,
        threshold: zeroLiftCoefficient < low ? low : high,
        hint: 'It is of the whole aeroplane, without flap, the gear included if it is fixed.',
      });
    }
    const [least, most] = usual.oswald;
    if (oswaldFactor < least || oswaldFactor > most) {
      found.push({
        message: `The Oswald factor is ${oswaldFactor}; usual is ${least} to ${most}.`,
        at: '/drag/oswaldFactor',
        value: oswaldFactor,
        threshold: oswaldFactor < least ? least : most,
      });
    }
    return found;
  },
};
