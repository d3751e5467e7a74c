import { z } from 'zod';
import { contaminantKinds, surfaceKinds, surfaceStates } from '../planning/question.ts';
import {
  contaminantDepth,
  direction,
  elevation,
  magneticVariation,
  obstacleDistance,
  obstacleHeight,
  runwayLength,
} from './quantities.ts';
import { slope } from './slope.ts';
import { id, shortText, text } from './text.ts';
import { north } from './weather.ts';

const conditionCode = z.number().int().min(0).max(6);

export const surface = z
  .strictObject({
    kind: z.enum(surfaceKinds).meta({ description: 'What the surface is made of.' }),
    state: z.enum(surfaceStates).meta({ description: 'What lies on it.' }),
    grass: z.enum(['short', 'long']).meta({ description: 'Length of the grass, on grass.' }).exactOptional(),
    firmness: z
      .enum(['firm', 'soft'])
      .meta({ description: 'Of the subsoil: firm when wheels mark it without making ruts.' })
      .exactOptional(),
    contaminant: z
      .strictObject({
        kind: z.enum(contaminantKinds).meta({ description: 'What covers the runway.' }),
        depth: contaminantDepth
          .meta({ description: 'Of water, slush and loose snow, which need it; nothing else has one.' })
          .exactOptional(),
      })
      .meta({ id: 'Contaminant', description: 'Water, slush, snow, frost or ice on the runway.' })
      .exactOptional(),
    runwayConditionCode: z
      .union([conditionCode, z.tuple([conditionCode, conditionCode, conditionCode])])
      .meta({
        description:
          'Runway condition code, 6 dry to 0 less than poor: one for the whole runway, or one a third in the direction of movement.',
      })
      .exactOptional(),
    rollingFrictionCoefficient: z
      .number()
      .min(0)
      .max(0.3)
      .meta({
        description: 'Friction of free-rolling wheels over their load, instead of the one for this kind and state.',
      })
      .exactOptional(),
    brakingFrictionCoefficient: z
      .number()
      .min(0)
      .max(1)
      .meta({
        description:
          'Braking force over the load on all wheels, brakes and anti-skid as they are, instead of the one for this kind and state.',
      })
      .exactOptional(),
  })
  .meta({ id: 'Surface', description: 'The surface of the runway and its state.' });

export const start = z
  .union([
    z.literal('threshold'),
    z.strictObject({
      offset: runwayLength.meta({ description: 'Distance from the beginning of the declared distances to the start.' }),
    }),
    z.strictObject({
      point: shortText.meta({
        description: 'Name of the intersection; the declared distances are as published from there.',
      }),
    }),
  ])
  .meta({
    id: 'Start',
    description: 'Where the takeoff run starts. It is never assumed to be the full length.',
  });

export const declared = z
  .strictObject({
    tora: runwayLength.meta({ description: 'Takeoff run available.' }).exactOptional(),
    toda: runwayLength.meta({ description: 'Takeoff distance available.' }).exactOptional(),
    asda: runwayLength.meta({ description: 'Accelerate-stop distance available.' }).exactOptional(),
    lda: runwayLength.meta({ description: 'Landing distance available.' }).exactOptional(),
  })
  .meta({
    id: 'DeclaredDistances',
    description:
      'The declared distances. None is assumed equal to another: an absent one leaves its check not assessed.',
  });

export const obstacles = z
  .strictObject({
    from: z
      .enum(['brake-release', 'end-of-toda'])
      .meta({ description: 'Where distances and heights are measured from; end-of-toda needs declared.toda.' }),
    list: z
      .array(
        z
          .strictObject({ distance: obstacleDistance, height: obstacleHeight })
          .meta({ id: 'Obstacle', description: 'One obstacle straight ahead.' }),
      )
      .min(1)
      .max(50),
  })
  .meta({
    id: 'Obstacles',
    description:
      'Obstacles straight ahead after takeoff. A turn is not computed: an obstacle beside a turn has no place here.',
  });

const onFile = z
  .strictObject({
    aerodrome: id,
    revision: shortText,
    changed: z
      .array(text(300))
      .max(40)
      .meta({ description: 'What the question put in place of what is on file, in words.' })
      .exactOptional(),
    full: declared.meta({ description: 'With a named point: what is declared for the whole runway.' }).exactOptional(),
  })
  .meta({
    id: 'RunwayOnFile',
    description:
      'Where the runway came from, as the answer to a question that named an aerodrome says it; repeated and not looked up.',
  });

export const runway = z
  .strictObject({
    designator: shortText.meta({ description: 'Name of the runway end used, for example 07 or 25L.' }),
    direction: direction.meta({ description: 'Direction of movement.' }),
    directionReference: north,
    magneticVariation: magneticVariation
      .meta({ description: 'Needed when runway and wind are given in different references; east positive.' })
      .exactOptional(),
    elevation,
    slope,
    surface,
    start,
    lineUp: z
      .strictObject({
        tora: runwayLength.meta({ description: 'What lining up takes from TORA and TODA.' }),
        asda: runwayLength.meta({ description: 'What lining up takes from ASDA.' }),
      })
      .meta({ id: 'LineUp', description: 'Length lost in lining up.' })
      .exactOptional(),
    declared: declared.exactOptional(),
    obstacles: obstacles.exactOptional(),
    onFile: onFile.exactOptional(),
  })
  .meta({ id: 'Runway', description: 'The runway, seen in the direction of movement.' });

export type RunwayOnWire = z.infer<typeof runway>;
