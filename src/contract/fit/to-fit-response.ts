import type { FitResidual, FittedParameter } from '../../performance/fit/fit-result.ts';
import { toFit } from '../../performance/fit/to-fit.ts';
import type { FitAnswer } from '../../planning/fit/fit-answer.ts';
import { asChosen } from '../aeroplane-choice.ts';
import { assumedPresentation, presentationOf } from '../assumed-presentation.ts';
import { changedCautions } from '../changed-cautions.ts';
import { present } from '../present.ts';
import { type Presentation, shownQuantity, shownRatio } from '../shown-quantity.ts';
import { toAdvisory } from '../to-advisory.ts';
import { type Stamp, toAssumed, toSources } from '../to-basis.ts';
import { parameterName } from './fit-parameter-names.ts';
import type { FitRequest } from './fit-request.ts';
import type { FitResponse } from './fit-response.ts';
import { toFitMember } from './to-fit-member.ts';
import type { AskedFit } from './to-fit-question.ts';

/** The gate out of a fit. */
export function toFitResponse(
  request: FitRequest,
  { known, fittedTo }: AskedFit,
  answer: FitAnswer,
  stamp: Stamp,
): FitResponse {
  const how = presentationOf(request);
  const { result, origins, maximumLift } = answer;
  const whole = request.for === 'takeoff' ? 'takeoffDistance' : 'landingDistance';
  const cautions = [...changedCautions(known), ...answer.cautions];
  const made = answer.outcome === 'accepted' &&
    result && {
      ...toFit(result, fittedTo, stamp.modelVersion),
      ...(request.dryAir === undefined ? {} : { dryAir: true }),
    };
  return present<FitResponse>({
    outcome: answer.outcome,
    advisory: toAdvisory(how, answer.sentence, cautions),
    findings: answer.findings.map(({ finding, message, at }) =>
      present<FitResponse['findings'][number]>({
        code: finding.code,
        message,
        at,
        column: columnOf(finding, whole),
        row: 'row' in finding ? origins[finding.row]?.row : undefined,
        parameter: 'parameter' in finding ? parameterName(finding.parameter) : undefined,
      }),
    ),
    fit: made === false || made === undefined ? undefined : toFitMember(request.for, request.configuration, made),
    maximumLift: maximumLift && {
      coefficient: shownRatio(how, maximumLift.coefficient),
      deviationPercent: percent(how, maximumLift.relativeSd),
    },
    parameters: result?.parameters.map((parameter) => toParameter(how, parameter)),
    correlation: result?.correlation.map((row) => row.map((value) => shownRatio(how, value))),
    conditionNumber: result && shownRatio(how, result.conditionNumber),
    errors: result && {
      rmsPercent: percent(how, result.rms),
      greatestPercent: percent(how, Math.abs(result.greatest.logRatio)),
    },
    byAxis: result?.byAxis.map(({ axis, values }) => ({
      axis,
      values: values.map(({ value, mean, rms }) => ({
        value: shownQuantity(how, axis === 'pressureAltitude' ? 'altitude' : axis, value),
        meanPercent: percent(how, mean),
        rmsPercent: percent(how, rms),
      })),
    })),
    leaveOneAltitudeOut: result?.leaveOneAltitudeOut.map(({ pressureAltitude, rms, greatest }) => ({
      pressureAltitude: shownQuantity(how, 'altitude', pressureAltitude),
      rmsPercent: percent(how, rms),
      greatestPercent: percent(how, greatest),
    })),
    residuals: result?.residuals.map((residual) => toResidual(how, residual, answer, whole)),
    suggestedMeasurements: result?.suggested && {
      greatestDeviationPercent: percent(how, result.suggested.greatestSd),
      measurements: result.suggested.measurements.map(({ mass, pressureAltitude, temperature, greatestSdAfter }) => ({
        mass: shownQuantity(how, 'mass', mass),
        pressureAltitude: shownQuantity(how, 'altitude', pressureAltitude),
        temperature: shownQuantity(how, 'temperature', temperature),
        greatestDeviationPercentAfter: percent(how, greatestSdAfter),
      })),
    },
    basis: {
      assumed: toAssumed(how, [...answer.assumed, ...assumedPresentation(request)]),
      sources: toSources(
        ['HouseFit', 'Marquardt1963', 'Atkinson1992'],
        cautions.flatMap(({ source }) => (source === undefined ? [] : [source])),
        answer.assumed.flatMap(({ source }) => (source === undefined ? [] : [source])),
      ),
      modelVersion: stamp.modelVersion,
      digests: { aeroplane: known.digest, fittedTo },
    },
    question: { ...request, aeroplane: asChosen(request.aeroplane, known), ...how },
  });
}

function columnOf(finding: FitAnswer['findings'][number]['finding'], whole: string): string | undefined {
  const column = 'column' in finding ? finding.column : 'kind' in finding ? finding.kind : undefined;
  return column === 'wholeDistance' ? whole : column;
}

function toParameter(how: Presentation, parameter: FittedParameter): NonNullable<FitResponse['parameters']>[number] {
  const { name, value, sd, held, atBound, low, high, prior } = parameter;
  const shown = (si: number) =>
    name === 'approachAngle'
      ? { value: how.rounding === 'none' ? degrees(si) : Math.round(degrees(si) * 1000) / 1000, unit: 'deg' as const }
      : how.rounding === 'none'
        ? si + 0
        : Math.round(si * 1e5) / 1e5 + 0;
  return present<NonNullable<FitResponse['parameters']>[number]>({
    name: parameterName(name),
    value: shown(value),
    standardDeviation: sd > 0 ? shown(sd) : undefined,
    lowest: shown(low),
    highest: shown(high),
    expected: shown(prior.mean),
    expectedDeviation: shown(prior.sd),
    held,
    atBound,
  });
}

function degrees(radians: number): number {
  return (radians * 180) / Math.PI;
}

function toResidual(
  how: Presentation,
  { row, kind, given, computed, logRatio, leftOut }: FitResidual,
  { origins, result }: FitAnswer,
  whole: 'takeoffDistance' | 'landingDistance',
): NonNullable<FitResponse['residuals']>[number] {
  const index = (result?.residuals ?? [])
    .filter((one) => one.row === row && one.kind === kind)
    .findIndex((one) => one.given === given);
  return present<NonNullable<FitResponse['residuals']>[number]>({
    at: origins[row]?.of(kind, Math.max(0, index)) ?? '',
    row: origins[row]?.row ?? row,
    of: kind === 'wholeDistance' ? whole : kind,
    given: shownQuantity(how, 'distance', given),
    computed: shownQuantity(how, 'distance', computed),
    logRatio: shownRatio(how, logRatio),
    leftOut: leftOut ? true : undefined,
  });
}

/** A ratio in per cent, to two decimals. */
function percent({ rounding }: Presentation, ratio: number): number {
  return rounding === 'none' ? 100 * ratio + 0 : Math.round(ratio * 1e4) / 100 + 0;
}
