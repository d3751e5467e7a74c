import { describe, expect, it } from 'vitest';
import type { FailureDistances } from '../../../../src/planning/engine-failure/engine-failure-check.ts';
import { certifiedTakeoff } from '../../../../src/planning/rules/certification/certified-takeoff.ts';
import {
  transportLandingClimbs,
  transportTakeoffClimbs,
} from '../../../../src/planning/rules/certification/transport-climbs.ts';
import { usPart121 } from '../../../../src/planning/rules/operating/us-part-121.ts';
import { allEnginesFactors, greaterOfTwo, transportGradients } from '../../../published/certification.ts';
import { asked, checksFrom, noFailure, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const transport = ruled({ category: 'twin-jet', basis: 'cs-25' });
const commuter = ruled({ category: 'twin-jet', basis: 'cs-23-commuter' });
const rules = { ...usPart121.takeoff, readings: certifiedTakeoff('Cfr121s189') };
const withClearway = { tora: 3000, toda: 3500, asda: 3000 };
const checks = (aeroplane = transport, published = withClearway, aeo = 2555, failure: Partial<FailureDistances> = {}) =>
  checksFrom(
    rules,
    asked({ aeroplane, published }),
    { reference: undefined, credited: aeo },
    { onRunway: { ...noFailure, ...failure } },
  );
const check = (code: string, ...of: Parameters<typeof checks>) => checks(...of).find((one) => one.code === code);

describe('a certified takeoff', () => {
  it.each(allEnginesFactors)('$title', ({ expected, status }) => {
    const found = check('takeoff-distance-all-engines');
    expectNear(found?.required, 2555 * expected, 1e-9);
    expect(found?.factors.map((one) => one.status)).toEqual([status]);
  });
  it.each(greaterOfTwo)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(
      check('takeoff-distance-all-engines', transport, withClearway, inputs.aeo_m)?.required,
      expected,
      tolerance,
    );
    // the other of the two, which is the greater here
    expect(inputs.oei_m).toBeGreaterThan(expected);
    const other = check('takeoff-distance-engine-out', transport, withClearway, inputs.aeo_m, {
      accelerateGoDistance: inputs.oei_m,
    });
    expect([other?.required, other?.result, other?.factors]).toEqual([inputs.oei_m, 'passes', []]);
    expect(check('takeoff-distance-engine-out')?.result).toBe('not-assessed');
  });
  it('requires on a wet runway no less than on the same runway dry, and shows both [25.113(b); read]', () => {
    const of = (wet: number, dry: number) => {
      const wetAndDry = (go: number) => ({ ...noFailure, accelerateGoDistance: go, engineOutTakeoffRun: go });
      const found = checksFrom(
        rules,
        asked({ aeroplane: transport, published: withClearway }),
        { reference: undefined, credited: 1000 },
        { onRunway: wetAndDry(wet), dry: wetAndDry(dry) },
      ).find(({ code }) => code === 'takeoff-distance-engine-out');
      return [found?.required, found?.alternative?.required];
    };
    expect([of(2100, 2000), of(2000, 2100)]).toEqual([
      [2100, 2000],
      [2100, 2000],
    ]);
  });
  it('ends its run between lift-off and screen where there is a clearway, and at the screen where there is none', () => {
    const of = (toda: number | undefined) =>
      check('takeoff-run-all-engines', transport, { ...withClearway, toda: toda as number })?.of;
    expect([of(3001), of(3000), of(undefined)]).toEqual(['takeoffRun', 'takeoffDistance', 'takeoffDistance']);
  });
  it('stops with all engines and with a failure apart in the transport category, by the longer in the commuter category', () => {
    const stops = (aeroplane: typeof transport) =>
      checks(aeroplane, withClearway, 2555, {
        accelerateStopDistance: 2100,
        accelerateStopAllEngines: 2100,
        accelerateStopEngineOut: 3001,
      }).flatMap(({ code, required, result }) =>
        code.startsWith('accelerate-stop') ? [[code, required, result]] : [],
      );
    expect(stops(transport)).toEqual([
      ['accelerate-stop-all-engines', 2100, 'passes'],
      ['accelerate-stop-engine-out', 3001, 'fails'],
    ]);
    expect(stops(commuter)).toEqual([['accelerate-stop', 2100, 'passes']]);
    expect(check('takeoff-distance-all-engines', commuter)?.factors[0]?.status).toBe('memory');
  });
});

describe('gradients of the transport category', () => {
  const demands = [...transportTakeoffClimbs, ...transportLandingClimbs];
  it.each(transportGradients)('$title', ({ inputs, expected, tolerance, status }) => {
    const { code, engines } = inputs;
    const aeroplane = ruled({ category: 'twin-jet', basis: 'cs-25', engines });
    const found = demands.filter((one) => one.code === code && one.appliesTo(aeroplane));
    expect(found).toHaveLength(1);
    expectNear((found[0]?.gradient ?? Number.NaN) * 100, expected, tolerance);
    expect([found[0]?.status, found[0]?.positive === true]).toEqual([status, expected === 0]);
  });
  it('are asked of no other category', () => {
    for (const { appliesTo } of demands) expect(appliesTo(commuter)).toBe(false);
  });
});
