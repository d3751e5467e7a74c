import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { AeroplaneDefinition } from '../../../src/contract/aeroplane-definition.ts';
import { toAeroplane } from '../../../src/contract/to-aeroplane.ts';
import { maximumLiftRange } from '../../../src/performance/fit/maximum-lift-range.ts';
import { maximumLiftCoefficient } from '../../../src/performance/speeds/maximum-lift-coefficient.ts';
import { builtInFolder } from '../../support/catalogue-folder.ts';

const degree = Math.PI / 180;

describe('maximumLiftRange', () => {
  it('holds every configuration of the built-in aeroplanes', () => {
    const files = readdirSync(builtInFolder).filter((file) => file.endsWith('.json') && file !== 'manifest.json');
    expect(files.length).toBeGreaterThan(3);
    for (const file of files) {
      const definition = JSON.parse(readFileSync(join(builtInFolder, file), 'utf8')) as AeroplaneDefinition;
      const { category, configurations, wing } = toAeroplane(definition);
      for (const [id, { for: phases, flap, maximumLift }] of Object.entries(configurations)) {
        for (const phase of phases) {
          const coefficient = maximumLiftCoefficient(maximumLift, wing.area);
          const [low, high] = maximumLiftRange(category, phase, flap);
          expect(coefficient, `${file} ${id} ${phase}`).toBeGreaterThanOrEqual(low);
          expect(coefficient, `${file} ${id} ${phase}`).toBeLessThanOrEqual(high);
        }
      }
    }
  });

  it('has the usual ranges of light aeroplanes, 3 % on both sides: 1.3-1.6, 1.3-1.8, 1.8-2.2 [memory]', () => {
    const range = (phase: 'takeoff' | 'landing', flap: number) =>
      maximumLiftRange('single-piston', phase, flap * degree).map((bound) => Number(bound.toFixed(3)));
    expect(range('takeoff', 0)).toEqual([1.261, 1.648]);
    expect(range('takeoff', 10)).toEqual([1.261, 1.854]);
    expect(range('landing', 40)).toEqual([1.746, 2.266]);
  });

  it('calls 2.39 of a light single on takeoff, and 1.2, odd', () => {
    const [low, high] = maximumLiftRange('single-piston', 'takeoff', 10 * degree);
    expect(2.39).toBeGreaterThan(high);
    expect(1.2).toBeLessThan(low);
  });
});
