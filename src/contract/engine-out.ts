import { z } from 'zod';
import { altitude, percent, rateOfClimb, source, speed, speedSet, time } from './answer-parts.ts';
import { bandedDistance, method } from './distances.ts';
import { shownSchema } from './shown-quantity.ts';

const boundBecause = z.enum([
  'minimum-control-speed-on-the-ground',
  'failure-at-standstill',
  'rotation-speed',
  'brake-energy',
  'tyre-speed',
  'takeoff-distance-available',
  'accelerate-stop-distance-available',
  'asked-for',
]);

/** The decision speed and the range it lies in. */
export const decisionSpeed = z
  .strictObject({
    ...speedSet.shape,
    because: z
      .enum([
        'asked-for',
        'balanced',
        'go-longer-throughout',
        'stop-longer-throughout',
        'takeoff-distance-available',
        'accelerate-stop-distance-available',
        'single-engine-cannot-continue',
      ])
      .meta({
        description:
          'Why it is this speed: asked for; stop and go as long as each other; the end of the range at which the longer is shortest; the lowest from which the continued takeoff fits, or the highest from which the stop does; or the highest there is, where the aeroplane cannot go on.',
      }),
    range: z
      .strictObject({
        lowest: speedSet,
        highest: speedSet,
        lowestBecause: boundBecause,
        highestBecause: boundBecause,
      })
      .meta({
        id: 'DecisionRange',
        description:
          'Speeds from which the aeroplane both stops and goes on in the declared distances, and what bounds them; absent where there is none.',
      })
      .exactOptional(),
  })
  .meta({
    id: 'DecisionSpeed',
    description: 'V1 in its kinds, in the wind that the rule set credits.',
  });

const energy = shownSchema('AnsweredEnergy', 'energy', 'An energy.');

const climb = z
  .strictObject({
    phase: z.enum(['lift-off', '400-ft', '1500-ft']),
    height: altitude.meta({ description: 'Above the runway.' }),
    configuration: z.string(),
    speed: speedSet,
    gradient: percent.meta({ description: 'Height over distance in still air.' }),
    rate: rateOfClimb,
    required: percent.meta({ description: 'The least that the rule set asks for there.' }).exactOptional(),
  })
  .meta({ id: 'EngineOutClimb', description: 'The climb on the engines that remain; not a certified gradient.' });

/** What comes of an engine failure. */
export const engineOut = z
  .strictObject({
    outcome: z
      .enum([
        'balanced',
        'go-longer-throughout',
        'stop-longer-throughout',
        'single-engine-cannot-continue',
        'no-decision-speed',
        'never-reaches-decision-speed',
        'never-stops',
        'ground-speed-not-positive',
        'outside-stated-data',
        'no-data-for-this-surface',
      ])
      .meta({
        description:
          'Whether stop and continued takeoff balance at a decision speed, one is longer at all of them, or why they are not compared.',
      }),
    why: z.string().meta({ description: 'Why there is no balanced field.' }).exactOptional(),
    accelerateStopDistance: bandedDistance
      .meta({ description: 'At the decision speed: the longer of the stops with and without a failure.' })
      .exactOptional(),
    accelerateGoDistance: bandedDistance
      .meta({ description: 'At the decision speed: to the screen on the engines that remain.' })
      .exactOptional(),
    balancedFieldLength: bandedDistance
      .meta({ description: 'The greater of the two at the decision speed that makes it least.' })
      .exactOptional(),
    screenHeight: altitude.meta({ description: 'Of the continued takeoff.' }),
    failureSpeed: speed.meta({ description: 'True airspeed at which the engine fails.' }).exactOptional(),
    brakeEnergy: energy.meta({ description: 'Heat of the brakes in the longer stop.' }).exactOptional(),
    liftOff: speedSet.meta({ description: 'Of the continued takeoff.' }),
    screen: speedSet.meta({ description: 'Of the continued takeoff.' }),
    climb: z.array(climb).meta({ description: 'In the order of time; drift-down en route is not computed.' }),
    stopRule: z
      .enum(['transport-current', 'transport-before-1998', 'commuter', 'advisory'])
      .meta({ description: 'By which rule the stop is timed, which follows from the certification basis.' }),
    timeline: z
      .array(
        z
          .strictObject({
            of: z.enum(['recognitionTime', 'timeAtDecisionSpeed', 'continuedAccelerationTime', 'transitionTime']),
            time,
            because: z.string(),
            source,
          })
          .meta({ id: 'Delay', description: 'One delay of a rejected takeoff.' }),
      )
      .meta({ description: 'The delays of the stop in the order of time.' }),
    method: method.meta({ description: 'Always physics: no table of a flight manual is read for an engine failure.' }),
  })
  .meta({
    id: 'EngineFailure',
    description: 'An engine failure in the takeoff, as stated: wind, surface and slope as given, without factors.',
  });

export type EngineOutOnWire = z.infer<typeof engineOut>;
export type DecisionSpeedOnWire = z.infer<typeof decisionSpeed>;
