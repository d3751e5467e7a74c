import type { Answer, BandedDistance } from '../planning/answer.ts';
import { type Fault, isRefused, type Refused } from '../planning/fault.ts';
import type { Question } from '../planning/question.ts';
import { rankChoices } from '../planning/rank-choices.ts';
import type { Hour, HourWind } from '../weather/hours.ts';
import { instantText } from '../weather/instant.ts';
import type { HourAnswer } from './hours.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownPercent, shownQuantity } from './shown-quantity.ts';
import { toBandedDistance } from './to-banded-distance.ts';
import { toWindComponents } from './to-wind-components.ts';

/** An answer with its whole distance, as far as hours show it. */
type HourlyAnswer = Answer & { readonly wholeDistance: BandedDistance | undefined };

/**
 * A question answered for each hour, each for the least favourable of the winds that can hold in it, found by asking every one.
 *
 * @param plan - the question's own
 * @returns the answers in the order of the hours, or every fault that an hour's weather brings about
 */
export function answerHours<Asked extends Question>(
  how: Presentation,
  question: Asked,
  hours: readonly Hour[],
  plan: (question: Asked) => HourlyAnswer | Refused,
): readonly HourAnswer[] | Refused {
  const answers: HourAnswer[] = [];
  const refused: Fault[] = [];
  hours.forEach((hour, index) => {
    const answered = answerHour(how, question, hour, plan);
    if (!isRefused(answered)) answers.push(answered);
    else for (const fault of answered.refused) refused.push({ ...fault, pointer: inHour(fault.pointer, index) });
  });
  return refused.length > 0 ? { refused } : answers;
}

function answerHour<Asked extends Question>(
  how: Presentation,
  { report: _, ...question }: Asked,
  { at, winds, temperature, dewPoint, pressure, missing }: Hour,
  plan: (question: Asked) => HourlyAnswer | Refused,
): HourAnswer | Refused {
  const shown: Draft<HourAnswer> = { at: instantText(at), sentence: '', considered: winds.length };
  if (temperature === undefined || pressure === undefined || winds.length === 0) {
    return { ...shown, sentence: `No answer for this hour: ${missing.join(', ')} not known.`, missing: [...missing] };
  }
  const held: { readonly wind: HourWind; readonly answer: HourlyAnswer }[] = [];
  for (const wind of winds) {
    const air = { temperature: temperature.value, ...(dewPoint === undefined ? {} : { dewPoint }), pressure };
    const answer = plan({ ...question, weather: { ...air, wind: wind.wind } } as unknown as Asked);
    if (isRefused(answer)) return answer;
    held.push({ wind, answer });
  }
  const worst = held[rankChoices(held.map(({ answer }) => answer)).at(-1) ?? 0] as (typeof held)[number];
  const { wind, answer } = worst;
  const governing = answer.assessment?.checks.find(({ code }) => code === answer.assessment?.governing);
  shown.outcome = answer.outcome;
  shown.sentence = answer.sentence;
  shown.because = wind.because;
  if (wind.heading !== undefined) shown.change = wind.heading;
  shown.temperature = shownQuantity(how, 'temperature', temperature.value);
  shown.temperatureBecause = temperature.because;
  shown.wind = toWindComponents(how, answer.wind);
  if (answer.wholeDistance !== undefined) shown.wholeDistance = toBandedDistance(how, answer.wholeDistance);
  if (governing?.margin !== undefined) {
    shown.governing = governing.code;
    shown.margin = shownQuantity(how, governing.unit, governing.margin, 'down');
    if (governing.marginRatio !== undefined) shown.marginPercent = shownPercent(how, governing.marginRatio, 'down');
  }
  return shown;
}

/** A pointer into the weather of the question as one into the hour. */
function inHour(pointer: string, index: number): string {
  return pointer.startsWith('/weather') ? `/hours/${index}${pointer.slice('/weather'.length)}` : pointer;
}
