import type { Configuration } from '../../performance/aeroplane.ts';
import type { TakeoffQuestion } from '../question.ts';

/** What a procedure makes of a takeoff. */
export interface FlownTakeoff {
  /** 1 at full power */
  readonly fullPowerRatio: number;
  /** added to the ground roll [m]; 0 from standing */
  readonly rollingStartAllowance: number;
}

/** The figures behind a procedure without a fault. */
export function flownTakeoff(
  { aeroplane, procedure }: Pick<TakeoffQuestion, 'aeroplane' | 'procedure'>,
  configuration: Configuration,
): FlownTakeoff {
  const setting = procedure?.power === undefined ? undefined : aeroplane.propulsion.powerSettings?.[procedure.power];
  return {
    fullPowerRatio: setting?.fullPowerRatio ?? 1,
    rollingStartAllowance: procedure?.start === 'rolling' ? (configuration.rollingStartAllowance ?? 0) : 0,
  };
}
