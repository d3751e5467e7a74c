import { describe, expect, it } from 'vitest';
import { completed } from '../../../src/numerics/work.ts';
import { fitLanding, type LandingFitAsked } from '../../../src/performance/fit/fit-landing.ts';
import { madeTables } from '../../published/made-tables.ts';
import { landingAsked } from '../../support/fit-asked.ts';

const degree = Math.PI / 180;
const tables = madeTables.tables.filter(({ phase }) => phase === 'landing');
const fitted = (asked: LandingFitAsked) => {
  const result = completed(fitLanding(asked));
  if (result.outcome !== 'fitted') throw new Error(JSON.stringify(result.findings));
  return result;
};

describe('fitLanding', () => {
  for (const table of tables) {
    const { id, truth, tolerance } = table;
    it(`recovers ${id}: braking ${truth[0]} within ${tolerance?.[0]}, ${truth[1]} degrees within ${tolerance?.[1]} [${madeTables.source}]`, () => {
      const { parameters, findings, accepted } = fitted(landingAsked(table));
      const [friction, angle] = parameters;
      expect(Math.abs((friction?.value as number) - (truth[0] as number))).toBeLessThan(tolerance?.[0] as number);
      expect(Math.abs((angle?.value as number) / degree - (truth[1] as number))).toBeLessThan(tolerance?.[1] as number);
      expect(findings).toEqual([]);
      expect(accepted).toBe(true);
    });

    const changed = (change: (kind: string, distance: number) => number): LandingFitAsked => {
      const asked = landingAsked(table);
      return {
        ...asked,
        points: asked.points.map((point) => ({
          ...point,
          observations: point.observations.map((one) => ({ ...one, distance: change(one.kind, one.distance) })),
        })),
      };
    };
    it(`names a column of ${id} in feet, and both [${madeTables.source}]`, () => {
      for (const [column, feet] of [
        ['groundRoll', (kind: string) => kind === 'groundRoll'],
        ['wholeDistance', (kind: string) => kind === 'wholeDistance'],
        ['distances', () => true],
      ] as const) {
        const asked = changed((kind, distance) => (feet(kind) ? distance / 0.3048 : distance));
        expect(completed(fitLanding(asked)).findings[0], column).toMatchObject({
          code: 'unit-error',
          column,
          printed: 'ft',
        });
      }
    });

    it(`holds the braking of ${id} without rolls, the angle without whole distances [${madeTables.source}]`, () => {
      const asked = landingAsked(table);
      const only = (index: number) =>
        fitted({
          ...asked,
          points: asked.points.map((point) => ({ ...point, observations: point.observations.slice(index, index + 1) })),
        });
      expect(only(0).parameters[1]).toMatchObject({ held: 'no-whole-distance', sd: 0 });
      expect(only(1).parameters[0]).toMatchObject({ held: 'no-ground-roll', value: 0.3 });
    });
  }
});
