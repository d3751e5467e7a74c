import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { Surface } from '../question.ts';
import { isCommuter, isJet, isTransport, isTurboprop } from './named-aeroplanes.ts';
import type { StandingDefault } from './standing-default.ts';

const ft = 0.3048;

type DeadEngine = 'jet' | 'feathered' | 'stopped' | 'windmilling';

/**
 * Drag coefficient that a dead engine and the rudder add, where none is stated: class figures for a light twin.
 *
 * @see references.HouseEngineOutDrag
 */
export const engineOutDrag: Readonly<Record<DeadEngine, StandingDefault>> = {
  jet: {
    value: 0.006,
    otherEnd: 0.01,
    because: 'not stated; 0.003 to 0.010 is usual of a windmilling jet and the rudder',
    source: 'HouseEngineOutDrag',
  },
  feathered: {
    value: 0.008,
    otherEnd: 0.015,
    because: 'not stated; 0.005 to 0.015 is usual with the propeller feathered',
    source: 'HouseEngineOutDrag',
  },
  stopped: {
    value: 0.022,
    otherEnd: 0.03,
    because: 'not stated; 0.015 to 0.030 is usual with the propeller stopped and not feathered',
    source: 'HouseEngineOutDrag',
  },
  windmilling: {
    value: 0.035,
    otherEnd: 0.05,
    because: 'not stated; 0.020 to 0.050 is usual with the propeller windmilling',
    source: 'HouseEngineOutDrag',
  },
};

/** The state of the dead engine's propeller where none is stated: the one that drags most. */
export const propellerTaken = {
  value: 'windmilling',
  because: 'not stated; the one of the three states that drags most',
  source: 'Judgement',
} as const;

/** What the dead engine's drag is looked up by. */
export function deadEngine(aeroplane: Aeroplane): DeadEngine {
  if (isJet(aeroplane)) return 'jet';
  return aeroplane.engineOut?.propeller ?? propellerTaken.value;
}

/** Lift-off of the continued takeoff below the speed at its screen, CAS [m/s]: 3 kt. @see references.Judgement */
export const liftOffBelowScreen = (3 * 1852) / 3600;

/** Lift coefficient of the roll that spoilers leave, as a share. @see references.Judgement */
export const liftLeftBySpoilers = 0.2;

/**
 * Screen of a takeoff continued after an engine failure [m]: 35 ft, transport on a wet runway 15 ft, and that of the certification
 * for an aeroplane of neither the transport nor the commuter category.
 *
 * @see references.Cfr25s113; references.Cfr23s59
 */
export function engineOutScreen(aeroplane: Aeroplane, { kind, state }: Surface): number {
  if (isTransport(aeroplane)) return kind === 'paved' && (state === 'wet' || state === 'damp') ? 15 * ft : 35 * ft;
  return isCommuter(aeroplane) ? 35 * ft : aeroplane.certification.screenHeight;
}

/**
 * Greatest continuous power over that of takeoff, where a climb is asked for with it; turbines have such a limit, pistons seldom.
 *
 * @see references.Judgement
 */
export function continuousPower(aeroplane: Aeroplane): number {
  if (isJet(aeroplane)) return 0.93;
  return isTurboprop(aeroplane) ? 0.95 : 1;
}
