import type { Configuration, ScheduledSpeed } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { configuredStallSpeed } from '../performance/speeds/configured-stall-speed.ts';
import { scheduledSpeed } from '../performance/speeds/scheduled-speed.ts';
import { speedSet } from '../performance/speeds/speed-set.ts';
import { configurationPointer } from './aeroplane-pointer.ts';
import type { SpeedSet } from './answer.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';

/** The speeds of one configuration at one mass in one state of the air. */
export class ConfiguredSpeeds {
  /** 1-g stall speed [m/s] */
  readonly stallEas: number;
  readonly #question: Pick<Question, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'mass'>;
  readonly #air: Air;

  constructor(
    question: Pick<Question, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'mass'>,
    { maximumLift }: Configuration,
    air: Air,
  ) {
    this.stallEas = configuredStallSpeed(maximumLift, question.aeroplane.wing.area, question.mass);
    this.#question = question;
    this.#air = air;
  }

  /** Pointer to a member of the configuration. */
  at(member: string): string {
    return configurationPointer(this.#question, member);
  }

  /** The stall speed in all its kinds. */
  stall(): SpeedSet | Fault {
    return this.inKinds(this.stallEas, this.at('maximumLift'));
  }

  /** A speed of the procedure in all its kinds. */
  scheduled(schedule: ScheduledSpeed, member: string): SpeedSet | Fault {
    const eas = scheduledSpeed(schedule, this.#question.mass, this.stallEas, this.#air.pressure);
    return this.inKinds(eas, this.at(`speeds/${member}`));
  }

  /** A true airspeed [m/s] in all its kinds. */
  ofTrue(tas: number): SpeedSet | Fault {
    return this.inKinds(tas * Math.sqrt(this.#air.densityRatio), this.at('speeds'));
  }

  /**
   * An equivalent airspeed [m/s] in all its kinds.
   *
   * @param pointer - of what it comes from, for the fault where it is not below that of sound
   */
  inKinds(eas: number | 'not-subsonic', pointer: string): SpeedSet | Fault {
    const set =
      eas === 'not-subsonic'
        ? eas
        : speedSet(eas, this.stallEas, this.#air, this.#question.aeroplane.airspeedCalibration);
    if (set !== 'not-subsonic') return set;
    return { pointer, code: 'implausible', message: 'The speed that follows from this is not below that of sound.' };
  }
}

/** A ratio of speeds as a fault writes it. */
export function ratioText(ratio: number): string {
  return String(Math.round(ratio * 1000) / 1000);
}
