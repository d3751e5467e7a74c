import { z } from 'zod';
import { surfaceKinds } from '../planning/question.ts';
import { direction, elevation, magneticVariation, runwayLength, runwayWidth } from './quantities.ts';
import { declared, obstacles } from './runway.ts';
import { slope } from './slope.ts';
import { id, shortText } from './text.ts';

const namedPoint = z
  .strictObject({
    name: shortText.meta({ description: 'Name of the intersection, as it is published.' }),
    distance: runwayLength.meta({ description: "From the beginning of the runway end's declared distances." }),
    declared: declared.meta({ description: 'As published from this point; they are not shortened again.' }),
  })
  .meta({ id: 'NamedPoint', description: 'An intersection from which distances are published.' });

/** What a surface is made of; its state comes with the question. */
const groundKind = z
  .strictObject({
    kind: z.enum(surfaceKinds).meta({ description: 'What the surface is made of.' }),
    grass: z
      .enum(['short', 'long'])
      .meta({ description: 'On grass, where its length is always the same.' })
      .exactOptional(),
    firmness: z
      .enum(['firm', 'soft'])
      .meta({ description: 'Of the subsoil, where it is always the same.' })
      .exactOptional(),
  })
  .meta({ id: 'GroundKind', description: 'What a runway is made of; its state comes with the question.' });

const runwayEnd = z
  .strictObject({
    designator: shortText.meta({ description: 'Name of the runway end used, for example 07 or 25L.' }),
    direction: direction.meta({ description: 'Direction of movement, from true north.' }),
    slope,
    surface: groundKind,
    width: runwayWidth.exactOptional(),
    displacedThreshold: runwayLength
      .meta({
        description:
          'From the beginning of TORA to the landing threshold. LDA is as published and not shortened by it; a profile is taken from there in a landing.',
      })
      .exactOptional(),
    declared,
    points: z.array(namedPoint).min(1).max(24).exactOptional(),
    obstacles: obstacles
      .meta({ description: 'From the end of TODA, which is the same from every start point.' })
      .exactOptional(),
  })
  .meta({
    id: 'RunwayEnd',
    description: 'A runway in one direction of movement; what is not declared is not for use.',
  });

/** A whole aerodrome, the form of a catalogue file. */
export const aerodromeDefinition = z
  .strictObject({
    id,
    revision: shortText.meta({ description: 'Revision of the definition.' }),
    name: shortText.meta({ description: 'Name for people to read.' }),
    elevation,
    magneticVariation,
    ends: z.array(runwayEnd).min(1).max(24),
  })
  .meta({ id: 'AerodromeDefinition', description: 'A whole aerodrome.' });

export type AerodromeDefinition = z.infer<typeof aerodromeDefinition>;
export type RunwayEnd = AerodromeDefinition['ends'][number];
