import type { MaximumLift } from '../aeroplane.ts';
import type { FitAsked } from './fit-asked.ts';
import type { FitColumn } from './fit-finding.ts';
import type { FitPoint, Observation } from './fit-point.ts';

/** A way in which a table is typed in wrongly, and what was meant. */
export interface Slip {
  readonly code: 'unit-error' | 'columns-swapped' | 'stall-speed-unit';
  readonly column: FitColumn;
  readonly printed: string;
  readonly declared: string;
  readonly meant: (asked: FitAsked) => FitAsked;
}

const foot = 0.3048;
const pound = 0.45359237;
const knot = 1852 / 3600;
const mph = 1609.344 / 3600;
const kmh = 1 / 3.6;

/**
 * The slips that are tried on a table which does not go with its aeroplane.
 *
 * Where it is not known in which unit a speed is declared, knots declared as mph are not among them: an indicated stall speed,
 * far more common, looks the same.
 */
export function slipsOf({ declared = {} }: Pick<FitAsked, 'declared'>): readonly Slip[] {
  return slips.filter((slip) => {
    const unit = declared[slip.column];
    if (slip.code === 'columns-swapped') return true;
    return unit === undefined ? !(slip.column === 'speeds' && slip.declared === 'mph') : unit === slip.declared;
  });
}

const slips: readonly Slip[] = [
  ...(['groundRoll', 'wholeDistance', 'distances'] as const).flatMap((column) => [
    distances(column, 'ft', 'm', foot),
    distances(column, 'm', 'ft', 1 / foot),
  ]),
  {
    code: 'columns-swapped',
    column: 'distances',
    printed: '',
    declared: '',
    meant: (asked) => ({ ...asked, points: asked.points.map(swapped) }),
  },
  conditions('temperature', 'degF', 'degC', (t) => (t - 273.15 - 32) / 1.8 + 273.15),
  conditions('temperature', 'degC', 'degF', (t) => (t - 273.15) * 1.8 + 32 + 273.15),
  conditions('mass', 'lb', 'kg', (mass) => mass * pound),
  conditions('mass', 'kg', 'lb', (mass) => mass / pound),
  conditions('pressureAltitude', 'ft', 'm', (altitude) => altitude * foot),
  conditions('pressureAltitude', 'm', 'ft', (altitude) => altitude / foot),
  speeds('mph', 'kt', mph / knot),
  speeds('kt', 'mph', knot / mph),
  speeds('km/h', 'kt', kmh / knot),
  speeds('kt', 'km/h', knot / kmh),
  speeds('kt', 'm/s', knot),
  speeds('m/s', 'kt', 1 / knot),
];

function distances(
  column: 'groundRoll' | 'wholeDistance' | 'distances',
  printed: string,
  declared: string,
  factor: number,
): Slip {
  const meant = (observation: Observation): Observation =>
    column === 'distances' || observation.kind === column
      ? { ...observation, distance: observation.distance * factor }
      : observation;
  return {
    code: 'unit-error',
    column,
    printed,
    declared,
    meant: (asked) => ({
      ...asked,
      points: asked.points.map((point) => ({ ...point, observations: point.observations.map(meant) })),
    }),
  };
}

function conditions(
  column: 'mass' | 'pressureAltitude' | 'temperature',
  printed: string,
  declared: string,
  meant: (value: number) => number,
): Slip {
  return {
    code: 'unit-error',
    column,
    printed,
    declared,
    meant: (asked) => ({
      ...asked,
      points: asked.points.map((point) => ({ ...point, [column]: meant(point[column]) })),
    }),
  };
}

/** Every calibrated speed of the configuration, the stall speed with them. */
function speeds(printed: string, declared: string, factor: number): Slip {
  return {
    code: 'stall-speed-unit',
    column: 'speeds',
    printed,
    declared,
    meant: (asked) => ({
      ...asked,
      maximumLift: scaled(asked.maximumLift, factor),
      speedFactor: asked.speedFactor * factor,
    }),
  };
}

function scaled(lift: MaximumLift, factor: number): MaximumLift {
  return lift.kind === 'coefficient' ? lift : { ...lift, cas: lift.cas * factor };
}

/** Ground roll and whole distance in each other's place. */
function swapped(point: FitPoint): FitPoint {
  const other = { groundRoll: 'wholeDistance', wholeDistance: 'groundRoll' } as const;
  return {
    ...point,
    observations: point.observations.map((observation) =>
      observation.kind === 'groundRoll' || observation.kind === 'wholeDistance'
        ? { ...observation, kind: other[observation.kind] }
        : observation,
    ),
  };
}
