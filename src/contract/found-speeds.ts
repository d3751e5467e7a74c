import type { Aeroplane, Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import type { Assumption, SpeedSet } from '../planning/answer.ts';
import { isFault } from '../planning/chosen.ts';
import { ConfiguredSpeeds } from '../planning/configured-speeds.ts';
import type { Refused } from '../planning/fault.ts';
import { type LandingSpeeds, landingSpeeds } from '../planning/landing-speeds.ts';
import { resolveLandingSpeeds } from '../planning/resolve-landing.ts';
import { resolveTakeoff } from '../planning/resolve-takeoff.ts';
import { type RaisedSpeed, takeoffSpeeds } from '../planning/takeoff-speeds.ts';

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
  /** takeoff speeds that the certification basis has raised */
  readonly raised: readonly RaisedSpeed[];
  /** of a landing configuration: whether its reference speed was raised */
  readonly landing?: LandingSpeeds;
  readonly assumed: readonly Assumption[];
}

/**
 * Stall speeds and the speeds of the procedure at this mass in this air.
 *
 * Speeds that the configuration leaves out are filled in as for a takeoff and a landing, and said.
 *
 * @param loadFactor - of the level turn, where one is asked for
 */
export function foundSpeeds(configured: Configured, air: Air, loadFactor: number | undefined): FoundSpeeds | Refused {
  const { aeroplane, configuration: id } = configured;
  const configuration = aeroplane.configurations[id] as Configuration;
  const all = new ConfiguredSpeeds(configured, configuration, air);
  const stall = all.stall();
  if (isFault(stall)) return { refused: [stall] };
  const stallInBank =
    loadFactor === undefined ? undefined : all.inKinds(all.stallEas * Math.sqrt(loadFactor), all.at('maximumLift'));
  if (stallInBank !== undefined && isFault(stallInBank)) return { refused: [stallInBank] };

  let takeoff = {};
  const raised: RaisedSpeed[] = [];
  const assumed: Assumption[] = [];
  if (configuration.for.includes('takeoff')) {
    const resolved = resolveTakeoff(configured, configuration);
    const found = takeoffSpeeds(configured, configuration, resolved, air);
    if (isFault(found)) return { refused: [found] };
    const { speeds } = found;
    raised.push(...found.raised);
    takeoff = { rotation: speeds.rotation, liftOff: speeds.liftOff, screen: speeds.screen };
    assumed.push(...resolved.assumed.map(({ assumption }) => assumption).filter(({ at }) => at.includes('/speeds/')));
  }
  const spoken = { stall, ...(stallInBank === undefined ? {} : { stallInBank }), ...takeoff };
  if (!configuration.for.includes('landing')) return { speeds: spoken, raised, assumed };
  const resolved = resolveLandingSpeeds(configured, configuration);
  const landing = landingSpeeds(configured, configuration, resolved, air);
  if (isFault(landing)) return { refused: [landing] };
  const { landingReference, touchdown } = landing.speeds;
  return {
    speeds: { ...spoken, landingReference, touchdown },
    raised,
    landing,
    assumed: [...assumed, ...resolved.assumed.map(({ assumption }) => assumption)],
  };
}
