import { describe, expect, it } from 'vitest';
import { checkAeroplane } from '../../../src/contract/check-aeroplane.ts';
import { readDefinition } from '../../../src/contract/read-definition.ts';
import type { Fault } from '../../../src/planning/fault.ts';
import { fullManual } from '../../support/printed-manuals.ts';
import { named, sampleDefinition } from '../../support/sample-questions.ts';

const at = '/flightManual';

// biome-ignore lint/suspicious/noExplicitAny: a slip puts anything anywhere
type Slip = (manual: any, definition: any) => void;

/** The faults of the sample tourer with this slip in its manual: by its schema first, then by its checks. */
function faultsOf(slip: Slip): readonly Fault[] {
  const definition = { ...sampleDefinition(), flightManual: JSON.parse(JSON.stringify(fullManual())) };
  slip(definition.flightManual, definition);
  const read = readDefinition(JSON.parse(JSON.stringify(definition)));
  return 'value' in read ? checkAeroplane(read.value, '') : read.refused;
}

const table = `${at}/tables/0`;
const climb = `${at}/tables/2`;
const speeds = `${at}/speedTables/0`;
const graph = `${at}/graphs/0`;
const deltaC = (value: number) => ({ value, unit: 'deltaC' });

const slips: [title: string, slip: Slip, fault: string, says: RegExp][] = [
  [
    'no sheet at all',
    (m) => Object.assign(m, { tables: [], speedTables: [], graphs: [] }),
    `missing ${at}`,
    /0 tables/,
  ],
  ['two sheets of one id', (m) => (m.graphs[0].id = 'climb'), `contradiction ${graph}/id`, /already/],
  [
    'an unknown configuration',
    (m) => (m.tables[0].configurations = ['takeoff-01']),
    `unknown-id ${table}/configurations/0`,
    /Perhaps takeoff-10/,
  ],
  [
    'a configuration named twice',
    (m) => (m.tables[0].configurations = ['takeoff-10', 'takeoff-10']),
    `contradiction ${table}/configurations/1`,
    /twice/,
  ],
  [
    'a landing configuration on a takeoff table',
    (m) => (m.tables[0].configurations = ['landing-full']),
    `contradiction ${table}/configurations/0`,
    /not a configuration for takeoff/,
  ],
  [
    'a takeoff distance to a lower screen than the certification\u2019s',
    (m) => (m.tables[0].conditions.screenHeight = { value: 35, unit: 'ft' }),
    `contradiction ${table}/conditions/screenHeight`,
    /over a screen of 35 ft; that of this aeroplane is 50 ft/,
  ],
  [
    'a configuration at a flap that the table does not have',
    (m) => (m.tables[2].configurations = ['landing-full']),
    `contradiction ${climb}/configurations/0`,
    /flap of 30 deg/,
  ],
  [
    'an axis in a unit of another quantity',
    (m) => (m.tables[0].columns[0].unit = 'degC'),
    `unknown-id ${table}/columns/0/unit`,
    /"degC" is not/,
  ],
  [
    'a column without a name',
    (m) => (m.tables[0].columns[1].name = ''),
    `unknown-id ${table}/columns/1/name`,
    /closed list/,
  ],
  [
    'a misspelt column',
    (m) => (m.tables[0].columns[0].name = 'pressureAltitud'),
    `unknown-id ${table}/columns/0/name`,
    /Perhaps "pressureAltitude"/,
  ],
  [
    'an axis given twice',
    (m) => (m.tables[0].columns[1] = { name: 'pressureAltitude', unit: 'm' }),
    `contradiction ${table}/columns/1/name`,
    /there already/,
  ],
  [
    'a row that is one number short',
    (m) => m.tables[0].rows[4].pop(),
    `contradiction ${table}/rows/4`,
    /3 numbers for 4 columns/,
  ],
  [
    'a distance in another unit than the column says',
    (m) => {
      m.tables[0].columns[3].unit = 'm';
      m.tables[0].rows[41][3] = 14_700;
    },
    `out-of-range ${table}/rows/41/3`,
    /In ft it would fit/,
  ],
  [
    'no pressure altitude',
    (m) => {
      m.tables[0].columns.shift();
      m.tables[0].rows = m.tables[0].rows.slice(0, 5).map((row: number[]) => row.slice(1));
    },
    `missing ${table}/columns`,
    /pressureAltitude/,
  ],
  [
    'mass neither a column nor a condition',
    (m) => delete m.tables[0].conditions.mass,
    `missing ${table}/conditions/mass`,
    /neither/,
  ],
  [
    'mass a column and a condition',
    (m) => (m.tables[2].conditions.mass = { value: 1000, unit: 'kg' }),
    `contradiction ${climb}/conditions/mass`,
    /1000 kg too/,
  ],
  [
    'temperature and its deviation',
    (m) => {
      m.tables[0].columns.push({ name: 'temperatureDeviation', unit: 'deltaC' });
      for (const [i, row] of m.tables[0].rows.entries()) row.push(i % 2);
    },
    `exactly-one-of ${table}/columns`,
    /do not go together/,
  ],
  [
    'a landing distance on a takeoff table',
    (m) => (m.tables[0].columns[3].name = 'landingDistance'),
    `contradiction ${table}/columns`,
    /no figure of a takeoff/,
  ],
  [
    'no figure at all',
    (m) => {
      m.tables[2].columns.pop();
      m.tables[2].rows = m.tables[2].rows.map((row: number[]) => row.slice(0, 3));
      delete m.tables[2].workedExamples;
    },
    `missing ${climb}/columns`,
    /climbGradient or climbRate/,
  ],
  [
    'a row printed twice',
    (m) => m.tables[0].rows.push([1000, 20, 1015, 1860]),
    `contradiction ${table}/rows/42`,
    /A row before it is for pressureAltitude 1000 ft, temperature 20 degC already/,
  ],
  [
    'an axis with one value',
    (m) => {
      m.tables[2].rows = m.tables[2].rows.slice(0, 2);
      delete m.tables[2].workedExamples;
    },
    `contradiction ${climb}/columns/1`,
    /900 kg in every row.*state the mass in conditions/,
  ],
  [
    'a whole distance below the roll',
    (m) => (m.tables[0].rows[41][3] = 2000),
    `contradiction ${table}/rows/41/3`,
    /not above the ground roll of 2060 ft/,
  ],
  [
    'a digit turned round in the middle of the table',
    (m) => (m.tables[0].rows[17][3] = 2925),
    `contradiction ${table}/rows/17/3`,
    /2925 ft at pressureAltitude 3000 ft.*does not fall as pressureAltitude rises/,
  ],
  [
    'a climb that rises with mass',
    (m) => (m.tables[2].rows[2][3] = 12),
    `contradiction ${climb}/rows/2/3`,
    /at most 11 percent/,
  ],
  [
    'a standard temperature of another altitude',
    (m) => (m.tables[1].rows[3][1] = 59),
    `implausible ${at}/tables/1/rows/3/1`,
    /standard temperature at that pressure altitude/,
  ],
  [
    'an airspeed kind without an airspeed',
    (m) => (m.tables[0].airspeed = 'ias'),
    `contradiction ${table}/airspeed`,
    /no column of an airspeed/,
  ],
  [
    'an airspeed without its kind',
    (m) => {
      m.tables[0].columns.push({ name: 'liftOff', unit: 'kt' });
      for (const row of m.tables[0].rows) row.push(51);
    },
    `missing ${table}/airspeed`,
    /liftOff/,
  ],
  [
    'long grass on tarmac',
    (m) => (m.tables[0].conditions.surface.grass = 'long'),
    `contradiction ${table}/conditions/surface/grass`,
    /paved/,
  ],
  [
    'a headwind that lengthens',
    (m) => (m.tables[0].notes[0].changePercent = 10),
    `implausible ${table}/notes/0/changePercent`,
    /0 or less.*|smaller is negative/,
  ],
  [
    'a headwind that leaves nothing',
    (m) => (m.tables[0].notes[0].per.value = 1),
    `implausible ${table}/notes/0/changePercent`,
    /At its limit the note makes -100 %/,
  ],
  [
    'a step in another quantity',
    (m) => (m.tables[0].notes[0].per.unit = 'ft'),
    `unknown-unit ${table}/notes/0/per/unit`,
    /not a unit/,
  ],
  [
    'a note of both distances and another of the same, a share of the roll added to both',
    (m) => m.tables[0].notes.push({ ...m.tables[0].notes[0], multiplies: 'groundRollAddedToBoth' }),
    `contradiction ${table}/notes/3`,
    /already/,
  ],
  [
    'a note twice',
    (m) => m.tables[0].notes.push({ ...m.tables[0].notes[0] }),
    `contradiction ${table}/notes/3`,
    /already/,
  ],
  [
    'neither a change nor bands',
    (m) => delete m.tables[0].notes[0].changePercent,
    `exactly-one-of ${table}/notes/0`,
    /None of/,
  ],
  [
    'a change and bands',
    (m) => (m.tables[2].notes[0].changePercent = -5),
    `exactly-one-of ${climb}/notes/0`,
    /do not go together/,
  ],
  [
    'bands that end',
    (m) => (m.tables[2].notes[0].byPressureAltitude[1].upTo = { value: 9000, unit: 'ft' }),
    `contradiction ${climb}/notes/0/byPressureAltitude/1`,
    /bands/,
  ],
  [
    'bands that fall',
    (m) =>
      m.tables[2].notes[0].byPressureAltitude.splice(1, 0, { upTo: { value: 1000, unit: 'ft' }, changePercent: -6 }),
    `contradiction ${climb}/notes/0/byPressureAltitude/1`,
    /bands/,
  ],
  [
    'a climb note on a takeoff',
    (m) => (m.tables[0].notes[0].multiplies = 'climb'),
    `contradiction ${table}/notes/0/multiplies`,
    /nothing that climb/,
  ],
  [
    'a note on temperature beside its axis',
    (m) => m.tables[0].notes.push({ about: 'aboveStandard', changePercent: 1, per: deltaC(1), multiplies: 'both' }),
    `contradiction ${table}/notes/3/about`,
    /entered with temperature/,
  ],
  [
    'a share of a roll that no sheet gives',
    (m) => {
      m.graphs[0].notes = [
        {
          about: 'surface',
          surface: { kind: 'grass', state: 'dry' },
          changePercent: 20,
          multiplies: 'groundRollAddedToBoth',
        },
      ];
      m.tables.splice(1, 1);
    },
    `contradiction ${graph}/notes/0/multiplies`,
    /No sheet for these configurations gives the ground roll/,
  ],
  [
    'grass that lengthens the roll alone',
    (m) => (m.tables[0].notes[2].multiplies = 'groundRoll'),
    `implausible ${table}/notes/2/multiplies`,
    /no note says what it makes of the wholeDistance/,
  ],
  [
    'a tailwind that lengthens the whole distance alone',
    (m) => (m.tables[0].notes[1].multiplies = 'wholeDistance'),
    `implausible ${table}/notes/1/multiplies`,
    /what it makes of the groundRoll/,
  ],
  [
    'a headwind that shortens the whole distance alone',
    (m) => (m.tables[0].notes[0].multiplies = 'wholeDistance'),
    `implausible ${table}/notes/0/multiplies`,
    /shortens the wholeDistance alone: no note says what it makes of the groundRoll/,
  ],
  [
    'speeds that fall with mass',
    (m) => (m.speedTables[0].rows[1][1] = 49),
    `contradiction ${speeds}/rows/1/1`,
    /does not fall/,
  ],
  [
    'masses that do not rise',
    (m) => (m.speedTables[0].rows[1][0] = 900),
    `contradiction ${speeds}/rows/1/0`,
    /must rise/,
  ],
  [
    'a screen speed below lift-off',
    (m) => (m.speedTables[0].rows[1] = [1030, 57, 56]),
    `contradiction ${speeds}/rows/1/2`,
    /below liftOff/,
  ],
  [
    'speeds without mass',
    (m) => {
      m.speedTables[0].columns[0] = { name: 'stall', unit: 'kt' };
      m.speedTables[0].rows = [[45, 50, 56]];
    },
    `missing ${speeds}/columns`,
    /no column mass/,
  ],
  [
    'indicated speeds without a calibration',
    (_, definition) => delete definition.airspeedCalibration,
    'missing /airspeedCalibration',
    /need an airspeed calibration/,
  ],
  [
    'an indicated speed beyond the calibration',
    (m) => (m.speedTables[0].rows[1][2] = 101),
    `contradiction ${speeds}/rows/1/2`,
    /does not reach screen of 101 kt/,
  ],
  [
    'a guide panel first',
    (m) => {
      const { curves } = m.graphs[0].panels[0];
      for (const [i, curve] of curves.entries()) curve.parameter = [1000, 1300][i];
      m.graphs[0].panels[0] = {
        kind: 'guide',
        across: { name: 'pressureAltitude', unit: 'ft' },
        reference: -10,
        curves,
      };
    },
    `contradiction ${graph}/panels/0/kind`,
    /none before the first/,
  ],
  [
    'a second panel that forgets the first',
    (m) => {
      m.graphs[0].panels[1] = {
        kind: 'curves',
        across: { name: 'mass', unit: 'kg' },
        parameter: { name: 'headwind', unit: 'kt' },
        curves: [
          {
            parameter: 0,
            points: [
              [800, 700],
              [1030, 900],
            ],
          },
          {
            parameter: 10,
            points: [
              [800, 600],
              [1030, 800],
            ],
          },
        ],
      };
    },
    `contradiction ${graph}/panels/1`,
    /enters 0 times/,
  ],
  [
    'curves that run back',
    (m) => m.graphs[0].panels[0].curves[0].points.reverse(),
    `contradiction ${graph}/panels/0/curves/0/points/1/0`,
    /run across/,
  ],
  [
    'an axis of a graph in another unit',
    (m) => (m.graphs[0].panels[0].across.unit = 'K'),
    `out-of-range ${graph}/panels/0/curves/0/points/0/0`,
    /In degC it would fit/,
  ],
  [
    'heights that no distance has',
    (m) => (m.graphs[0].panels[1].curves[0].points[0][1] = 7),
    `out-of-range ${graph}/panels/1/curves/0/points/0/1`,
    /landingDistance is 7 ft/,
  ],
  [
    'curves that cross',
    (m) => (m.graphs[0].panels[0].curves[1].points[1][1] = 1100),
    `contradiction ${graph}/panels/0/curves/1`,
    /cross/,
  ],
  [
    'two curves for one value',
    (m) => (m.graphs[0].panels[0].curves[1].parameter = 0),
    `contradiction ${graph}/panels/0/curves/1/parameter`,
    /already/,
  ],
  [
    'a guide line off its height',
    (m) => (m.graphs[0].panels[1].curves[0].parameter = 950),
    `contradiction ${graph}/panels/1/curves/0/parameter`,
    /at 900 at the reference/,
  ],
  [
    'a graph without an example',
    (m) => (m.graphs[0].workedExamples = []),
    `out-of-range ${graph}/workedExamples`,
    /0 items/,
  ],
  [
    'an example that does not come out',
    (m) => (m.tables[0].workedExamples[0].reads.groundRoll.value = 1185),
    `contradiction ${table}/workedExamples/0/reads/groundRoll`,
    /gives 1173 ft of groundRoll|gives 1172/,
  ],
  [
    'an example outside the table',
    (m) => (m.tables[0].workedExamples[0].given.pressureAltitude.value = 8500),
    `contradiction ${table}/workedExamples/0/reads/groundRoll`,
    /ends at pressureAltitude/,
  ],
  [
    'an example of a slope that nothing speaks of',
    (m) => (m.tables[0].workedExamples[0].given.slope = { value: 1, unit: 'percent' }),
    `contradiction ${table}/workedExamples/0/reads/groundRoll`,
    /says nothing of slope/,
  ],
  [
    'a graph whose example does not come out',
    (m) => (m.graphs[0].workedExamples[0].reads.landingDistance.value = 1260),
    `contradiction ${graph}/workedExamples/0/reads/landingDistance`,
    /gives 1250 ft/,
  ],
  [
    'an example that leaves an axis out',
    (m) => delete m.tables[0].workedExamples[0].given.temperature,
    `missing ${table}/workedExamples/0/given/temperature`,
    /does not give/,
  ],
  [
    'an example that reads nothing',
    (m) => (m.tables[0].workedExamples[0].reads = {}),
    `missing ${table}/workedExamples/0/reads`,
    /reads nothing/,
  ],
  [
    'an example that reads what the sheet does not give',
    (m) => (m.tables[0].workedExamples[0].reads = { landingDistance: { value: 1173, unit: 'ft' } }),
    `contradiction ${table}/workedExamples/0/reads/landingDistance`,
    /does not give/,
  ],
  [
    'an example with a bound of another quantity',
    (m) => (m.tables[0].workedExamples[0].within = { value: 1, unit: 'kt' }),
    `unknown-unit ${table}/workedExamples/0/within/unit`,
    /no unit of groundRoll/,
  ],
];

describe('a flight manual', () => {
  it('in order has no fault', () => {
    expect(faultsOf(() => undefined)).toEqual([]);
  });

  it.each(slips)('with %s has one, at its place', (_, slip, fault, says) => {
    const faults = faultsOf(slip);
    expect(named([...faults])).toEqual([fault]);
    const [{ message, allowed, hint } = { message: '', allowed: '', hint: '' }] = faults;
    expect(`${message} ${allowed} ${hint}`).toMatch(says);
  });
});
