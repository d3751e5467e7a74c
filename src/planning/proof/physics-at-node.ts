import type { Aeroplane } from '../../performance/aeroplane.ts';
import { fittedForLanding, fittedForTakeoff } from '../../performance/fit/fitted-aeroplane.ts';
import type { ManualOutput, ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import { landing } from '../../performance/landing/landing.ts';
import { takeoff } from '../../performance/takeoff/takeoff.ts';
import { isRefused } from '../fault.ts';
import { type PreparedLanding, prepareLanding } from '../prepare-landing.ts';
import { type PreparedTakeoff, prepareTakeoff } from '../prepare-takeoff.ts';
import { questionAtNode } from './question-at.ts';
import type { TableNode } from './table-node.ts';

/** What physics makes of a row, in SI; a figure that it has none of is absent. */
export type PhysicsFigures = Readonly<Partial<Record<ManualOutput, number>>>;

/** Distances and speeds of one configuration at the conditions of a table. */
export interface TablePhysics {
  readonly method: 'fitted' | 'stated';
  /** undefined where nothing can be computed for such a row */
  readonly at: (node: TableNode) => PhysicsFigures | undefined;
}

/**
 * The physics of the aeroplane as the figures of a table are to be flown: from standing at full power, level, on its surface, to
 * its screen height, in the wind that its figures are worth.
 *
 * @param configuration - id of one
 * @returns undefined for a climb table
 */
export function tablePhysics(
  aeroplane: Aeroplane,
  table: ManualTable,
  configuration: string,
): TablePhysics | undefined {
  if (table.phase === 'climb') return undefined;
  const isTakeoff = table.phase === 'takeoff';
  const fitted = (isTakeoff ? fittedForTakeoff : fittedForLanding)(aeroplane, configuration);
  const flown = fitted ?? aeroplane;
  return {
    method: fitted === undefined ? 'stated' : 'fitted',
    at: (node) => {
      const asked = questionAtNode(flown, table, configuration, node);
      return isTakeoff ? takeoffFigures(prepareTakeoff(asked), table) : landingFigures(prepareLanding(asked), table);
    },
  };
}

function takeoffFigures(
  prepared: ReturnType<typeof prepareTakeoff>,
  { conditions, contains }: ManualTable,
): PhysicsFigures | undefined {
  if (isRefused(prepared)) return undefined;
  const { friction, run, speeds } = prepared as PreparedTakeoff;
  if (friction.actual === undefined) return undefined;
  const result = takeoff({ ...run, screenHeight: conditions.screenHeight ?? run.screenHeight });
  const own = { liftOff: speeds.liftOff.cas, screen: speeds.screen.cas };
  if (result.outcome !== 'reaches-screen') return own;
  return {
    ...own,
    groundRoll: result.groundRoll * contains.factor,
    takeoffDistance: result.takeoffDistance * contains.factor,
  };
}

function landingFigures(
  prepared: ReturnType<typeof prepareLanding>,
  { conditions, contains }: ManualTable,
): PhysicsFigures | undefined {
  if (isRefused(prepared)) return undefined;
  const { braking, run, landingSpeeds } = prepared as PreparedLanding;
  if (braking.actual === undefined) return undefined;
  const result = landing({ ...run, screenHeight: conditions.screenHeight ?? run.screenHeight });
  const own = { landingReference: landingSpeeds.speeds.landingReference.cas };
  if (result.outcome !== 'stops') return own;
  return {
    ...own,
    groundRoll: result.groundRoll * contains.factor,
    landingDistance: result.landingDistance * contains.factor,
  };
}
