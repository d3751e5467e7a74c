import { z } from 'zod';
import { altitude, percent, speed } from './answer-parts.ts';
import { shownSchema } from './shown-quantity.ts';

const length = shownSchema('AnsweredLength', 'distance', 'A length along the ground.');

const cleared = z
  .strictObject({
    distance: length,
    height: altitude,
    pathHeight: altitude.meta({
      description:
        'Of the path there, from where the height of the obstacle is measured; before the path begins, of the ground.',
    }),
    clearance: altitude.meta({ description: 'Path less obstacle.' }),
  })
  .meta({ id: 'ClearedObstacle', description: 'One obstacle and the path above it.' });

/** The path past the obstacles of the question, or why there is none. */
export const obstaclePath = z
  .discriminatedUnion('outcome', [
    z.strictObject({
      outcome: z.literal('climbs'),
      begins: length.meta({ description: 'Where the path begins at the screen height, from brake release.' }),
      because: z.string().meta({ description: 'What that distance is.' }),
      obstacles: z.array(cleared).meta({ description: 'In the order of the question.' }),
      critical: z.number().meta({ description: 'Place of the one with the least clearance, from 0.' }),
    }),
    z.strictObject({
      outcome: z.literal('does-not-climb'),
      atHeight: altitude,
      gradient: percent,
    }),
    z.strictObject({
      outcome: z.literal('outside-stated-data'),
      airspeed: speed.meta({ description: 'True airspeed at which the thrust is asked for.' }),
      bound: speed.meta({ description: 'Where its data end.' }),
    }),
  ])
  .meta({
    id: 'ObstaclePath',
    description:
      'Straight ahead at the screen speed, all engines; heights above the runway where distances are measured from.',
  });

export type ObstaclePathOnWire = z.infer<typeof obstaclePath>;
