import { z } from 'zod';
import { faultCodes } from '../../planning/fault.ts';
import { advisory, assumption, digest, measure, modelVersion, severity, source, sources } from '../answer-parts.ts';
import { asOf, reference, units } from '../question-frame.ts';
import { id } from '../text.ts';

const at = z.string().meta({ description: 'JSON pointer into the definition.' });
const hint = z.string().meta({ description: 'What was probably meant, or where to look.' }).exactOptional();

const fault = z
  .strictObject({
    kind: z.literal('fault'),
    code: z.enum(faultCodes).meta({ description: 'As in the problem that a question with this definition gets.' }),
    severity: z.literal('strong'),
    message: z.string(),
    at,
    received: z.union([z.string(), z.number(), z.boolean()]).exactOptional(),
    allowed: z.string().exactOptional(),
    hint,
  })
  .meta({ id: 'DefinitionFault', description: 'Something for which a question with this definition is refused.' });

const oddity = z
  .strictObject({
    kind: z.literal('oddity'),
    code: z.string().meta({ description: 'Stable name of the finding.' }),
    severity,
    message: z.string().meta({ description: 'A fact and its effect, with numbers and units.' }),
    at,
    value: measure.meta({ description: 'The number the finding is about.' }).exactOptional(),
    threshold: measure.meta({ description: 'The number it was compared with.' }).exactOptional(),
    source: source.exactOptional(),
    hint,
  })
  .meta({ id: 'DefinitionOddity', description: 'Something odd about a definition that can be used.' });

export const definitionFinding = z
  .discriminatedUnion('kind', [fault, oddity])
  .meta({ id: 'DefinitionFinding', description: 'Something wrong or odd about a definition.' });

const possibleMethod = z
  .strictObject({
    method: z.enum(['flight-manual', 'fitted', 'stated', 'geometry']),
    possible: z.boolean(),
    sheets: z.array(id).meta({ description: 'Tables and graphs that it reads or could be fitted to.' }),
    missing: z
      .array(
        z.strictObject({ at, message: z.string() }).meta({ id: 'MissingForMethod', description: 'Something missing.' }),
      )
      .meta({ description: 'What the method lacks, or takes from another method.' }),
    assumed: z
      .array(z.string())
      .meta({ description: 'Pointers of what it takes because the definition leaves it out.' }),
  })
  .meta({ id: 'PossibleMethod', description: 'Whether a method has what it needs.' });

/** What POST /v1/aeroplanes/proofread answers. */
export const proofreadResponse = z
  .strictObject({
    outcome: z.enum(['proofread', 'proofread-in-part', 'not-readable']).meta({
      description:
        'proofread: all of it; proofread-in-part: without what is under notReviewed; not-readable: its faults alone.',
    }),
    advisory,
    findings: z.array(definitionFinding).meta({
      description:
        'Faults first, in the order of the definition; then what is odd, the aeroplane before its flight manual.',
    }),
    methods: z
      .array(
        z
          .strictObject({
            configuration: id,
            phase: z.enum(['takeoff', 'landing']),
            methods: z.array(possibleMethod).meta({ description: 'Best first.' }),
          })
          .meta({ id: 'ConfigurationMethods', description: 'The methods of one configuration in one phase.' }),
      )
      .meta({ description: 'Which methods the definition has what it needs for.' }),
    notReviewed: z
      .array(z.string())
      .meta({ description: 'Pointers of what is at fault so that nothing more is said of it.' }),
    basis: z
      .strictObject({
        assumed: z.array(assumption),
        sources,
        modelVersion,
        digests: z.strictObject({ aeroplane: digest.exactOptional() }),
      })
      .meta({
        id: 'ProofreadBasis',
        description: 'What the findings rest on; the digest where the definition can be read.',
      }),
    question: z
      .strictObject({ reference: reference.exactOptional(), asOf: asOf.exactOptional(), units })
      .meta({ id: 'ProofreadQuestion', description: 'The question as understood, without the definition.' }),
  })
  .meta({ id: 'ProofreadResponse', description: 'Everything wrong or odd about a definition.' });

export type ProofreadResponse = z.infer<typeof proofreadResponse>;
export type DefinitionFinding = z.infer<typeof definitionFinding>;
