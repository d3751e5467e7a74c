import type { AnswerContext } from '../cautions/answer-context.ts';
import { percentText } from './measure-text.ts';

/** Why an answer that passes is thin, in words. */
export function thinSentence({
  thin,
  governing,
  ruleSet,
}: Pick<AnswerContext, 'thin' | 'governing' | 'ruleSet'>): string {
  if (thin?.kind === 'band') return 'The high end of the 90 % band would not pass.';
  return `That is ${percentText(Math.max(0, governing?.marginRatio ?? 0), 1, 'down')} of what is required, under ${percentText(ruleSet.thinMargin.ratio)}.`;
}
