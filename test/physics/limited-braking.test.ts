import { describe, expect, it } from 'vitest';
import { brakingFriction, constantBraking } from '../../src/physics/braking-friction.ts';
import { limitedBraking } from '../../src/physics/limited-braking.ts';

const psi = 6894.757293168361;
const wet = brakingFriction({ kind: 'paved', state: 'wet' }, 'fully-modulating', 100 * psi);
if (wet === 'no-data') throw new Error(wet);

describe('limitedBraking', () => {
  it('is the smaller of the two at every speed', () => {
    const limited = limitedBraking(wet, 0.35);
    for (let speed = 0; speed <= 110; speed += 2.5) expect(limited.at(speed)).toBe(Math.min(0.35, wet.at(speed)));
  });
  it('has a kink where they cross, beside those of the curve', () => {
    const limited = limitedBraking(wet, 0.35);
    expect(limited.kinks).toHaveLength(wet.kinks.length + 1);
    expect(wet.at(limited.kinks[0] as number)).toBeCloseTo(0.35, 8);
  });
  it('leaves alone what is below the limit, and is the limit where all is above', () => {
    expect(limitedBraking(wet, 0.9)).toBe(wet);
    const all = limitedBraking(constantBraking(0.4), 0.2);
    expect(all.at(0)).toBe(0.2);
    expect(all.at(40)).toBe(0.2);
    expect(all.kinks).toEqual([]);
  });
  it.each([-0.1, Number.NaN])('refuses a limit of %f by name', (limit) => {
    expect(() => limitedBraking(wet, limit)).toThrow(/limit/);
  });
});
