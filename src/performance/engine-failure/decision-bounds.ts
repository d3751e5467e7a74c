import { brent } from '../../numerics/brent.ts';
import { type OutsideStatedData, outsideStatedData } from '../takeoff/outside-stated-data.ts';
import { accelerateStop } from './accelerate-stop.ts';
import type { DecisionBound, DecisionBounds, EngineFailureRun } from './engine-failure-run.ts';
import { standstillDecisionSpeed } from './standstill-decision-speed.ts';

/** What an aeroplane's data say of its decision speed; nothing is bounded by what is absent. */
export interface DecisionLimits {
  /** V_MCG, true airspeed [m/s] */
  readonly minimumControlSpeedOnGround?: number | undefined;
  /** heat that the brakes take [J] */
  readonly brakeEnergy?: number | undefined;
  /** ground speed [m/s] */
  readonly tyreSpeed?: number | undefined;
}

/** On V1 [m/s]. */
const tolerance = 1e-6;

/**
 * The speeds between which the decision speed lies: from V_MCG, or the V1 of a failure at standstill, up to V_R, the speed from
 * which the brakes still take the heat of the stop, or the tyres' speed.
 *
 * @param run - ground speed is what brakes and tyres feel: airspeed less the headwind
 * @param limits - from the aeroplane's data
 * @returns the bounds, the lowest above the highest where no speed keeps them all; 'outside-stated-data' where the thrust that remains
 * is not known from the beginning of the roll to V_R
 * @see references.Cfr25s107, (a) and (e); references.Cfr25s109a
 */
export function decisionBounds(run: EngineFailureRun, limits: DecisionLimits): DecisionBounds | OutsideStatedData {
  const { headwind, thrust } = run.allEngines;
  const { rotationSpeed } = run;
  if (headwind < rotationSpeed) {
    const outside =
      outsideStatedData(run.remainingThrust, headwind, rotationSpeed) ??
      outsideStatedData(thrust, headwind, rotationSpeed);
    if (outside !== undefined) return outside;
  }
  let lowest: DecisionBound = { speed: standstillDecisionSpeed(run), because: 'failure-at-standstill' };
  const { minimumControlSpeedOnGround: control, brakeEnergy, tyreSpeed } = limits;
  if (control !== undefined && control > lowest.speed) {
    lowest = { speed: control, because: 'minimum-control-speed-on-the-ground' };
  }
  let highest: DecisionBound = { speed: rotationSpeed, because: 'rotation-speed' };
  if (tyreSpeed !== undefined && tyreSpeed + headwind < highest.speed) {
    highest = { speed: tyreSpeed + headwind, because: 'tyre-speed' };
  }
  const heated = brakeEnergy === undefined ? undefined : brakeEnergySpeed(run, brakeEnergy, highest.speed);
  if (heated !== undefined) highest = { speed: heated, because: 'brake-energy' };
  return { lowest, highest };
}

/** V_MBE, where it lies below a speed that all engines reach; undefined where it does not. */
function brakeEnergySpeed(run: EngineFailureRun, limit: number, below: number): number | undefined {
  const { headwind } = run.allEngines;
  if (!(below > headwind)) return undefined;
  const stop = accelerateStop(run, below);
  if (stop.outcome === 'never-reaches-decision-speed') return undefined;
  const excess = (speed: number) => {
    if (speed === headwind) return -limit;
    const { outcome, ...found } = speed === below ? stop : accelerateStop(run, speed);
    // from where it never stops the brakes take heat without end
    return 'brakeEnergy' in found ? found.brakeEnergy - limit : limit;
  };
  const found = brent(excess, headwind, below, tolerance);
  return found.outcome === 'root' ? found.root : undefined;
}
