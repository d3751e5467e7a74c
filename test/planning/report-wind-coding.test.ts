import { describe, expect, it } from 'vitest';
import type { ReportRead } from '../../src/planning/question.ts';
import { reportWindCoding } from '../../src/planning/report-wind-coding.ts';
import { expectNear } from '../support/near.ts';
import { answered, changed, plainQuestion } from '../support/takeoff-question.ts';

const kt = 1852 / 3600;
const degree = Math.PI / 180;
const report: ReportRead = {
  station: 'ZZAB',
  replaced: [],
  notUnderstood: [],
  rounding: { direction: 5 * degree, speed: 0.5 * kt },
};

describe('what the rounding of a reported wind is worth along the runway', () => {
  it('is the spread of equally likely directions and speeds [20 kt at 30 degrees off: 15.97 to 18.58 kt, computed from WMO FM 15 steps]', () => {
    const angle = 30 * degree;
    const wind = { headwind: 20 * kt * Math.cos(angle), crosswind: 20 * kt * Math.sin(angle) };
    const extremes = [20.5 * Math.cos(25 * degree), 19.5 * Math.cos(35 * degree)];
    expectNear(extremes[0] ?? 0, 18.58, 0.005);
    expectNear(extremes[1] ?? 0, 15.97, 0.005);
    // many equal steps over both intervals
    let sum = 0;
    let squares = 0;
    const n = 200;
    for (let i = 0; i < n; i++) {
      for (let j = 0; j < n; j++) {
        const at = (25 + ((i + 0.5) / n) * 10) * degree;
        const along = (19.5 + (j + 0.5) / n) * kt * Math.cos(at);
        sum += along;
        squares += along * along;
      }
    }
    const mean = sum / (n * n);
    const deviation = Math.sqrt(squares / (n * n) - mean * mean);
    expectNear(reportWindCoding(report, wind) / deviation, 1, 5e-3);
  });

  it('is nothing without a report, in a calm, or where the question replaced the wind', () => {
    expect(reportWindCoding(undefined, { headwind: 5, crosswind: 3 })).toBe(0);
    expect(reportWindCoding(report, { headwind: 0, crosswind: 0 })).toBe(0);
    expect(reportWindCoding({ ...report, rounding: {} }, { headwind: 5, crosswind: 3 })).toBe(0);
  });

  it('widens the band of the distances', () => {
    const windy = changed(plainQuestion, {
      weather: { wind: { kind: 'components', headwind: 4, crosswind: 6 } },
    });
    const found = answered({ ...windy, report }).basis.band?.find(({ of }) => of === 'rounding of the reported wind');
    expect(found?.groundRoll).toBeGreaterThan(0);
    const [plain, wider] = [answered(windy), answered({ ...windy, report })].map(
      ({ distances }) => distances?.takeoffDistance.high ?? 0,
    );
    expect(wider).toBeGreaterThan(plain ?? 0);
  });
});
