import { describe, expect, it } from 'vitest';
import type { FitFinding } from '../../../src/performance/fit/fit-finding.ts';
import { saidFinding } from '../../../src/planning/fit/finding-sentence.ts';
import type { Origin } from '../../../src/planning/fit/fit-points.ts';
import { heldSentence } from '../../../src/planning/fit/held-sentence.ts';

const origins: Origin[] = [0, 1].map((row) => ({
  name: `row ${row + 1} of table tk-1`,
  at: `/tables/0/rows/${row}`,
  of: (member) => `/tables/0/rows/${row}/${member}`,
  table: 'tk-1',
  row,
}));
const question = {
  aeroplaneAt: '/aeroplane/definition',
  configuration: 'short',
  phase: 'takeoff',
  units: 'm-kt-kg',
} as const;
const said = (finding: FitFinding) => saidFinding(finding, question, origins);

describe('saidFinding', () => {
  it.each<[FitFinding, string, string]>([
    [
      { code: 'unit-error', column: 'wholeDistance', printed: 'ft', declared: 'm', rmsIfSo: 0.0061 },
      'The takeoff distances: declared m, they go with this aeroplane if they are ft. So read, the fit misses by 0.6 % rms.',
      '/tables/0/rows/0/wholeDistance',
    ],
    [
      { code: 'outlier', row: 1, kind: 'groundRoll', given: 320, computed: 228, exchanged: 230 },
      'Row 2 of table tk-1: ground roll 320 m does not go with the rest, which give 228 m. With two digits exchanged, 230 m, it goes with them.',
      '/tables/0/rows/1/groundRoll',
    ],
    [
      { code: 'stall-speed-indicated', coefficient: 2.398, range: [1.261, 1.854] },
      'A maximum lift coefficient of 2.40 follows from the definition; such a configuration has 1.26 to 1.85. An indicated stall speed declared calibrated gives too much: it is 5 kt to 10 kt low.',
      '/aeroplane/definition/configurations/short/maximumLift',
    ],
    [
      { code: 'node-outside', column: 'temperature', row: 1, rows: 3, given: 333.15, bound: 323.15 },
      'Row 2 of table tk-1: temperature 60 °C, bound 50 °C, and 2 more beyond the bound. No such tables are made.',
      '/tables/0/rows/1/temperature',
    ],
    [
      { code: 'parameter-implausible', parameter: 'thrustFactor', value: 1.1204, range: [0.8, 1.1] },
      'The factor on thrust comes to 1.12, usual 0.8 to 1.1: a slip in the table or in the definition is likelier than such an aeroplane.',
      '/tables/0/rows/0',
    ],
  ])('%o', (finding, message, at) => {
    expect(said(finding)).toMatchObject({ message, at });
  });

  it.each<FitFinding>([
    { code: 'columns-swapped', rows: 36 },
    { code: 'stall-speed-unit', coefficient: 1.21, range: [1.26, 1.85] },
    { code: 'stall-speed-unit', coefficient: 1.21, range: [1.26, 1.85], printed: 'mph', declared: 'kt' },
    { code: 'maximum-lift-odd', coefficient: 2.9, range: [1.26, 1.85] },
    { code: 'parameter-at-bound', parameter: 'approachAngle', value: 0.1396, range: [0.03, 0.14] },
    { code: 'not-computable', row: 1 },
    { code: 'too-few-points', distances: 1, parameters: 4 },
    { code: 'no-convergence' },
  ])('says $code in whole sentences', (finding) => {
    const { message, at } = said(finding);
    expect(message).toMatch(/^[A-Z].*\.$/);
    expect(message).not.toMatch(/undefined|NaN|approve|safe|legal/);
    expect(at).toMatch(/^\//);
  });

  it('says where a parameter is held, and why', () => {
    expect(heldSentence('altitudeLapseCoefficient', 0.18, 'one-altitude')).toBe(
      'The fall of power with altitude is held at 0.18: distances of one pressure altitude do not show it.',
    );
    expect(heldSentence('approachAngle', Math.PI / 60, 'no-whole-distance')).toMatch(/held at 3°/);
  });
});
