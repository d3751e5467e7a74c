import { z } from 'zod';
import { approachAngle, shortTime, speedIncrement } from './quantities.ts';
import { id } from './text.ts';

/** How a takeoff is flown; each member only where the aeroplane has data for it. */
export const takeoffProcedure = z
  .strictObject({
    power: id
      .meta({
        description: "One of the propulsion's power settings; absent: full power. Needs propulsion.powerSettings.",
      })
      .exactOptional(),
    start: z
      .enum(['standing', 'rolling'])
      .meta({
        description:
          'From standing at full power, or rolling on to the runway; absent: standing. Rolling needs rollingStartAllowance of the configuration.',
      })
      .exactOptional(),
  })
  .meta({
    id: 'TakeoffProcedure',
    description: 'How the takeoff is flown. Each member only where the aeroplane has data for it.',
  });

/** How a landing is flown; each member only where the aeroplane has data for it. */
export const landingProcedure = z
  .strictObject({
    approachSpeedIncrement: speedIncrement
      .meta({
        description: 'On top of the landing reference speed, calibrated. Needs landingReference of the configuration.',
      })
      .exactOptional(),
    approachAngle: approachAngle
      .meta({
        description:
          "Up to 4 degrees, or up to the configuration's own where that is steeper. Needs approachAngle of the configuration.",
      })
      .exactOptional(),
    reverse: z
      .boolean()
      .meta({ description: 'Whether reverse thrust is used; absent: not. Needs reverseThrust of the aeroplane.' })
      .exactOptional(),
    antiSkid: z
      .enum(['operative', 'inoperative'])
      .meta({ description: 'Absent: as the aeroplane is. Needs brakes.antiSkid.' })
      .exactOptional(),
    reactionTime: shortTime
      .meta({
        description:
          'From touchdown to braking, not shorter than the freeRollTime of the configuration, which it needs.',
      })
      .exactOptional(),
  })
  .meta({
    id: 'LandingProcedure',
    description: 'How the landing is flown. Each member only where the aeroplane has data for it.',
  });

export type TakeoffProcedureOnWire = z.infer<typeof takeoffProcedure>;
export type LandingProcedureOnWire = z.infer<typeof landingProcedure>;
