import { toManualTable } from '../../src/contract/flight-manual/to-manual-table.ts';
import type { ManualTable } from '../../src/performance/flight-manual/flight-manual.ts';
import { manualDistances } from '../../src/performance/flight-manual/manual-distances.ts';
import type { ManualAsked } from '../../src/performance/flight-manual/manual-figures.ts';
import { readSheet } from '../../src/performance/flight-manual/read-sheet.ts';
import { manualWith, takeoffGraph, takeoffTable } from '../support/manual-sheets.ts';
import { askedOf, handbookTakeoff } from '../support/printed-manuals.ts';
import { microseconds } from './microseconds.ts';

/** A table over four axes, 5 x 8 x 6 x 4 nodes. */
function largeTable(): ManualTable {
  const nodes: number[][] = [];
  for (let mass = 0; mass < 5; mass++) {
    for (let altitude = 0; altitude < 8; altitude++) {
      for (let kelvin = 0; kelvin < 6; kelvin++) {
        for (let wind = 0; wind < 4; wind++) {
          nodes.push([900 + 50 * mass, 300 * altitude, 263 + 10 * kelvin, 5 * wind]);
        }
      }
    }
  }
  const { mass: _, ...conditions } = takeoffTable().conditions;
  return takeoffTable({
    conditions,
    axes: ['mass', 'pressureAltitude', 'temperature', 'headwind'],
    nodes,
    cells: nodes.map(([mass, altitude, kelvin, wind]) => {
      const roll =
        ((mass as number) / 5) * (1 + (altitude as number) / 6000) * ((kelvin as number) / 263) - 5 * (wind as number);
      return [roll, 2 * roll];
    }),
  });
}

/** Prints what it costs to look a distance up in the flight manual. */
export function manualBench(print: (line: string) => void): void {
  const handbook = toManualTable(handbookTakeoff());
  const large = largeTable();
  const asked: readonly ManualAsked[] = Array.from({ length: 8 }, (_, i) => ({
    ...askedOf({
      phase: 'takeoff',
      mass: 990 + i,
      pressureAltitude_ft: 2100 + 70 * i,
      temperature: 284 + i,
      headwind_kt: 6 + i,
    }),
    configuration: 'flap-10',
  }));
  const sheets = {
    'handbook, 42 rows': handbook,
    'four axes, 960 rows': large,
    'graph of three panels': takeoffGraph(),
  };
  print('');
  print('one look-up in the flight manual [us]; aim: below 20');
  for (const [name, sheet] of Object.entries(sheets)) {
    const one = { ...sheet, configurations: ['flap-10'] };
    const manual = 'axes' in one ? manualWith([one]) : manualWith([], [one]);
    const read = microseconds((question: ManualAsked) => readSheet(one, question), asked, 1000);
    const whole = microseconds((question: ManualAsked) => manualDistances(manual, question), asked, 1000);
    print(`  ${name.padEnd(22)} ${read.toFixed(2).padStart(6)}   with its notes ${whole.toFixed(2)}`);
  }
}
