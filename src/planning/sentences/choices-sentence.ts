import type { Outcome } from '../answer.ts';

interface Choice {
  readonly name?: string;
  readonly designator: string;
  readonly configuration: string;
  readonly outcome: Outcome;
  readonly sentence: string;
}

/** The best of several ways in one sentence, and how many of them are enough. */
export function choicesSentence(best: Choice, all: readonly Choice[]): string {
  const enough = all.filter(({ outcome }) => outcome === 'enough' || outcome === 'enough-but-thin').length;
  const called = best.name ?? `runway ${best.designator}, ${best.configuration}`;
  const count = `${enough} of ${all.length} ${all.length === 1 ? 'choice' : 'choices'} enough`;
  return `${count}. Best: ${called}. ${best.sentence}`;
}
