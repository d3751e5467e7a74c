import { describe, expect, it } from 'vitest';
import { takeoffProcedureFaults } from '../../../src/planning/procedure/takeoff-procedure-faults.ts';
import type { TakeoffQuestion } from '../../../src/planning/question.ts';
import { answered, changed, plainQuestion } from '../../support/takeoff-question.ts';

const { propulsion } = plainQuestion.aeroplane;
const settings = { 'reduced-90': { fullPowerRatio: 0.9 } };
const ready = changed(plainQuestion, {
  aeroplane: { propulsion: { ...propulsion, powerSettings: settings } },
});
const rolling = changed(plainQuestion, { configuration: { rollingStartAllowance: 40 } });
const found = (question: TakeoffQuestion, procedure: NonNullable<TakeoffQuestion['procedure']>) =>
  takeoffProcedureFaults({ ...question, procedure });

describe('the procedure of a takeoff', () => {
  it('refuses power settings and rolling starts that the definition has no data for, and names them', () => {
    const faults = found(plainQuestion, { power: 'reduced-90', start: 'rolling' });
    expect(faults.map(({ pointer, code }) => [pointer, code])).toEqual([
      ['/procedure/power', 'missing'],
      ['/procedure/start', 'missing'],
    ]);
    expect(faults[0]?.message).toContain('propulsion.powerSettings');
    expect(faults[1]?.message).toContain('configurations.takeoff.rollingStartAllowance');
  });
  it('names the settings there are', () => {
    expect(found(ready, { power: 'reduced-80' })[0]).toMatchObject({ code: 'unknown-id', allowed: 'reduced-90' });
    expect(found(ready, { power: 'toString' })[0]).toMatchObject({ code: 'unknown-id' });
  });
  it('takes a standing start and full power without a word', () => {
    expect(found(plainQuestion, { start: 'standing' })).toEqual([]);
    expect(found(plainQuestion, {})).toEqual([]);
  });
  it('is longer with less power, by the roll and in the air', () => {
    const full = answered(ready).distances;
    const less = answered({ ...ready, procedure: { power: 'reduced-90' } }).distances;
    expect(less?.groundRoll.value ?? 0).toBeGreaterThan((full?.groundRoll.value ?? 0) * 1.1);
    expect(less?.airDistance.value ?? 0).toBeGreaterThan(full?.airDistance.value ?? 0);
  });
  it('adds what a rolling start takes to the roll and the distance, under rules before their factors', () => {
    const standing = answered(rolling).distances;
    const asked = answered({ ...rolling, procedure: { start: 'rolling' } });
    expect((asked.distances?.groundRoll.value ?? 0) - (standing?.groundRoll.value ?? 0)).toBeCloseTo(40, 9);
    expect((asked.distances?.takeoffDistance.value ?? 0) - (standing?.takeoffDistance.value ?? 0)).toBeCloseTo(40, 9);
    const classB = { ...rolling, ruleSet: 'eu-class-b', runway: { ...rolling.runway, declared: { tora: 1500 } } };
    const required = (question: TakeoffQuestion) => answered(question).assessment?.checks[0]?.required ?? 0;
    expect(required({ ...classB, procedure: { start: 'rolling' } }) - required(classB)).toBeCloseTo(50, 9);
  });
});
