import type { FindingTest } from './finding-test.ts';
import { textIn } from './review-context.ts';

/** @see references.Raymer, ch. 4 */
const usual = { lowest: 4.5, highest: 15 };

/** A span that goes with few wings of this area. */
export const aspectRatioUnusual: FindingTest = {
  code: 'aspect-ratio-unusual',
  severity: 'note',
  meaning: 'The square of the span over the wing area is outside 4.5 to 15.',
  source: 'Raymer',
  test: (context) => {
    const { span, area } = context.aeroplane.wing;
    const ratio = span ** 2 / area;
    if (ratio >= usual.lowest && ratio <= usual.highest) return [];
    return [
      {
        message: `A span of ${textIn(context, 'distance', span)} on ${textIn(context, 'area', area)} is an aspect ratio of ${ratio.toFixed(1)}; usual is ${usual.lowest} to ${usual.highest}.`,
        at: '/wing/span',
        value: ratio,
        threshold: ratio < usual.lowest ? usual.lowest : usual.highest,
        hint: 'Check the units of span and area.',
      },
    ];
  },
};
