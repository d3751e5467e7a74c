import { describe, expect, it } from 'vitest';
import type { Aeroplane, Configuration } from '../../../src/performance/aeroplane.ts';
import { landingProcedureFaults } from '../../../src/planning/procedure/landing-procedure-faults.ts';
import type { LandingProcedure } from '../../../src/planning/question.ts';
import { plainLanding, statedLander } from '../../support/landing-question.ts';
import { changed } from '../../support/takeoff-question.ts';

const degree = Math.PI / 180;
const landing = statedLander.configurations['landing'] as Configuration;
const { approachAngle: _, freeRollTime: __, speeds: ___, ...little } = landing;
const { brakes: ____, ...unbraked } = statedLander;
const silent: Aeroplane = { ...unbraked, configurations: { landing: little } };
const system: Aeroplane = { ...statedLander, brakes: { antiSkid: 'on-off' } };
const reverse: Aeroplane = { ...statedLander, reverseThrust: { thrust: 900, cutOffSpeed: 15 } };

const found = (aeroplane: Aeroplane, procedure: LandingProcedure) =>
  landingProcedureFaults({ ...plainLanding, aeroplane, procedure });

describe('the procedure of a landing', () => {
  const missing: readonly [string, LandingProcedure, string][] = [
    ['approachSpeedIncrement', { approachSpeedIncrement: 3 }, 'configurations.landing.speeds.landingReference'],
    ['approachAngle', { approachAngle: 3 * degree }, 'configurations.landing.approachAngle'],
    ['reverse', { reverse: true }, 'reverseThrust'],
    ['antiSkid', { antiSkid: 'inoperative' }, 'brakes.antiSkid'],
    ['reactionTime', { reactionTime: 2 }, 'configurations.landing.freeRollTime'],
  ];
  it.each(missing)(
    'refuses %s where the definition has no data for it, and names them',
    (member, procedure, needed) => {
      const [fault, ...rest] = found(silent, procedure);
      expect(rest).toEqual([]);
      expect(fault).toMatchObject({ pointer: `/procedure/${member}`, code: 'missing' });
      expect(fault?.message).toContain(`it would need ${needed}.`);
    },
  );
  it('takes each where the definition has data for it', () => {
    expect(found(statedLander, { approachSpeedIncrement: 3, approachAngle: 4 * degree, reactionTime: 1 })).toEqual([]);
    expect(found(reverse, { reverse: true })).toEqual([]);
    expect(found(system, { antiSkid: 'operative' })).toEqual([]);
    expect(found(system, { antiSkid: 'inoperative' })).toEqual([]);
    expect(found(statedLander, { reverse: false, antiSkid: 'inoperative' })).toEqual([]);
  });
  it('refuses anti-skid that is operative on an aeroplane with none', () => {
    expect(found(statedLander, { antiSkid: 'operative' })[0]).toMatchObject({ code: 'contradiction' });
  });
  it("goes up to 4 degrees, and to the definition's own approach angle where that is steeper", () => {
    expect(found(statedLander, { approachAngle: 4.1 * degree })[0]).toMatchObject({ code: 'contradiction' });
    const steep = changed(plainLanding, { configuration: { approachAngle: 5.5 * degree } }).aeroplane;
    expect(found(steep, { approachAngle: 5.5 * degree })).toEqual([]);
    expect(found(steep, { approachAngle: 5.6 * degree })[0]?.allowed).toBe('up to 5.5°');
  });
  it('does not let the brakes come sooner than the definition has it', () => {
    expect(found(statedLander, { reactionTime: 0.9 })[0]).toMatchObject({
      code: 'contradiction',
      allowed: '1 s or more',
    });
  });
  it('names every fault at once', () => {
    const all = Object.assign({}, ...missing.map(([, procedure]) => procedure)) as LandingProcedure;
    expect(found(silent, all)).toHaveLength(missing.length);
  });
});
