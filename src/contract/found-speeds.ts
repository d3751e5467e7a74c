import type { Aeroplane, Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { configuredStallSpeed } from '../performance/speeds/configured-stall-speed.ts';
import { scheduledSpeed } from '../performance/speeds/scheduled-speed.ts';
import { speedSet } from '../performance/speeds/speed-set.ts';
import { aeroplanePointer } from '../planning/aeroplane-pointer.ts';
import type { Assumption, SpeedSet } from '../planning/answer.ts';
import type { Fault, Refused } from '../planning/fault.ts';
import { resolveTakeoff } from '../planning/resolve-takeoff.ts';
import { takeoffSpeeds } from '../planning/takeoff-speeds.ts';

/** Where a configured aeroplane stands in a question, and its mass [kg]. */
export interface Configured {
  readonly aeroplane: Aeroplane;
  readonly aeroplaneAt: string;
  readonly configuration: string;
  readonly mass: number;
}

export interface FoundSpeeds {
  /** in the order of the contract */
  readonly speeds: {
    readonly stall: SpeedSet;
    readonly stallInBank?: SpeedSet;
    readonly rotation?: SpeedSet;
    readonly liftOff?: SpeedSet;
    readonly screen?: SpeedSet;
    readonly landingReference?: SpeedSet;
    readonly touchdown?: SpeedSet;
  };
  readonly assumed: readonly Assumption[];
}

/**
 * Stall speeds and the speeds of the procedure at this mass in this air.
 *
 * Takeoff speeds that the configuration leaves out are filled in as for a takeoff, and said; landing speeds are shown where
 * they are stated.
 *
 * @param loadFactor - of the level turn, where one is asked for
 */
export function foundSpeeds(configured: Configured, air: Air, loadFactor: number | undefined): FoundSpeeds | Refused {
  const { aeroplane, configuration: id, mass } = configured;
  const configuration = aeroplane.configurations[id] as Configuration;
  const stallEas = configuredStallSpeed(configuration.maximumLift, aeroplane.wing.area, mass);
  const inKinds = (eas: number | 'not-subsonic') =>
    eas === 'not-subsonic' ? eas : speedSet(eas, stallEas, air, aeroplane.airspeedCalibration);

  const stall = inKinds(stallEas);
  if (stall === 'not-subsonic') return { refused: [notSubsonic(configured, 'maximumLift')] };
  const stallInBank = loadFactor === undefined ? undefined : inKinds(stallEas * Math.sqrt(loadFactor));
  if (stallInBank === 'not-subsonic') return { refused: [notSubsonic(configured, 'maximumLift')] };

  let takeoff = {};
  const assumed: Assumption[] = [];
  if (configuration.for.includes('takeoff')) {
    const resolved = resolveTakeoff(configured, configuration);
    const speeds = takeoffSpeeds(configured, configuration, resolved, air);
    if ('code' in speeds) return { refused: [speeds] };
    takeoff = { rotation: speeds.rotation, liftOff: speeds.liftOff, screen: speeds.screen };
    assumed.push(...resolved.assumed.map(({ assumption }) => assumption).filter(({ at }) => at.includes('/speeds/')));
  }
  const landing: { landingReference?: SpeedSet; touchdown?: SpeedSet } = {};
  for (const name of ['landingReference', 'touchdown'] as const) {
    const schedule = configuration.for.includes('landing') ? configuration.speeds?.[name] : undefined;
    if (schedule === undefined) continue;
    const speeds = inKinds(scheduledSpeed(schedule, mass, stallEas, air.pressure));
    if (speeds === 'not-subsonic') return { refused: [notSubsonic(configured, `speeds/${name}`)] };
    landing[name] = speeds;
  }
  return { speeds: { stall, ...(stallInBank === undefined ? {} : { stallInBank }), ...takeoff, ...landing }, assumed };
}

function notSubsonic({ aeroplaneAt, configuration }: Configured, member: string): Fault {
  return {
    pointer: aeroplanePointer(aeroplaneAt, `/configurations/${configuration}/${member}`),
    code: 'implausible',
    message: 'The speed that follows from this is not below that of sound.',
  };
}
