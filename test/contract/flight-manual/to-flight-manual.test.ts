import { describe, expect, it } from 'vitest';
import { flightManual } from '../../../src/contract/flight-manual/flight-manual.ts';
import { toFlightManual } from '../../../src/contract/flight-manual/to-flight-manual.ts';
import { fullManual } from '../../support/printed-manuals.ts';

const near = (value: number) => expect.closeTo(value, 9) as number;
const kt = 1852 / 3600;

/** Indicated over calibrated [m/s]: 1 m/s less is shown than flown. */
const calibration = { indicated: [20, 60], calibrated: [21, 61] };
const manual = toFlightManual(flightManual.parse(fullManual()), calibration);
const [takeoff, landing, climb] = manual.tables;

describe('the flight manual in SI', () => {
  it('has its tables with axes and outputs apart, in the order of the columns', () => {
    expect(takeoff).toMatchObject({
      id: 'short-field-takeoff',
      phase: 'takeoff',
      page: 'Fig. 10-20',
      configurations: ['takeoff-10'],
      axes: ['pressureAltitude', 'temperature'],
      outputs: ['groundRoll', 'takeoffDistance'],
      contains: { factor: 1, windAllowance: false },
      conditions: { surface: { kind: 'paved', state: 'dry' }, mass: near(1088.621688), technique: 'short field' },
    });
    expect(takeoff?.nodes[6]).toEqual([near(304.8), near(283.15)]);
    expect(takeoff?.cells[6]).toEqual([near(286.512), near(525.78)]);
    expect(takeoff).not.toHaveProperty('standardTemperatures');
  });

  it('has the printed standard temperatures beside the rows', () => {
    expect(landing?.axes).toEqual(['pressureAltitude']);
    expect(landing?.standardTemperatures).toEqual([288.15, 283.15, 278.15, 273.15].map(near));
  });

  it('has its notes as ratios a step, with what they leave out left out or said', () => {
    expect(takeoff?.notes).toEqual([
      {
        about: 'headwind',
        change: -0.1,
        per: near(9 * kt),
        multiplies: 'both',
        wholeSteps: false,
        windAllowance: false,
      },
      {
        about: 'tailwind',
        change: 0.1,
        per: near(2 * kt),
        limit: near(10 * kt),
        multiplies: 'both',
        wholeSteps: false,
        windAllowance: false,
      },
      {
        about: 'surface',
        surface: { kind: 'grass', state: 'dry' },
        change: 0.15,
        multiplies: 'groundRollAddedToBoth',
      },
    ]);
    expect(landing?.notes[1]).toMatchObject({ about: 'aboveStandard', per: near(100 / 3) });
    expect(climb?.notes[0]).toMatchObject({
      change: [{ upTo: near(609.6), change: -0.05 }, { change: -0.08 }],
      per: 10,
    });
  });

  it('has flap in radians and gradients as ratios', () => {
    expect(climb?.nodes[0]).toEqual([near(Math.PI / 18), 900, 0]);
    expect(climb?.cells[0]).toEqual([near(0.11)]);
  });

  it('has worked examples in the same measures', () => {
    expect(takeoff?.workedExamples).toEqual([
      {
        given: { pressureAltitude: near(762), temperature: near(293.15) },
        reads: { groundRoll: near(357.5304) },
        within: near(0.3048),
      },
    ]);
    expect(climb?.workedExamples[0]).toMatchObject({ reads: { climbGradient: near(0.1) }, within: near(0.01) });
  });

  it('has indicated speeds calibrated by the own table of the aeroplane', () => {
    expect(manual.speedTables).toEqual([
      {
        id: 'takeoff-speeds',
        page: '4-3',
        configurations: ['takeoff-10'],
        airspeed: 'ias',
        speeds: ['liftOff', 'screen'],
        masses: [900, 1030],
        cells: [
          [near(50 * kt + 1), near(56 * kt + 1)],
          [near(54 * kt + 1), near(60 * kt + 1)],
        ],
      },
    ]);
    expect(() => toFlightManual(flightManual.parse(fullManual()))).toThrow(/no calibration/);
  });

  it('has the curves of its graphs rising by parameter, every height in the measure of the output', () => {
    const [, guide] = manual.graphs[0]?.panels ?? [];
    expect(manual.graphs[0]).toMatchObject({ outputs: ['landingDistance'], phase: 'landing' });
    expect(guide).toEqual({
      kind: 'guide',
      across: 'mass',
      parameter: 'previous',
      reference: 1030,
      curves: [
        {
          parameter: near(274.32),
          points: [
            [800, near(213.36)],
            [1030, near(274.32)],
          ],
        },
        {
          parameter: near(487.68),
          points: [
            [800, near(396.24)],
            [1030, near(487.68)],
          ],
        },
      ],
    });
    const turned = fullManual();
    turned.graphs[0]?.panels[0]?.curves.reverse();
    const [first] = toFlightManual(flightManual.parse(turned), calibration).graphs[0]?.panels ?? [];
    expect(first?.curves.map(({ parameter }) => parameter)).toEqual([0, near(1828.8)]);
  });
});
