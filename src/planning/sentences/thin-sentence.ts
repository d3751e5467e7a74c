import { percentText } from './measure-text.ts';
import type { SentenceGround } from './takeoff-sentence.ts';

/** Why an answer that passes is thin, in words. */
export function thinSentence({
  thin,
  governing,
  ruleSet,
}: Pick<SentenceGround, 'thin' | 'governing' | 'ruleSet'>): string {
  if (thin === 'band') return 'The high end of the 90 % band would not pass.';
  return `That is ${percentText(Math.max(0, governing?.marginRatio ?? 0))} of what is required, under ${percentText(ruleSet.thinMargin.ratio)}.`;
}
