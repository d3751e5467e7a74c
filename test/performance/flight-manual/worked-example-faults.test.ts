import { describe, expect, it } from 'vitest';
import type { WorkedExample } from '../../../src/performance/flight-manual/flight-manual.ts';
import { workedExampleFaults } from '../../../src/performance/flight-manual/worked-example-faults.ts';
import { manualWith, stepNote, takeoffGraph, takeoffTable } from '../../support/manual-sheets.ts';

const example = (members: Partial<WorkedExample>): WorkedExample => ({
  given: { pressureAltitude: 500, temperature: 283 },
  reads: { groundRoll: 235 },
  within: 0.5,
  ...members,
});
const faults = (members: Partial<WorkedExample>, table = takeoffTable()) =>
  workedExampleFaults(manualWith([{ ...table, workedExamples: [example(members)] }]));

describe('worked examples', () => {
  it('are met within their bound, itself included', () => {
    expect(faults({})).toEqual([]);
    expect(faults({ reads: { groundRoll: 235.5, takeoffDistance: 475 } })).toEqual([]);
  });

  it('are named with the sheet, the example, ours and theirs where they are not', () => {
    expect(faults({ reads: { groundRoll: 235.6 } })).toEqual([
      {
        sheet: 'takeoff',
        example: 0,
        output: 'groundRoll',
        theirs: 235.6,
        within: 0.5,
        ours: 235,
        outside: [],
        silent: [],
      },
    ]);
  });

  it('are not met where the sheet does not reach or does not speak of something', () => {
    expect(faults({ given: { pressureAltitude: 1500, temperature: 283 } })).toMatchObject([
      { outside: [{ axis: 'pressureAltitude' }] },
    ]);
    const [fault] = faults({ slope: 0.01 });
    expect(fault).toMatchObject({ silent: ['slope'] });
    expect(fault).not.toHaveProperty('ours');
  });

  it('are worked with the notes, and compared as printed, with the factor that the figures hold', () => {
    const table = takeoffTable({
      notes: [stepNote('headwind', -0.1, 5)],
      contains: { factor: 1.25, windAllowance: false },
    });
    const given = { pressureAltitude: 500, temperature: 283, headwind: 5 };
    expect(faults({ given, reads: { groundRoll: 211.5 }, within: 0.01 }, table)).toEqual([]);
  });

  it('without a temperature are of the standard day as printed', () => {
    const table = takeoffTable({
      axes: ['pressureAltitude'],
      nodes: [[0], [1000]],
      cells: [
        [200, 400],
        [240, 500],
      ],
      standardTemperatures: [288, 281],
    });
    expect(faults({ given: { pressureAltitude: 1000 }, reads: { groundRoll: 240 }, within: 0.01 }, table)).toEqual([]);
  });

  it('verify a graph', () => {
    const given = { pressureAltitude: 1000, temperature: 283, mass: 900, headwind: 5 };
    // (200 + 100 + 20) x .9 x .95
    const read = (takeoffDistance: number) =>
      workedExampleFaults(
        manualWith([], [takeoffGraph({ workedExamples: [example({ given, reads: { takeoffDistance } })] })]),
      );
    expect(read(273.6)).toEqual([]);
    expect(read(275)).toMatchObject([{ sheet: 'graph', ours: expect.closeTo(273.6, 9) }]);
  });
});
