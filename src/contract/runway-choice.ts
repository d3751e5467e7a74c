import { z } from 'zod';
import { runway } from './runway.ts';
import { id, shortText } from './text.ts';

const { surface, elevation, slope, magneticVariation, lineUp, declared, obstacles, start } = runway.shape;

/** A runway end on file; what stands beside it takes the place of what is on file. */
const runwayOfAerodrome = z
  .strictObject({
    aerodrome: id.meta({ description: 'An id of the catalogue; GET /v1/aerodromes lists them.' }),
    end: shortText.meta({ description: 'Designator of one of its runway ends.' }),
    elevation: elevation.exactOptional(),
    magneticVariation,
    slope: slope.exactOptional(),
    surface: surface
      .extend({ kind: surface.shape.kind.exactOptional() })
      .meta({ id: 'SurfaceState', description: 'The state of the surface; its kind where it is not as on file.' }),
    start,
    lineUp,
    declared,
    obstacles,
  })
  .meta({
    id: 'RunwayOfAerodrome',
    description:
      'A runway end on file. What is on file of direction, elevation, slope, surface and declared distances is taken, and what is given here in its place is said.',
  });

/** The runway in exactly one of two forms. */
export const runwayChoice = z.union([runway, runwayOfAerodrome]).meta({
  id: 'RunwayChoice',
  description: 'The runway: whole, or a runway end of an aerodrome of the catalogue.',
});

export type RunwayChoice = z.infer<typeof runwayChoice>;
export type RunwayOfAerodrome = z.infer<typeof runwayOfAerodrome>;
