import { type Fault, isRefused, type Refused } from '../planning/fault.ts';
import { planLanding } from '../planning/plan-landing.ts';
import { planTakeoff } from '../planning/plan-takeoff.ts';
import { type Ranked, rankChoices } from '../planning/rank-choices.ts';
import { choicesSentence } from '../planning/sentences/choices-sentence.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import type { LandingChoicesRequest, TakeoffChoicesRequest } from './choices-request.ts';
import type { LandingChoicesResponse, TakeoffChoicesResponse } from './choices-response.ts';
import type { LandingRequest } from './landing-request.ts';
import type { LandingResponse } from './landing-response.ts';
import { notice } from './notice.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import type { TakeoffResponse } from './takeoff-response.ts';
import type { Stamp } from './to-basis.ts';
import { toLandingQuestion } from './to-landing-question.ts';
import { toLandingResponse } from './to-landing-response.ts';
import { toQuestion } from './to-question.ts';
import { toResponse } from './to-response.ts';
import { wholeRequest } from './whole-request.ts';

/** The ways to take off, each asked as a takeoff of its own, best first. */
export function answerTakeoffChoices(
  request: TakeoffChoicesRequest,
  lookup: CatalogueLookup,
  stamp: Stamp,
): TakeoffChoicesResponse | Refused {
  const answered = answerEach<TakeoffRequest, TakeoffResponse>(request, (one) => {
    const question = toQuestion(one, lookup);
    if (isRefused(question)) return question;
    const answer = planTakeoff(question);
    return isRefused(answer)
      ? answer
      : { answer, response: toResponse(answer, wholeRequest(one, lookup.aerodromes, 'takeoff'), question, stamp) };
  });
  return isRefused(answered) ? answered : together(request, answered);
}

/** The ways to land, each asked as a landing of its own, best first. */
export function answerLandingChoices(
  request: LandingChoicesRequest,
  lookup: CatalogueLookup,
  stamp: Stamp,
): LandingChoicesResponse | Refused {
  const answered = answerEach<LandingRequest, LandingResponse>(request, (one) => {
    const question = toLandingQuestion(one, lookup);
    if (isRefused(question)) return question;
    const answer = planLanding(question);
    return isRefused(answer)
      ? answer
      : {
          answer,
          response: toLandingResponse(answer, wholeRequest(one, lookup.aerodromes, 'landing'), question, stamp),
        };
  });
  return isRefused(answered) ? answered : together(request, answered);
}

interface Answered<Response> {
  /** unrounded, to rank by */
  readonly answer: Ranked;
  readonly response: Response;
}

type OneOf<Request> = Pick<TakeoffRequest & LandingRequest, 'runway' | 'configuration'> & {
  readonly name?: string;
} & Partial<Request>;

/** Answers each choice, or tells every fault of all of them at once, each where it stands in the question. */
function answerEach<Request, Response>(
  { choices, ...common }: { readonly choices: readonly OneOf<Request>[] },
  answer: (one: Request) => Answered<Response> | Refused,
): Answered<Response>[] | Refused {
  const answered: Answered<Response>[] = [];
  const faults = new Map<string, Fault>();
  choices.forEach(({ name: _, ...choice }, index) => {
    const one = answer({ ...common, ...choice } as Request);
    if (!isRefused(one)) answered.push(one);
    else
      for (const fault of one.refused) {
        const pointer = inChoice(fault.pointer, index);
        faults.set(`${pointer} ${fault.code}`, { ...fault, pointer });
      }
  });
  return faults.size > 0 ? { refused: [...faults.values()] } : answered;
}

/** A pointer into the question of one choice as a pointer into the question of all. */
function inChoice(pointer: string, index: number): string {
  return /^\/(runway|configuration)(\/|$)/.test(pointer) ? `/choices/${index}${pointer}` : pointer;
}

/** What a takeoff's and a landing's answer share, as far as choices show it. */
type Shown = Pick<
  TakeoffResponse | LandingResponse,
  'outcome' | 'advisory' | 'wind' | 'distances' | 'assessment' | 'shortfall' | 'basis' | 'question'
>;

function together<Response extends TakeoffChoicesResponse | LandingChoicesResponse>(
  request: TakeoffChoicesRequest | LandingChoicesRequest,
  answered: readonly Answered<Shown>[],
): Response {
  const order = rankChoices(answered.map(({ answer }) => answer));
  const choices = order.map((index) => {
    const { response } = answered[index] as Answered<Shown>;
    const { name, configuration } = request.choices[index] as OneOf<TakeoffRequest>;
    const { outcome, advisory, wind, distances, assessment, shortfall } = response;
    return {
      choice: index,
      ...(name === undefined ? {} : { name }),
      designator: response.question.runway.designator,
      configuration,
      outcome,
      sentence: advisory.sentence,
      cautions: advisory.cautions.map((one) => (one.at === undefined ? one : { ...one, at: inChoice(one.at, index) })),
      wind,
      ...(distances === undefined ? {} : { distances }),
      ...(assessment === undefined ? {} : { assessment }),
      ...(shortfall === undefined
        ? {}
        : { shortfall: shortfall.map((one) => ({ ...one, at: inChoice(one.at, index) })) }),
    };
  });
  const best = choices[0] as (typeof choices)[number];
  const { response } = answered[best.choice] as Answered<Shown>;
  const { runway: _, configuration: __, ...common } = response.question;
  const sources = new Map(
    answered.flatMap(({ response: { basis } }) => basis.sources).map((source) => [source.key, source]),
  );
  return {
    outcome: best.outcome,
    advisory: { notice, sentence: choicesSentence(best, choices), cautions: [] },
    choices,
    basis: {
      sources: [...sources.values()],
      modelVersion: response.basis.modelVersion,
      digests: response.basis.digests,
    },
    question: {
      ...common,
      choices: request.choices.map((choice, index) => ({
        ...choice,
        runway: (answered[index] as Answered<Shown>).response.question.runway,
      })),
    },
  } as unknown as Response;
}
