import { surfaceText } from '../sentences/surface-text.ts';
import type { ConditionsContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** The report tells of the state of runways, which the question states itself. */
export const reportRunwayState: CautionTest<ConditionsContext> = {
  code: 'report-runway-state',
  severity: 'caution',
  meaning: 'The report tells of the state of runways; the surface of the question is taken, not that of the report.',
  source: 'Wmo306',
  test: ({ question: { report, runway } }) => {
    if (report?.runwayState === undefined) return undefined;
    return {
      message: `The report of ${report.station} tells of the runways: ${report.runwayState}. The surface of the question is taken: ${runway.surface.kind}, ${surfaceText(runway.surface.state)}.`,
      at: '/runway/surface',
    };
  },
};
