import { describe, expect, it } from 'vitest';
import { prepareTakeoff } from '../../src/planning/prepare-takeoff.ts';
import { takeoffWorking } from '../../src/planning/working/takeoff-working.ts';
import { answered, changed, plainQuestion } from '../support/takeoff-question.ts';

describe('a takeoff in a wind from any direction', () => {
  const blowing = { kind: 'variable', speed: 2, gust: 5 } as const;
  const question = changed(plainQuestion, { weather: { wind: blowing } });
  const answer = answered(question);

  it('is the one in a tailwind of the full speed', () => {
    const tailwind = answered(changed(plainQuestion, { weather: { wind: { kind: 'components', headwind: -2 } } }));
    expect(answer.wind).toMatchObject({ headwind: -2, crosswind: 2 });
    expect(answer.distances).toEqual(tailwind.distances);
  });

  it('says the tailwind, that it varies, and the gusts', () => {
    const codes = answer.cautions.map(({ code }) => code);
    expect(codes).toEqual(expect.arrayContaining(['tailwind', 'wind-variable', 'gust-not-credited']));
  });

  it('works the headwind out from the speed', () => {
    const prepared = prepareTakeoff(question);
    if ('refused' in prepared) throw new Error('refused');
    const line = takeoffWorking(question, prepared, answer).find(({ symbol }) => symbol === 'w');
    expect(line).toMatchObject({ value: -2, formula: '-W', from: ['W'], source: 'Judgement' });
  });
});
