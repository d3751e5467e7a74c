import { standardTemperature } from '../../physics/atmosphere.ts';
import type { FlightManual, ManualOutput, Sheet, WorkedExample } from './flight-manual.ts';
import type { ManualAsked, ManualBound } from './manual-figures.ts';
import { readSheet } from './read-sheet.ts';
import { sheetFigures } from './sheet-figures.ts';

/** A worked example of the manual that its own sheet does not give again. */
export interface WorkedExampleFault {
  readonly sheet: string;
  /** place among the sheet's examples, from 0 */
  readonly example: number;
  readonly output: ManualOutput;
  /** what the manual reads, and how near ours has to come [SI] */
  readonly theirs: number;
  readonly within: number;
  /** what the sheet gives; absent where it does not reach or speak of something */
  readonly ours?: number;
  readonly outside: readonly ManualBound[];
  /** what no axis and no note speaks of */
  readonly silent: readonly string[];
}

/**
 * Every worked example of a manual's sheets that is not met within its own bound.
 *
 * An example without a temperature is of a standard day, without a mass of the sheet's own, without wind, slope or surface calm,
 * level and on the sheet's own surface. Figures are compared as printed, with the factor that they hold.
 */
export function workedExampleFaults({ tables, graphs }: FlightManual): WorkedExampleFault[] {
  const sheets: readonly Sheet[] = [...tables, ...graphs];
  return sheets.flatMap((sheet) => sheet.workedExamples.flatMap((example, i) => faultsOf(sheet, example, i, sheets)));
}

function faultsOf(sheet: Sheet, example: WorkedExample, index: number, others: readonly Sheet[]): WorkedExampleFault[] {
  const { outputs, outside, silent } = sheetFigures(sheet, askedOf(sheet, example), others);
  const faults: WorkedExampleFault[] = [];
  for (const [output, theirs] of Object.entries(example.reads) as [ManualOutput, number][]) {
    const told = { sheet: sheet.id, example: index, output, theirs, within: example.within, outside, silent };
    const figure = outputs[output];
    if (outside.length > 0 || silent.length > 0 || figure === undefined) {
      faults.push(told);
      continue;
    }
    const ours = isDistance(output) ? figure * sheet.contains.factor : figure;
    if (Math.abs(ours - theirs) > example.within * (1 + 1e-9)) faults.push({ ...told, ours });
  }
  return faults;
}

function askedOf(sheet: Sheet, { given, slope = 0, surface }: WorkedExample): ManualAsked {
  const pressureAltitude = given.pressureAltitude ?? 0;
  const standard = standardTemperature(pressureAltitude);
  const wind = given.headwind ?? 0;
  const asked: ManualAsked = {
    phase: sheet.phase === 'landing' ? 'landing' : 'takeoff',
    configuration: sheet.configurations[0] as string,
    flap: given.flap ?? 0,
    mass: given.mass ?? sheet.conditions.mass ?? 0,
    pressureAltitude,
    temperature: given.temperature ?? standard + (given.temperatureDeviation ?? 0),
    standardTemperature: standard,
    headwind: wind,
    creditedHeadwind: wind,
    slope,
    surface: surface ?? sheet.conditions.surface,
    edges: 'use',
  };
  const isStandardDay = given.temperature === undefined && given.temperatureDeviation === undefined;
  return isStandardDay ? { ...asked, temperature: readSheet(sheet, asked).standardTemperature } : asked;
}

function isDistance(output: ManualOutput): boolean {
  return output === 'groundRoll' || output === 'takeoffDistance' || output === 'landingDistance';
}
