import { asChosen, type Chosen } from './aeroplane-choice.ts';
import type { LandingRequest } from './landing-request.ts';
import type { LandingQuestion } from './landing-response.ts';
import type { Draft } from './present.ts';
import { defaultRounding, defaultUnits } from './question-frame.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import type { TakeoffQuestion } from './takeoff-response.ts';
import type { Whole } from './whole-request.ts';

/** The request with what was filled in, in the order of its schema; it can be sent again as it stands. */
export function asUnderstood(request: Whole<TakeoffRequest>, known: Chosen): TakeoffQuestion;
export function asUnderstood(request: Whole<LandingRequest>, known: Chosen): LandingQuestion;
export function asUnderstood(
  request: Whole<TakeoffRequest> | Whole<LandingRequest>,
  known: Chosen,
): TakeoffQuestion | LandingQuestion {
  const {
    reference,
    asOf,
    procedure,
    stage,
    method,
    edges,
    detail,
    select,
    units = defaultUnits,
    rounding = defaultRounding,
  } = request;
  const question = {} as Draft<TakeoffQuestion | LandingQuestion>;
  if (reference !== undefined) question.reference = reference;
  if (asOf !== undefined) question.asOf = asOf;
  question.aeroplane = asChosen(request.aeroplane, known);
  question.mass = request.mass;
  question.configuration = request.configuration;
  question.runway = request.runway;
  const { weather } = request.known;
  question.weather = 'report' in request.weather ? { report: request.weather.report, ...weather } : weather;
  if (request.hours !== undefined) question.hours = request.hours;
  if (procedure !== undefined) question.procedure = procedure;
  question.ruleSet = request.ruleSet;
  if (stage !== undefined) question.stage = stage;
  if (method !== undefined) question.method = method;
  if (edges !== undefined) question.edges = edges;
  question.units = units;
  question.rounding = rounding;
  if (detail !== undefined) question.detail = detail;
  if (select !== undefined) question.select = select;
  if ('decisionSpeed' in request && request.decisionSpeed !== undefined) {
    (question as Draft<TakeoffQuestion>).decisionSpeed = request.decisionSpeed;
  }
  return question;
}
