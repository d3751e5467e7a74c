import { z } from 'zod';
import { maximumLift, scheduledSpeed } from './lift.ts';
import { approachAngle, climbHeight, flapAngle, idleThrust, runwayLength, shortTime } from './quantities.ts';

const dragIncrement = z.number().min(-0.05).max(0.5);
const loadFactor = z.number().min(1.01).max(2);

/** One setting of flap and gear with its lift, drag and speeds. */
export const configuration = z
  .strictObject({
    for: z
      .array(z.enum(['takeoff', 'landing']))
      .min(1)
      .max(2)
      .meta({ description: 'What the setting is used for.' }),
    flap: flapAngle,
    maximumLift,
    groundDragIncrementCoefficient: dragIncrement
      .meta({ description: 'Drag coefficient of flap and gear on the ground, added to the zero-lift coefficient.' })
      .exactOptional(),
    airDragIncrementCoefficient: dragIncrement
      .meta({ description: 'Drag coefficient of flap and gear in the air, added to the zero-lift coefficient.' })
      .exactOptional(),
    groundLiftCoefficient: z
      .number()
      .min(-0.5)
      .max(2.5)
      .meta({ description: 'Lift coefficient in the attitude of the roll.' })
      .exactOptional(),
    speeds: z
      .strictObject({
        rotation: scheduledSpeed.exactOptional(),
        liftOff: scheduledSpeed.exactOptional(),
        screen: scheduledSpeed.exactOptional(),
        engineOutLiftOff: scheduledSpeed.exactOptional(),
        engineOutScreen: scheduledSpeed.exactOptional(),
        landingReference: scheduledSpeed.exactOptional(),
        touchdown: scheduledSpeed.exactOptional(),
      })
      .meta({
        id: 'ScheduledSpeeds',
        description:
          'The speeds of the procedure in this configuration; engineOut: of a takeoff continued after an engine failure.',
      })
      .exactOptional(),
    climbOut: z
      .array(
        z
          .strictObject({ from: climbHeight, airDragIncrementCoefficient: dragIncrement })
          .meta({ id: 'ClimbOutChange', description: 'Drag increment in the air from a height above the runway on.' }),
      )
      .min(1)
      .max(4)
      .meta({ description: 'How gear and flap come up after the screen, in rising order of height.' })
      .exactOptional(),
    rotationTime: shortTime.meta({ description: 'From rotation to lift-off.' }).exactOptional(),
    pullUpLoadFactor: loadFactor.meta({ description: 'Load factor in the arc after lift-off.' }).exactOptional(),
    rollingStartAllowance: runwayLength
      .meta({
        description: 'What a rolling start takes over one from standing at full power, added to the ground roll.',
      })
      .exactOptional(),
    approachAngle: approachAngle.exactOptional(),
    flareLoadFactor: loadFactor.meta({ description: 'Load factor in the flare.' }).exactOptional(),
    floatDecelerationRatio: z
      .number()
      .min(0.03)
      .max(0.5)
      .meta({ description: 'Drag less thrust over weight while floating, in the landing configuration.' })
      .exactOptional(),
    freeRollTime: shortTime.meta({ description: 'From touchdown to braking.' }).exactOptional(),
    idleThrust: idleThrust.exactOptional(),
  })
  .meta({ id: 'Configuration', description: 'One setting of flap and gear with its lift, drag and speeds.' });

export type ConfigurationOnWire = z.infer<typeof configuration>;
