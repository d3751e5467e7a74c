import type { ConditionsContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Routine reports come every hour or half hour; older than this another one has come [s]. @see references.Wmo306 */
const routine = 3600;

/** A report that another has followed, or of a later time than the question. */
export const reportOld: CautionTest<ConditionsContext> = {
  code: 'report-old',
  severity: 'caution',
  meaning: 'The report is more than an hour older than the time of the question, or later than it.',
  threshold: { kind: 'time', value: routine },
  source: 'Wmo306',
  test: ({ question: { report } }) => {
    if (report?.age === undefined || (report.age >= 0 && report.age <= routine)) return undefined;
    const minutes = Math.abs(Math.round(report.age / 60));
    const days = Math.round(minutes / 144) / 10;
    const apart = minutes < 2880 ? `${minutes} min` : `${days} days`;
    return {
      message:
        report.age > 0
          ? `The report of ${report.station} is ${apart} older than the time of the question.`
          : `The report of ${report.station} is ${apart} later than the time of the question.`,
      at: '/weather/report',
      value: { kind: 'time', value: report.age },
    };
  },
};
