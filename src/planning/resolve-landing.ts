import type { Aeroplane, Configuration, ScheduledSpeed } from '../performance/aeroplane.ts';
import type { LandingRun } from '../performance/landing/landing-run.ts';
import type { Assumed, NumberOtherEnd } from './assumed.ts';
import { ConfigurationFigures } from './configuration-figures.ts';
import { groundFigures } from './ground-figures.ts';
import type { LandingQuestion } from './question.ts';
import { referenceSpeedRules } from './rules/certification/reference-speed.ts';
import { idleThrustShare, landingDefaults } from './rules/landing-defaults.ts';
import { measureText } from './sentences/measure-text.ts';

/** How to put the other end of an assumption of a landing into a run. */
export type LandingOtherEnd =
  | NumberOtherEnd<LandingRun>
  | {
      /** idle thrust in the roll [N] */
      readonly kind: 'idle-thrust';
      readonly value: number;
      readonly text: string;
    }
  | {
      readonly kind: 'braking-friction';
      readonly factor: number;
      readonly text: string;
    };

export type LandingAssumed = Assumed<LandingOtherEnd>;

/** A landing configuration with nothing left out, and the procedure, in SI. */
export interface ResolvedLanding {
  /** undefined: the speed of the certification basis */
  readonly landingReference: ScheduledSpeed | undefined;
  readonly touchdown: ScheduledSpeed;
  /** CAS on top of the landing reference speed [m/s] */
  readonly approachSpeedIncrement: number;
  readonly approachAngle: number;
  readonly flareLoadFactor: number;
  /** undefined: the flare was fitted, and the arc alone is the air distance */
  readonly floatDecelerationRatio: number | undefined;
  readonly freeRollTime: number;
  /** of the whole aeroplane [N] */
  readonly idleThrust: number;
  readonly groundLiftCoefficient: number;
  readonly groundDragIncrement: number;
  readonly airDragIncrement: number;
  readonly assumed: readonly LandingAssumed[];
}

/**
 * Fills in what a configuration and the procedure leave out, each as an assumption with where it would be stated and what else
 * it could be.
 *
 * @param question - for the procedure and the pointers
 * @param configuration - of the aeroplane, for landing
 * @param staticThrust - full thrust of the whole aeroplane at rest in this air [N]
 * @see references.Raymer for touchdown, flare and free roll; references.Judgement for the rest
 */
export function resolveLanding(
  question: Pick<LandingQuestion, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'procedure' | 'units'>,
  configuration: Configuration,
  staticThrust: number,
): ResolvedLanding {
  const figures = new ConfigurationFigures<LandingRun>(question);
  const d = landingDefaults;
  const { flap } = configuration;
  const { procedure = {} } = question;
  const resolved = {
    ...speedSchedule(figures, question, configuration),
    approachSpeedIncrement: procedure.approachSpeedIncrement ?? 0,
    approachAngle: figures.figure({
      member: 'approachAngle',
      name: 'the approach angle',
      stated: procedure.approachAngle ?? configuration.approachAngle,
      standing: d.approachAngle,
      runMember: 'approachAngle',
    }),
    flareLoadFactor: figures.figure({
      member: 'flareLoadFactor',
      name: 'the load factor of the flare',
      stated: configuration.flareLoadFactor,
      standing: d.flareLoadFactor,
      runMember: 'flareLoadFactor',
    }),
    floatDecelerationRatio: configuration.flareFitted
      ? undefined
      : figures.figure({
          member: 'floatDecelerationRatio',
          name: 'the deceleration while floating',
          stated: configuration.floatDecelerationRatio,
          standing: d.floatDecelerationRatio,
          runMember: 'floatDecelerationRatio',
        }),
    freeRollTime: figures.figure({
      member: 'freeRollTime',
      name: 'the time from touchdown to braking',
      stated: procedure.reactionTime ?? configuration.freeRollTime,
      standing: d.freeRollTime,
      runMember: 'freeRollTime',
    }),
    ...groundFigures(figures, configuration, flap > 0 ? d.groundLiftFlap : d.groundLiftClean, d.groundDragIncrement),
    airDragIncrement: figures.figure({
      member: 'airDragIncrementCoefficient',
      name: 'the drag increment in the air',
      stated: configuration.airDragIncrementCoefficient,
      standing: flap > 0 ? d.airDragFlap : d.airDragClean,
    }),
  };
  const idle = configuration.idleThrust;
  const assumed: LandingAssumed[] = figures.assumed;
  if (idle === undefined) assumed.push(assumedIdle(figures.at('idleThrust'), staticThrust, question.units));
  return { ...resolved, idleThrust: idle ?? idleThrustShare.value * staticThrust, assumed };
}

/** The speeds of a landing configuration, with what was filled in; no more of the landing. */
export function resolveLandingSpeeds(
  question: Pick<LandingQuestion, 'aeroplane' | 'aeroplaneAt' | 'configuration'>,
  configuration: Configuration,
): Pick<ResolvedLanding, 'landingReference' | 'touchdown' | 'approachSpeedIncrement' | 'assumed'> {
  const figures = new ConfigurationFigures<LandingRun>(question);
  const schedule = speedSchedule(figures, question, configuration);
  return { ...schedule, approachSpeedIncrement: 0, assumed: figures.assumed };
}

function speedSchedule(
  figures: ConfigurationFigures<LandingRun>,
  { aeroplane }: Pick<LandingQuestion, 'aeroplane'>,
  { speeds }: Configuration,
): Pick<ResolvedLanding, 'landingReference' | 'touchdown'> {
  if (speeds?.landingReference === undefined) sayReference(figures, aeroplane);
  const touchdown = figures.speed({
    member: 'touchdown',
    name: 'the touchdown speed over the stall speed',
    stated: speeds?.touchdown,
    standing: landingDefaults.touchdownStallRatio,
    runMember: 'touchdownSpeed',
  });
  return { landingReference: speeds?.landingReference, touchdown };
}

function sayReference(figures: ConfigurationFigures<LandingRun>, { certification }: Aeroplane): void {
  const { phrase, stallRatio, source } = referenceSpeedRules[certification.basis];
  figures.say(
    'the landing reference speed over the stall speed',
    {
      at: figures.at('speeds/landingReference'),
      value: stallRatio,
      because: `no landing reference speed is stated; ${phrase}`,
      source,
    },
    {
      kind: 'speed',
      member: 'referenceSpeed',
      factor: (stallRatio + 0.1) / stallRatio,
      text: String(Math.round((stallRatio + 0.1) * 100) / 100),
    },
  );
}

function assumedIdle(at: string, staticThrust: number, units: LandingQuestion['units']): LandingAssumed {
  const { value, otherEnd, because, source } = idleThrustShare;
  return {
    name: 'the idle thrust',
    assumption: { at, value: { kind: 'force', value: value * staticThrust }, because, source },
    otherEnd: {
      kind: 'idle-thrust',
      value: otherEnd * staticThrust,
      text: measureText(units, 'force', otherEnd * staticThrust),
    },
  };
}
