import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import type { Question, Surface } from '../question.ts';
import { type TableNode, windInFigures } from './table-node.ts';

/** Where the aeroplane of such a question would stand: what assumptions and faults about it begin with. */
export const askedAeroplaneAt = '/definition';

/** Conditions that an aeroplane is asked at: mass [kg], pressure altitude [m], temperature [K], headwind [m/s]. */
export interface AskedAt extends Pick<TableNode, 'mass' | 'pressureAltitude' | 'temperature' | 'headwind'> {
  readonly surface: Surface;
}

/** The question about conditions alone: level, from standing at full power, by physics as stated, nothing declared. */
export function questionAt(
  aeroplane: Aeroplane,
  configuration: string,
  { mass, pressureAltitude, temperature, headwind, surface }: AskedAt,
): Question {
  return {
    aeroplane,
    aeroplaneDigest: '',
    aeroplaneAt: askedAeroplaneAt,
    mass,
    configuration,
    runway: {
      designator: '36',
      direction: 0,
      directionReference: 'true',
      elevation: pressureAltitude,
      slope: 0,
      surface,
      start: { kind: 'threshold' },
    },
    weather: {
      temperature,
      pressure: { kind: 'pressureAltitude', value: pressureAltitude },
      wind: { kind: 'components', headwind },
    },
    ruleSet: 'unfactored',
    method: 'stated',
    units: 'm-kt-kg',
    defaulted: [],
  };
}

/** The question whose answer is a row of a table, in the wind that its figures are worth. */
export function questionAtNode(
  aeroplane: Aeroplane,
  table: ManualTable,
  configuration: string,
  node: TableNode,
): Question {
  return questionAt(aeroplane, configuration, {
    ...node,
    headwind: windInFigures(table, node.headwind),
    surface: table.conditions.surface,
  });
}
