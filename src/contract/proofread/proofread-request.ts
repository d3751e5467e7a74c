import { z } from 'zod';
import { asOf, reference, units } from '../question-frame.ts';

/** What POST /v1/aeroplanes/proofread is asked. */
export const proofreadRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    definition: z.record(z.string(), z.unknown()).meta({
      description:
        'An aeroplane definition as POST /v1/takeoff takes it, or as much of one as there is: what is wrong with its form comes back as findings too.',
    }),
    units: units.exactOptional(),
  })
  .meta({ id: 'ProofreadRequest', description: 'A definition to be proofread.' });

export type ProofreadRequest = z.infer<typeof proofreadRequest>;
