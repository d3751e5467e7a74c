import type { Configuration } from '../../performance/aeroplane.ts';
import type { FitPoint, ObservationKind } from '../../performance/fit/fit-point.ts';
import { manualPoints } from '../../performance/fit/manual-points.ts';
import type { ManualAxis } from '../../performance/flight-manual/flight-manual.ts';
import { rollingFriction } from '../../physics/friction.ts';
import type { Fault } from '../fault.ts';
import type { Surface } from '../question.ts';
import { groundText } from '../resolve-friction.ts';
import { landingScreenHeight } from '../rules/landing-defaults.ts';
import type { FitQuestion } from './fit-question.ts';

/** Where a point comes from. */
export interface Origin {
  /** 'row 6 of table tk-1', 'run 2' */
  readonly name: string;
  readonly at: string;
  /** pointer to a distance or a condition of it */
  readonly of: (member: ObservationKind | ManualAxis, index: number) => string;
  /** table and row from 0, or the number of the run */
  readonly table?: string;
  readonly row: number;
}

export interface FitPoints {
  readonly points: readonly FitPoint[];
  /** by the points' own row numbers */
  readonly origins: readonly Origin[];
}

/** Rows and runs at most: what one answer can hold. */
export const mostFitted = 600;

/** Rows of the tables and runs as points of a fit, or the faults that keep them from it. */
export function fitPoints(question: FitQuestion, { flap }: Configuration): FitPoints | Fault[] {
  const { tables, runs, phase, aeroplane } = question;
  const jet = aeroplane.propulsion.kind === 'jet';
  const screenHeight = phase === 'takeoff' ? aeroplane.certification.screenHeight : landingScreenHeight;
  const points: FitPoint[] = [];
  const origins: Origin[] = [];
  const faults: Fault[] = [];

  for (const { table, at } of tables) {
    const { conditions, outputs } = table;
    const friction = frictionOn(conditions.surface);
    if (friction === undefined) {
      faults.push(noFriction(at(0), conditions.surface));
      continue;
    }
    const own = conditions.screenHeight;
    const higher = own !== undefined && own > screenHeight + 1e-6;
    if (higher || (phase === 'landing' && own !== undefined && own < screenHeight - 1e-6)) {
      faults.push({
        pointer: at(0),
        code: 'contradiction',
        message: `Table ${table.id} is for another screen height than the ${phase} of this aeroplane.`,
        allowed: phase === 'takeoff' ? 'the height of the certification, or a lower one' : 'a screen of 50 ft',
      });
      continue;
    }
    const wholes = outputs.find((output) => output === 'takeoffDistance' || output === 'landingDistance');
    const first = origins.length;
    points.push(...manualPoints(table, { flap, rollingFriction: friction, screenHeight }, first));
    table.nodes.forEach((_, row) => {
      origins.push({
        name: `row ${row + 1} of table ${table.id}`,
        at: at(row),
        of: (member) =>
          at(
            row,
            member === 'wholeDistance' || member === 'height' ? wholes : member === 'marker' ? undefined : member,
          ),
        table: table.id,
        row,
      });
    });
  }

  for (const [row, { at, observations, surface, ...conditions }] of runs.entries()) {
    const friction = frictionOn(surface);
    if (friction === undefined) {
      faults.push(noFriction(`${at}/surface`, surface));
      continue;
    }
    const { mass, pressureAltitude, temperature, headwind, slope } = conditions;
    points.push({
      row: origins.length,
      mass,
      pressureAltitude,
      temperature,
      headwind,
      slope,
      rollingFriction: friction,
      observations: observations.map(({ observation }) => observation),
    });
    origins.push({
      name: `run ${row + 1}`,
      at,
      of: (member, index) =>
        observations.filter(({ observation }) => observation.kind === member)[index]?.at ?? `${at}/${member}`,
      row,
    });
  }
  if (points.length > mostFitted) {
    faults.push({
      pointer: tables.length > 0 ? (tables[0]?.at(0) ?? '') : '/runs',
      code: 'out-of-range',
      message: `There are ${points.length} rows and runs to fit.`,
      received: points.length,
      allowed: `at most ${mostFitted}`,
    });
  }
  return faults.length > 0 ? faults : { points, origins };

  /** The wheels roll freely on takeoff alone. */
  function frictionOn(surface: Surface): number | undefined {
    if (phase === 'landing') return 0;
    const known = rollingFriction(surface, jet);
    return surface.rollingFrictionCoefficient ?? (known === 'no-data' ? undefined : known.coefficient);
  }
}

function noFriction(pointer: string, surface: Surface): Fault {
  return {
    pointer,
    code: 'contradiction',
    message: `Physics does not speak of this surface (${groundText(surface)}): nothing can be fitted to a roll on it.`,
    allowed: 'distances on pavement or another firm surface',
  };
}
