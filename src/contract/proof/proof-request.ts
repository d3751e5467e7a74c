import { z } from 'zod';
import { aeroplaneAsItStands } from '../aeroplane-choice.ts';
import { asOf, reference } from '../question-frame.ts';
import { id } from '../text.ts';

/** What POST /v1/aeroplanes/proof is asked. */
export const proofRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneAsItStands,
    table: id.meta({ description: 'Id of a table of its flight manual.' }),
  })
  .meta({ id: 'ProofRequest', description: 'A table of the flight manual of an aeroplane, to be read back.' });

export type ProofRequest = z.infer<typeof proofRequest>;
