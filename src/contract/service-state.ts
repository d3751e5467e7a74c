import { z } from 'zod';

/** The answer of GET /health/live. */
export const liveness = z
  .strictObject({ status: z.literal('live') })
  .meta({ id: 'Liveness', description: 'The process runs.' });

/** The answer of GET /health/ready. */
export const readiness = z
  .strictObject({ status: z.literal('ready') })
  .meta({ id: 'Readiness', description: 'The service can compute.' });

const onFile = z.strictObject({
  builtIn: z.int().min(0).meta({ description: 'Invented ones that come with the service; 0 where switched off.' }),
  own: z.int().min(0).meta({ description: "Those of the operator's own folder." }),
});

/** The answer of GET /version. */
export const version = z
  .strictObject({
    service: z.string().meta({ description: 'Name of the service.' }),
    version: z.string().meta({ description: 'Version of the service.' }),
    modelVersion: z.string().meta({ description: 'Changes whenever any number of any answer changes.' }),
    aeroplanes: onFile.meta({ description: 'How many aeroplanes are on file.' }),
    aerodromes: onFile.meta({ description: 'How many aerodromes are on file.' }),
    digests: z
      .strictObject({
        catalogue: z.string().meta({ description: 'SHA-256 over all aeroplanes and aerodromes on file, hex.' }),
      })
      .meta({ description: 'Digests of what the service was started with.' }),
  })
  .meta({ id: 'Version', description: 'What is running.' });
