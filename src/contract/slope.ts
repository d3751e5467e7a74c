import { z } from 'zod';
import { slope as steadySlope } from './quantities.ts';

const lengthUnit = z.enum(['m', 'ft']);

/** A ground line surveyed at points, the unit of each column named once. */
const profile = z
  .strictObject({
    units: z.tuple([lengthUnit, lengthUnit]).meta({ description: 'Of the distances and of the heights.' }),
    points: z
      .array(z.tuple([z.number().min(0).max(33_000), z.number().min(-2000).max(20_000)]))
      .min(2)
      .max(200)
      .meta({
        description:
          'Distance along the runway from the beginning of the declared distances, rising in the direction of movement, and height of the ground above any one level.',
      }),
  })
  .meta({
    id: 'GroundProfile',
    description:
      'The ground line along the runway. It reaches from the start point to the end of the longest declared distance of the question, and no stretch of it is steeper than 10 %.',
  });

/** Exactly one of two forms. */
export const slope = z.union([steadySlope, z.strictObject({ profile })]).meta({
  id: 'RunwaySlope',
  description: 'The slope throughout, or the ground line along the runway.',
});

export type SlopeOnWire = z.infer<typeof slope>;
export type ProfileOnWire = z.infer<typeof profile>;
