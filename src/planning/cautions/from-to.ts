import { type ConditionsContext, textIn } from './answer-context.ts';

/** What a circumstance does to a distance, in words; nothing where it moves by less than a metre or one of the two does not exist. */
export function fromTo(
  context: Pick<ConditionsContext, 'question'>,
  what: string,
  from: number | undefined,
  to: number | undefined,
): string {
  if (from === undefined || to === undefined || Math.abs(to - from) < 1) return '';
  const verb = to > from ? 'lengthens' : 'shortens';
  return ` It ${verb} the ${what} from ${textIn(context, 'distance', from)} to ${textIn(context, 'distance', to)}.`;
}
