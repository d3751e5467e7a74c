import { z } from 'zod';
import { fitOutcomes } from '../../planning/fit/fit-answer.ts';
import { aeroplaneUnderstood } from '../aeroplane-choice.ts';
import {
  advisory,
  altitude,
  assumption,
  digest,
  measure,
  modelVersion,
  quantity,
  sources,
  temperature,
} from '../answer-parts.ts';
import { rounding, units } from '../question-frame.ts';
import { fit } from './fit-member.ts';
import { fitParameters, fitRequest } from './fit-request.ts';

const parameterName = z.enum(fitParameters);

const finding = z
  .strictObject({
    code: z.string().meta({ description: 'Stable name of the finding.' }),
    message: z.string().meta({ description: 'What is wrong or odd, with the numbers.' }),
    at: z.string().meta({ description: 'JSON pointer to what it is about.' }),
    column: z.string().meta({ description: 'The column of a table or the member of a run.' }).exactOptional(),
    row: z.number().meta({ description: 'Row of the table, or number of the run, from 0.' }).exactOptional(),
    parameter: parameterName.exactOptional(),
  })
  .meta({ id: 'FitFinding', description: 'Something that speaks against the fit.' });

const parameter = z
  .strictObject({
    name: parameterName,
    value: measure,
    standardDeviation: measure.meta({ description: 'Absent where held or at a bound.' }).exactOptional(),
    lowest: measure,
    highest: measure,
    expected: measure.meta({ description: 'What is expected beforehand.' }),
    expectedDeviation: measure.meta({ description: 'Standard deviation of what is expected.' }),
    held: z
      .enum(['not-asked', 'one-altitude', 'one-temperature', 'no-whole-distance', 'no-ground-roll'])
      .meta({ description: 'Why it was not fitted.' })
      .exactOptional(),
    atBound: z.enum(['low', 'high']).exactOptional(),
  })
  .meta({ id: 'FittedParameter', description: 'A parameter of the fit.' });

const residual = z
  .strictObject({
    at: z.string().meta({ description: 'JSON pointer to the distance.' }),
    row: z.number().meta({ description: 'Row of its table, or number of the run, from 0.' }),
    of: z.enum(['groundRoll', 'takeoffDistance', 'landingDistance', 'height', 'marker']),
    given: quantity,
    computed: quantity,
    logRatio: z.number().meta({ description: 'ln(computed/given).' }),
    leftOut: z.literal(true).meta({ description: 'It did not count in the fit.' }).exactOptional(),
  })
  .meta({ id: 'FitResidual', description: 'One distance as given and as the fit computes it.' });

const errors = z
  .strictObject({ rmsPercent: z.number(), greatestPercent: z.number() })
  .meta({ id: 'FitErrorsFound', description: '100 ln(computed/given): root mean square, and the greatest.' });

const leftOut = z
  .strictObject({ pressureAltitude: altitude, rmsPercent: z.number(), greatestPercent: z.number() })
  .meta({ id: 'AltitudeLeftOut', description: 'A pressure altitude as predicted from a fit to the others.' });

const axisErrors = z
  .strictObject({
    axis: z.enum(['mass', 'pressureAltitude', 'temperature']),
    values: z.array(z.strictObject({ value: quantity, meanPercent: z.number(), rmsPercent: z.number() })),
  })
  .meta({ id: 'FitErrorsByAxis', description: '100 ln(computed/given) by the values of one axis.' });

const suggested = z
  .strictObject({
    greatestDeviationPercent: z
      .number()
      .meta({ description: 'Standard deviation of the whole distance by the parameters, its greatest in the table.' }),
    measurements: z.array(
      z.strictObject({
        mass: quantity,
        pressureAltitude: altitude,
        temperature,
        greatestDeviationPercentAfter: z
          .number()
          .meta({ description: 'The same with this measurement and those before it.' }),
      }),
    ),
  })
  .meta({
    id: 'SuggestedMeasurements',
    description: 'Conditions inside the table at which further distances would tell most, best first.',
  });

export const fitResponse = z
  .strictObject({
    outcome: z.enum(fitOutcomes).meta({
      description: 'accepted, not-accepted with figures that are not to be used, or not-fitted.',
    }),
    advisory,
    findings: z.array(finding),
    fit: fit.meta({ description: "Where it is accepted: as a member of the aeroplane's definition." }).exactOptional(),
    maximumLift: z
      .strictObject({ coefficient: z.number(), deviationPercent: z.number() })
      .meta({ id: 'MeasuredLift', description: 'From the measured stall speeds; the fit holds with it alone.' })
      .exactOptional(),
    parameters: z.array(parameter).exactOptional(),
    correlation: z
      .array(z.array(z.number()))
      .meta({ description: 'Between the parameters, in their order; 0 beside one that is held.' })
      .exactOptional(),
    conditionNumber: z
      .number()
      .meta({
        description: "Greatest over least axis of the parameters' correlation; above 100 they are not told apart.",
      })
      .exactOptional(),
    errors: errors.exactOptional(),
    byAxis: z.array(axisErrors).exactOptional(),
    leaveOneAltitudeOut: z.array(leftOut).exactOptional(),
    residuals: z.array(residual).exactOptional(),
    suggestedMeasurements: suggested.exactOptional(),
    basis: z
      .strictObject({
        assumed: z.array(assumption),
        sources,
        modelVersion,
        digests: z.strictObject({
          aeroplane: digest,
          fittedTo: digest.meta({ description: 'SHA-256, hex, of tables, runs and stall speeds.' }),
        }),
      })
      .meta({ id: 'FitBasis', description: 'What the fit rests on.' }),
    question: z
      .strictObject({ ...fitRequest.shape, aeroplane: aeroplaneUnderstood, units, rounding })
      .meta({ id: 'FitQuestion', description: 'The question as understood. It can be sent again as it stands.' }),
  })
  .meta({ id: 'FitResponse', description: 'Physics fitted to distances, and how far to trust it.' });

export type FitResponse = z.infer<typeof fitResponse>;
