import { z } from 'zod';
import { assumption, speed, speedSet, time } from './answer-parts.ts';
import { shownSchema } from './shown-quantity.ts';

const length = shownSchema('RejectedLength', 'distance', 'A length from brake release.');

const lastCue = z
  .strictObject({
    outcome: z
      .enum([
        'last-point',
        'rotation-speed',
        'does-not-stop-within',
        'never-stops',
        'ground-speed-not-positive',
        'outside-stated-data',
        'no-data-for-this-surface',
        'never-reaches-lift-off-speed',
      ])
      .meta({
        description:
          'last-point: up to there it stops within the length; rotation-speed: it does from there too; else why there is no such point.',
      }),
    why: z.string().exactOptional(),
    speed: speedSet.meta({ description: 'At the cue.' }).exactOptional(),
    groundSpeed: speed.meta({ description: 'At the cue.' }).exactOptional(),
    distance: length.meta({ description: 'To the cue.' }).exactOptional(),
    stopDistance: length.meta({ description: 'To the stop.' }).exactOptional(),
    shortest: length.meta({ description: 'The shortest stop that there is.' }).exactOptional(),
  })
  .meta({ id: 'LastCue', description: 'The last cue to stop from which the aeroplane stands within the length.' });

/** The rejected takeoff of any aeroplane. */
export const rejected = z
  .strictObject({
    within: z
      .strictObject({ of: z.enum(['asda', 'tora']), available: length })
      .meta({
        id: 'StopWithin',
        description: 'What the stop has to fit in: ASDA, else TORA; absent where neither is declared.',
      })
      .exactOptional(),
    reactionTime: time.meta({ description: 'From the cue to the first action.' }),
    transitionTime: time.meta({ description: 'At the speed then reached, until brakes and idle are effective.' }),
    lossOfPower: lastCue.meta({ description: 'The engines are idle from the cue on.' }),
    powerHolds: lastCue.meta({ description: 'The engines go on at full thrust until the first action.' }),
    expected: z
      .array(
        z
          .strictObject({ distance: length, speed: speedSet, groundSpeed: speed })
          .meta({ id: 'ExpectedSpeed', description: 'With all engines, as stated.' }),
      )
      .meta({ description: 'The speed to expect at each quarter of TORA before lift-off.' }),
    assumed: z.array(assumption).meta({ description: 'What the stop rests on and nobody stated.' }),
  })
  .meta({
    id: 'RejectedTakeoff',
    description:
      'From where a takeoff still stops, advisory: wind, surface and slope as given, no factor, no reverse thrust.',
  });

export type RejectedOnWire = z.infer<typeof rejected>;
