import { describe, expect, it } from 'vitest';
import { checkAeroplane } from '../../../src/contract/check-aeroplane.ts';
import type { ManualTableOnWire } from '../../../src/contract/flight-manual/manual-table.ts';
import { readDefinition } from '../../../src/contract/read-definition.ts';
import { toAeroplane } from '../../../src/contract/to-aeroplane.ts';
import type { FlightManual } from '../../../src/performance/flight-manual/flight-manual.ts';
import { manualDistances } from '../../../src/performance/flight-manual/manual-distances.ts';
import type { ManualAsked, ManualFigures } from '../../../src/performance/flight-manual/manual-figures.ts';
import {
  handbookInterpolation,
  handbookTakeoffTable,
  knowledgeTestLandings,
  questionBankLandings,
  questionBankRolls,
} from '../../published/printed-manual-tables.ts';
import { expectNear } from '../../support/near.ts';
import {
  askedOf,
  handbookTakeoff,
  knowledgeTestLanding,
  manualOf,
  questionBankLanding,
} from '../../support/printed-manuals.ts';
import { sampleDefinition } from '../../support/sample-questions.ts';

const ft = 0.3048;
const lb = 0.45359237;

/** The whole way from a definition's text to the manual in SI. */
function manualIn(...tables: ManualTableOnWire[]): FlightManual {
  const definition = { ...sampleDefinition(), flightManual: manualOf(...tables) };
  const read = readDefinition(JSON.parse(JSON.stringify(definition)));
  if (!('value' in read)) throw new Error(JSON.stringify(read.refused));
  expect(checkAeroplane(read.value, '')).toEqual([]);
  return toAeroplane(read.value).flightManual as FlightManual;
}

function figuresFor(manual: FlightManual, asked: ManualAsked): ManualFigures {
  const found = manualDistances(manual, asked);
  if (found?.outcome !== 'figures') throw new Error(JSON.stringify(found));
  return found;
}

describe('tables as printed, typed in as a definition', () => {
  const takeoff = manualIn(handbookTakeoff());

  it.each(handbookInterpolation)('$title', ({ inputs, expected, tolerance }) => {
    const { PA_ft: pressureAltitude_ft, OAT_C } = inputs;
    const asked = askedOf({ phase: 'takeoff', mass: 2400 * lb, pressureAltitude_ft, temperature: OAT_C + 273.15 });
    expectNear(figuresFor(takeoff, asked).groundRoll, expected * ft, tolerance * ft);
  });

  it.each(knowledgeTestLandings)('$title', ({ inputs, expected, tolerance }) => {
    const { PA_ft: pressureAltitude_ft, OAT_F, headwind_kt } = inputs;
    const temperature = (OAT_F + 459.67) / 1.8;
    const asked = askedOf({ phase: 'landing', mass: 1600 * lb, pressureAltitude_ft, temperature, headwind_kt });
    expectNear(figuresFor(manualIn(knowledgeTestLanding()), asked).wholeDistance, expected * ft, tolerance * ft);
  });

  const landing = manualIn(questionBankLanding());
  const bankAsked = (inputs: (typeof questionBankLandings)[number]['inputs']) =>
    askedOf({
      phase: 'landing',
      mass: inputs.mass_lb * lb,
      pressureAltitude_ft: inputs.PA_ft,
      temperature: inputs.OAT_C + 273.15,
      headwind_kt: inputs.headwind_kt,
      rest: inputs.grass === 'dry' ? { surface: { kind: 'grass', state: 'dry', grass: 'short' } } : {},
    });

  it.each(questionBankLandings)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(figuresFor(landing, bankAsked(inputs)).wholeDistance, expected * ft, tolerance * ft);
  });

  it.each(questionBankRolls)('$title', ({ inputs, expected, tolerance }) => {
    const found = figuresFor(landing, bankAsked(inputs));
    expectNear(found.groundRoll, expected * ft, tolerance * ft);
    expect(found.edges).toMatchObject([{ axis: 'mass', side: 'below', bound: expect.closeTo(2300 * lb, 9) }]);
  });

  it(`meets every printed cell [${handbookTakeoffTable.source}; ${handbookTakeoffTable.status}; exact]`, () => {
    for (const [pressureAltitude_ft, degC, roll, total] of handbookTakeoffTable.rows) {
      const temperature = (degC as number) + 273.15;
      const asked = askedOf({
        phase: 'takeoff',
        mass: 2400 * lb,
        pressureAltitude_ft: pressureAltitude_ft as number,
        temperature,
      });
      const found = figuresFor(takeoff, asked);
      expect([found.groundRoll, found.wholeDistance]).toEqual([(roll as number) * ft, (total as number) * ft]);
      expect(found.edges).toEqual([]);
    }
  });

  it('refuses a hole of the printed grid and names the bound', () => {
    const asked = askedOf({ phase: 'takeoff', mass: 2400 * lb, pressureAltitude_ft: 6500, temperature: 308.15 });
    expect(manualDistances(takeoff, asked)).toEqual({
      outcome: 'outside-flight-manual',
      bounds: [
        {
          sheet: 'short-field-takeoff',
          axis: 'temperature',
          given: 308.15,
          bound: expect.closeTo(303.15, 9),
          side: 'above',
        },
      ],
    });
    const onTheRow = askedOf({ phase: 'takeoff', mass: 2400 * lb, pressureAltitude_ft: 6000, temperature: 308.15 });
    expect(manualDistances(takeoff, onTheRow)?.outcome).toBe('figures');
  });
});
