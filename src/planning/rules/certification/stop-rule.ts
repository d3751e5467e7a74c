import type { Aeroplane } from '../../../performance/aeroplane.ts';
import type { StopTimeline } from '../../../performance/engine-failure/engine-failure-run.ts';
import type { ReferenceKey } from '../../../references.ts';

/** One delay of a rejected takeoff. */
export interface Delay {
  readonly of: keyof StopTimeline;
  /** [s] */
  readonly seconds: number;
  readonly because: string;
  readonly source: ReferenceKey;
}

/** By which rule a rejected takeoff is timed. */
export interface StopRule {
  readonly id: 'transport-current' | 'transport-before-1998' | 'commuter' | 'advisory';
  /** how a sentence names it */
  readonly phrase: string;
  /** whether the certification of the aeroplane asks for an accelerate-stop distance at all */
  readonly isRequired: boolean;
  readonly delays: readonly Delay[];
}

function delay(of: keyof StopTimeline, seconds: number, because: string, source: ReferenceKey): Delay {
  return { of, seconds, because, source };
}

const recognised = delay(
  'recognitionTime',
  1,
  'from the failure to the first action, not less than one second',
  'Cfr25s109a',
);
const transition = delay(
  'transitionTime',
  2,
  'at the speed then reached, until brakes, idle and spoilers are all effective; 1 s of a light aeroplane',
  'Judgement',
);

const current: StopRule = {
  id: 'transport-current',
  phrase: '14 CFR 25.109 since amendment 25-92',
  isRequired: true,
  delays: [
    recognised,
    delay('timeAtDecisionSpeed', 2, 'a distance of two seconds at the decision speed, (a)(1)(iv)', 'Cfr25s109a'),
    delay('continuedAccelerationTime', 0, 'none since amendment 25-92', 'Cfr25s109a'),
    transition,
  ],
};

const before1998: StopRule = {
  id: 'transport-before-1998',
  phrase: '14 CFR 25.109 before amendment 25-92',
  isRequired: true,
  delays: [
    recognised,
    delay('timeAtDecisionSpeed', 0, 'none before amendment 25-92', 'Cfr25s109Before1998'),
    delay(
      'continuedAccelerationTime',
      2,
      'two seconds of going on accelerating after the decision speed',
      'Cfr25s109Before1998',
    ),
    transition,
  ],
};

const commuter: StopRule = {
  id: 'commuter',
  phrase: '14 CFR 23.55',
  isRequired: true,
  delays: [
    recognised,
    delay('timeAtDecisionSpeed', 0, 'none is asked for', 'Cfr23s55'),
    delay('continuedAccelerationTime', 0, 'none is asked for', 'Cfr23s55'),
    transition,
  ],
};

/** Where no rule asks for a rejected takeoff: the times of a pilot who does not expect it. */
export const advisoryStop: StopRule = {
  id: 'advisory',
  phrase: 'no rule: an advisory figure',
  isRequired: false,
  delays: [
    delay('recognitionTime', 3, 'of a pilot who does not expect it; 2 s to 3 s are published', 'KrenkelSalzman1968'),
    delay('timeAtDecisionSpeed', 0, 'none', 'Judgement'),
    delay('continuedAccelerationTime', 0, 'none', 'Judgement'),
    { ...transition, seconds: 1, because: 'at the speed then reached, until brakes and idle are both effective' },
  ],
};

/**
 * The rule for a rejected takeoff that follows from the certification basis; for singles and light twins there is none, and the
 * figures are advisory.
 *
 * @see references.Cfr25s109a; references.Cfr23s55
 */
export function stopRuleOf({ certification: { basis, stopRule } }: Pick<Aeroplane, 'certification'>): StopRule {
  if (basis === 'cs-25') return stopRule === 'before-1998' ? before1998 : current;
  return basis === 'cs-23-commuter' ? commuter : advisoryStop;
}

/** The delays of a rule as performance takes them [s]. */
export function timelineOf({ delays }: Pick<StopRule, 'delays'>): StopTimeline {
  const seconds = (of: keyof StopTimeline) => delays.find((one) => one.of === of)?.seconds ?? 0;
  return {
    recognitionTime: seconds('recognitionTime'),
    timeAtDecisionSpeed: seconds('timeAtDecisionSpeed'),
    continuedAccelerationTime: seconds('continuedAccelerationTime'),
    transitionTime: seconds('transitionTime'),
  };
}
