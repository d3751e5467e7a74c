import { z } from 'zod';
import { speed } from './answer-parts.ts';

export const windComponents = z
  .strictObject({
    headwind: speed.meta({ description: 'Positive on the nose.' }),
    crosswind: speed.meta({ description: 'Size of the wind across the runway.' }).exactOptional(),
    crosswindFrom: z.enum(['left', 'right']).exactOptional(),
    creditedHeadwind: speed.meta({ description: 'What the rule set lets be taken into account.' }),
  })
  .meta({ id: 'WindComponents', description: 'The wind along and across the runway.' });

export type WindOnAnswer = z.infer<typeof windComponents>;
