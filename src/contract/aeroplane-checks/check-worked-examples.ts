import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { ManualOutput } from '../../performance/flight-manual/flight-manual.ts';
import { type WorkedExampleFault, workedExampleFaults } from '../../performance/flight-manual/worked-example-faults.ts';
import type { Fault } from '../../planning/fault.ts';
import { fromSi, type Quantity, unitsOf } from '../../units/units.ts';
import type { FlightManualOnWire } from '../flight-manual/flight-manual.ts';
import { columnKinds } from '../flight-manual/manual-columns.ts';
import { toFlightManual } from '../flight-manual/to-flight-manual.ts';
import type { Q } from '../quantity.ts';
import { figure } from '../written.ts';
import type { PlacedExample } from './entered-sheet.ts';

/** Each example against its sheet's columns: enough given to work it, and read what the sheet gives. */
export function checkExampleForms(examples: readonly PlacedExample[]): Fault[] {
  return examples.flatMap((placed) => [...checkGiven(placed), ...checkReads(placed)]);
}

function checkGiven({ example: { given }, axes, pointer }: PlacedExample): Fault[] {
  const faults: Fault[] = [];
  const { temperature, temperatureDeviation } = given;
  if (temperature !== undefined && temperatureDeviation !== undefined) {
    faults.push({
      pointer: `${pointer}/given`,
      code: 'exactly-one-of',
      message: 'temperature and temperatureDeviation do not go together.',
      allowed: 'at most one of temperature or temperatureDeviation',
    });
  }
  for (const axis of axes) {
    const isTemperature = axis === 'temperature' || axis === 'temperatureDeviation';
    const isGiven = isTemperature ? (temperature ?? temperatureDeviation) !== undefined : given[axis] !== undefined;
    if (isGiven || axis === 'headwind') continue;
    faults.push({
      pointer: `${pointer}/given/${axis}`,
      code: 'missing',
      message: `The sheet is entered with ${axis}, which the example does not give.`,
    });
  }
  return faults;
}

function checkReads({ example: { reads, within }, outputs, pointer }: PlacedExample): Fault[] {
  const names = Object.keys(reads) as ManualOutput[];
  if (names.length === 0) {
    const message = 'The example reads nothing.';
    return [{ pointer: `${pointer}/reads`, code: 'missing', message, allowed: outputs.join(', ') }];
  }
  return names.flatMap((name): Fault[] => {
    const at = `${pointer}/reads/${name}`;
    if (!outputs.includes(name)) {
      const message = `The sheet does not give ${name}.`;
      return [{ pointer: at, code: 'contradiction', message, allowed: outputs.join(', ') }];
    }
    const units = unitsOf(columnKinds[name].quantity);
    if (units.some((unit) => unit === within.unit)) return [];
    return [
      {
        pointer: `${pointer}/within/unit`,
        code: 'unknown-unit',
        message: `${within.unit} is no unit of ${name}.`,
        received: within.unit,
        allowed: units.join(', '),
      },
    ];
  });
}

/** Examples that their own sheets do not give again. */
export function checkWorkedExamples(
  manual: FlightManualOnWire,
  calibration: AirspeedCalibration | undefined,
  examples: readonly PlacedExample[],
): Fault[] {
  return workedExampleFaults(toFlightManual(manual, calibration)).map((found) => {
    const placed = examples.find(({ sheet, index }) => sheet === found.sheet && index === found.example);
    const { example, pointer } = placed as PlacedExample;
    const read = example.reads[found.output] as Q;
    const { quantity } = columnKinds[found.output];
    return {
      pointer: `${pointer}/reads/${found.output}`,
      code: 'contradiction',
      message: `${whyNot(found, quantity, read.unit)}; the manual's example reads ${read.value} ${read.unit}.`,
      received: read.value,
      allowed: `what the sheet gives, within ${example.within.value} ${example.within.unit}`,
      hint: 'Check the cells around it, the notes and their order.',
    };
  });
}

function whyNot(
  { sheet, output, ours, outside, silent }: WorkedExampleFault,
  quantity: Quantity,
  unit: string,
): string {
  const [bound] = outside;
  if (bound !== undefined) return `${sheet} does not reach ${output} here: it ends at ${bound.axis}`;
  if (ours === undefined) return `${sheet} says nothing of ${silent.join(' and ')}`;
  return `${sheet} gives ${figure(fromSi(quantity, ours, unit as never))} ${unit} of ${output}`;
}
