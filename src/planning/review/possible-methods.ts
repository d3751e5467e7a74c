import { T0 } from '../../physics/constants.ts';
import type { Method } from '../answer.ts';
import { isRefused } from '../fault.ts';
import { prepareLanding } from '../prepare-landing.ts';
import { prepareTakeoff } from '../prepare-takeoff.ts';
import { askedAeroplaneAt, questionAt } from '../proof/question-at.ts';
import { configurationsOf, type Reviewed, wholeDistanceOf } from './review-context.ts';

/** What a method lacks, and where it would stand in the definition. */
export interface MissingFor {
  readonly at: string;
  readonly message: string;
}

/** Whether a method has what it needs. */
export interface PossibleMethod {
  readonly method: Method;
  readonly possible: boolean;
  /** ids of the sheets that it reads or would be fitted to */
  readonly sheets: readonly string[];
  readonly missing: readonly MissingFor[];
  /** pointers of what it takes because the definition leaves it out */
  readonly assumed: readonly string[];
}

/** The methods of one configuration in one phase. */
export interface ConfigurationMethods {
  readonly configuration: string;
  readonly phase: 'takeoff' | 'landing';
  readonly methods: readonly PossibleMethod[];
}

/**
 * Which methods a definition has what it needs for, per configuration and phase.
 *
 * @param faulty - ids of configurations, or 'all', where a fault leaves physics nothing to go by
 */
export function possibleMethods(reviewed: Reviewed, faulty: ReadonlySet<string>): ConfigurationMethods[] {
  return (['takeoff', 'landing'] as const).flatMap((phase) =>
    configurationsOf(reviewed, phase).map(({ id, at }) => {
      const isFaulty = faulty.has('all') || faulty.has(id);
      return {
        configuration: id,
        phase,
        methods: [
          byManual(reviewed, phase, id),
          byFit(reviewed, phase, id, isFaulty),
          byStatement(reviewed, phase, id, isFaulty),
          byGeometry(at),
        ],
      };
    }),
  );
}

function byManual(reviewed: Reviewed, phase: 'takeoff' | 'landing', id: string): PossibleMethod {
  const sheets = sheetsOf(reviewed, phase, id);
  const gives = (output: string) => sheets.some(({ outputs }) => outputs.some((one) => one === output));
  const missing: MissingFor[] = [];
  const at = '/flightManual/tables';
  if (sheets.length === 0) {
    missing.push({ at, message: `No table or graph is for ${phase} in ${id}.` });
  } else {
    const whole = wholeDistanceOf(phase);
    if (!gives('groundRoll'))
      missing.push({ at, message: 'No sheet gives groundRoll: physics shares the distance out.' });
    if (!gives(whole)) missing.push({ at, message: `No sheet gives ${whole}: physics adds the distance in the air.` });
  }
  return {
    method: 'flight-manual',
    possible: sheets.length > 0,
    sheets: sheets.map((sheet) => sheet.id),
    missing,
    assumed: [],
  };
}

function byFit(reviewed: Reviewed, phase: 'takeoff' | 'landing', id: string, isFaulty: boolean): PossibleMethod {
  const isFitted = reviewed.aeroplane.fit?.[phase]?.[id] !== undefined;
  const tables = reviewed.tables.flatMap(({ table }) =>
    table.phase === phase && table.configurations.includes(id) ? [table.id] : [],
  );
  const message =
    tables.length === 0
      ? `There is no fit, and no table for ${phase} in ${id} that it could be made from.`
      : `There is no fit; POST /v1/aeroplanes/fit makes one from ${tables.join(', ')}.`;
  return {
    method: 'fitted',
    possible: isFitted && !isFaulty,
    sheets: tables,
    missing: isFitted ? [] : [{ at: `/fit/${phase}/${id}`, message }],
    assumed: [],
  };
}

function byStatement(
  { aeroplane }: Reviewed,
  phase: 'takeoff' | 'landing',
  id: string,
  isFaulty: boolean,
): PossibleMethod {
  const none = { method: 'stated', possible: false, sheets: [], assumed: [] } as const;
  if (isFaulty) {
    return { ...none, missing: [{ at: '', message: 'A fault of the definition leaves physics nothing to go by.' }] };
  }
  const asked = questionAt(aeroplane, id, {
    mass: (phase === 'landing' ? aeroplane.masses.maximumLanding : undefined) ?? aeroplane.masses.maximumTakeoff,
    pressureAltitude: 0,
    temperature: T0,
    headwind: 0,
    surface: { kind: 'paved', state: 'dry' },
  });
  const prepared = phase === 'takeoff' ? prepareTakeoff(asked) : prepareLanding(asked);
  if (isRefused(prepared)) {
    return {
      ...none,
      missing: prepared.refused.map(({ pointer, message }) => ({ at: inDefinition(pointer), message })),
    };
  }
  const assumed = [...prepared.resolved.assumed, ...prepared.power.assumed].map(({ assumption }) =>
    inDefinition(assumption.at),
  );
  return { method: 'stated', possible: true, sheets: [], missing: [], assumed: [...new Set(assumed)] };
}

function byGeometry(at: string): PossibleMethod {
  return {
    method: 'geometry',
    possible: false,
    sheets: [],
    missing: [
      {
        at: `${at}/maximumLift`,
        message:
          'Maximum lift is not computed from the geometry of the wing; the stall speed or the coefficient is taken.',
      },
    ],
    assumed: [],
  };
}

function sheetsOf({ tables, graphs }: Reviewed, phase: 'takeoff' | 'landing', id: string) {
  return [...tables.map(({ table }) => table), ...graphs.map(({ graph }) => graph)].filter(
    (sheet) => sheet.phase === phase && sheet.configurations.includes(id),
  );
}

function inDefinition(pointer: string): string {
  return pointer.startsWith(askedAeroplaneAt) ? pointer.slice(askedAeroplaneAt.length) : pointer;
}
