import { describe, expect, it } from 'vitest';
import type { FixedPitch } from '../../../src/performance/aeroplane.ts';
import { takeoffCautions } from '../../../src/planning/cautions/takeoff-cautions.ts';
import type { contaminantKinds } from '../../../src/planning/question.ts';
import { references } from '../../../src/references.ts';
import { fittedUpTo, manualOf, withManual, withRollTimes, withSpeedsTo } from '../../support/flown-by-manual.ts';
import { answered, type Changes, changed, plainQuestion } from '../../support/takeoff-question.ts';

const kt = 1852 / 3600;
const ft = 0.3048;
const along = (knots: number): Changes => ({ weather: { wind: { kind: 'components', headwind: knots * kt } } });
const across = (knots: number): Changes => ({
  weather: { wind: { kind: 'components', headwind: 0, crosswind: knots * kt } },
});
const limit = (limitations: object): Changes => ({ aeroplane: { limitations } });
const both = (one: Changes, other: Changes): Changes => ({
  aeroplane: { ...one.aeroplane, ...other.aeroplane },
  configuration: { ...one.configuration, ...other.configuration },
  runway: { ...one.runway, ...other.runway },
  weather: { ...one.weather, ...other.weather },
  question: { ...one.question, ...other.question },
});
const declared = (tora: number, toda = tora): Changes => ({ runway: { declared: { tora, toda, asda: tora } } });
const from = (degrees: number, speed: number, more: object = {}): Changes => ({
  weather: {
    wind: { kind: 'from', from: (degrees * Math.PI) / 180, fromReference: 'true', speed: speed * kt, ...more },
  },
});
const dragging = (rollingFrictionCoefficient: number): Changes => ({
  runway: {
    surface: { kind: 'grass', state: 'wet', firmness: 'soft', rollingFrictionCoefficient },
    declared: { tora: 9000, toda: 9000 },
  },
});
const steep = both({ question: { mass: 1250 } }, declared(9000));
const hot = (altitude: number, temperature: number): Changes => ({
  runway: { elevation: altitude * ft },
  weather: { temperature, dewPoint: 250, pressure: { kind: 'pressureAltitude', value: altitude * ft } },
});
const screenAt = (ratio: number): Changes => ({
  configuration: {
    speeds: {
      rotation: { kind: 'stall-ratio', ratio: 1.15 },
      liftOff: { kind: 'stall-ratio', ratio: 1.15 },
      screen: { kind: 'stall-ratio', ratio },
    },
  },
});

/** With two engines, each with half the thrust, at these multiples of the stall speed. */
const twinAt = (rotation: number, screen: number): Changes => ({
  aeroplane: { engines: 2 },
  configuration: {
    speeds: {
      rotation: { kind: 'stall-ratio', ratio: rotation },
      liftOff: { kind: 'stall-ratio', ratio: 1.15 },
      screen: { kind: 'stall-ratio', ratio: screen },
    },
  },
});

const { propulsion } = plainQuestion.aeroplane;
/** With two engines of this static thrust each, and all that an engine failure needs [N], minimum control speed on the ground [kt]. */
const twinOf = (staticThrust: number, vmcg = 44, more: Changes = {}): Changes =>
  both(
    {
      aeroplane: {
        engines: 2,
        category: 'twin-piston',
        propulsion: { ...(propulsion as FixedPitch), staticThrust },
        brakes: { brakingFrictionCoefficient: 0.4, loadFactor: 0.85, antiSkid: 'none' },
        engineOut: { vmc: 45 * kt, vmcg: vmcg * kt, dragIncrementCoefficient: 0.01, propeller: 'feathered' },
      },
    },
    more,
  );
const decided = (knots: number): Changes => ({ question: { decisionSpeed: knots * kt } });

const atPower = (fullPowerRatio: number): Changes => ({
  aeroplane: { propulsion: { ...propulsion, powerSettings: { reduced: { fullPowerRatio } } } },
  question: { procedure: { power: 'reduced' } },
});
const rolling = (start: 'standing' | 'rolling'): Changes => ({
  configuration: { rollingStartAllowance: 45 },
  question: { procedure: { start } },
});

const filed = { aerodrome: 'some-field', revision: '2', changed: [] };
const atPoint = (full: number): Changes => ({
  runway: { start: { kind: 'point', name: 'B' }, onFile: { ...filed, full: { tora: full, toda: 9000, asda: 9000 } } },
});

const psi = 6894.757293168361;
/** A paved runway with something on it, and tyres that run in it. */
const on = (
  kind: (typeof contaminantKinds)[number],
  depth: number | undefined,
  code?: number | [number, number, number],
  tyrePressure = 30 * psi,
): Changes => ({
  aeroplane: {
    wheels: {
      arrangement: 'tricycle',
      tyrePressure,
      tyres: 3,
      maximumTyreWidth: 0.15,
      tyreDeflection: 0.03,
      sprayLength: 0,
    },
  },
  runway: {
    surface: {
      kind: 'paved',
      state: 'contaminated',
      contaminant: depth === undefined ? { kind } : { kind, depth },
      ...(code === undefined ? {} : { runwayConditionCode: code }),
    },
  },
});
const wetAt = (kind: 'paved' | 'gravel', pressure: number | undefined): Changes => ({
  aeroplane: { wheels: pressure === undefined ? { arrangement: 'tricycle' } : { tyrePressure: pressure * psi } },
  runway: { surface: { kind, state: 'wet' } },
});

/** A report of which everything was taken. */
const report = { station: 'ZZAB', replaced: [], notUnderstood: [], rounding: {} };

interface Pair {
  readonly code: string;
  readonly severity: string;
  /** differs from the other in one figure only, on the other side of what decides */
  readonly raised: Changes;
  readonly silent: Changes;
  readonly says: RegExp;
}

const pairs: readonly Pair[] = [
  {
    code: 'flight-manual-beside',
    severity: 'strong',
    raised: withManual(withSpeedsTo(1000, 'takeoff')),
    silent: withManual(withSpeedsTo(1010, 'takeoff')),
    says: /^The flight manual ends before what is asked\. Of its speeds: speed-table ends at a mass of 1 000 kg, and 1 010 kg is asked, so that the speeds are not the manual's\.$/,
  },
  {
    code: 'flight-manual-and-physics-differ',
    severity: 'caution',
    raised: withManual(withRollTimes(0.5)),
    silent: withManual(withRollTimes(1)),
    says: /gives a ground roll of \d+ m, physics \d+ m: [\d.]+ % more\.$/,
  },
  {
    code: 'report-replaced',
    severity: 'caution',
    raised: { question: { report: { ...report, replaced: ['temperature 22 degC in place of 18 degC'] } } },
    silent: { question: { report } },
    says: /^The report of ZZAB is not taken as it stands: temperature 22 degC in place of 18 degC\. That is 1 of its figures\.$/,
  },
  {
    code: 'report-old',
    severity: 'caution',
    raised: { question: { report: { ...report, age: 3660 } } },
    silent: { question: { report: { ...report, age: 3600 } } },
    says: /^The report of ZZAB is 61 min older than the time of the question\.$/,
  },
  {
    code: 'report-old',
    severity: 'caution',
    raised: { question: { report: { ...report, age: -600 } } },
    silent: { question: { report: { ...report, age: 0 } } },
    says: /^The report of ZZAB is 10 min later than the time of the question\.$/,
  },
  {
    code: 'report-not-understood',
    severity: 'note',
    raised: { question: { report: { ...report, notUnderstood: ['XYZ1'] } } },
    silent: { question: { report } },
    says: /^Nothing was taken from 1 group of the report of ZZAB, not understood: XYZ1\.$/,
  },
  {
    code: 'report-runway-state',
    severity: 'caution',
    raised: { question: { report: { ...report, runwayState: 'R07/290150' } } },
    silent: { question: { report } },
    says: /^The report of ZZAB tells of the runways: R07\/290150\. The surface of the question is taken: paved, dry\.$/,
  },
  {
    code: 'fit-outside-range',
    severity: 'caution',
    raised: fittedUpTo(1000),
    silent: fittedUpTo(1010),
    says: /^The physics was fitted to masses from 800 kg to 1 000 kg, and 1 010 kg is asked: the takeoff distance of \d+ m is beyond/,
  },
  {
    code: 'method-is-estimate',
    severity: 'note',
    raised: fittedUpTo(1010),
    silent: withManual(),
    says: /computed by physics fitted to published or measured distances, not read from the flight manual\./,
  },
  {
    code: 'flight-manual-edge',
    severity: 'caution',
    raised: withManual(manualOf(), -5),
    silent: withManual(manualOf(), 0),
    says: /takeoff-table begins at a temperature of 0 °C, and -5 °C is asked\. The figure at its edge is used as it stands/,
  },
  {
    code: 'flight-manual-silent',
    severity: 'caution',
    raised: { ...withManual(), runway: { ...withManual().runway, slope: 0.01 } },
    silent: withManual(),
    says: /does not speak of a slope of 1 % uphill\. Its takeoff distance of 613 m is carried there by physics on stated figures: the takeoff distance is \d+ m\.$/,
  },
  {
    code: 'flight-manual-and-physics-differ',
    severity: 'caution',
    raised: withManual(manualOf({ contains: { factor: 0.5, windAllowance: false } })),
    silent: withManual(),
    says: /^The flight manual gives a takeoff distance of [\d ]+ m, physics \d+ m: [\d.]+ % less\.$/,
  },
  {
    code: 'flight-manual-not-used',
    severity: 'caution',
    raised: { ...withManual(), question: { method: 'stated' } },
    silent: withManual(),
    says: /physics on stated figures, as asked\. The flight manual has its own/,
  },
  {
    code: 'flight-manual-not-used',
    severity: 'strong',
    raised: { ...withManual(manualOf(), 45), question: { method: 'stated' } },
    silent: withManual(manualOf(), 45),
    says: /The flight manual has none: takeoff-table ends at a temperature of 40 °C, and 45 °C is asked\.$/,
  },
  {
    code: 'condition-code-too-good',
    severity: 'caution',
    raised: on('compacted-snow', undefined, 4),
    silent: on('compacted-snow', undefined, 3),
    says: /^Condition code 4 is given, and compacted snow warmer than -15 °C is 3: 3 counts\.$/,
  },
  {
    code: 'condition-code-too-good',
    severity: 'caution',
    raised: on('ice', undefined, [1, 2, 1]),
    silent: on('ice', undefined, [1, 1, 1]),
    says: /^Condition code 2 is given, and ice is 1: 1 counts\.$/,
  },
  {
    code: 'condition-code-too-good',
    severity: 'caution',
    raised: on('ice', undefined, 5),
    silent: { runway: { surface: { kind: 'gravel', state: 'wet', runwayConditionCode: 5 } } },
    says: /^Condition code 5/,
  },
  {
    code: 'condition-code-too-good',
    severity: 'caution',
    raised: on('ice', undefined, 5),
    silent: on('ice', undefined, undefined),
    says: /^Condition code 5/,
  },
  {
    code: 'film-counts-as-wet',
    severity: 'note',
    raised: on('slush', 0.003),
    silent: on('slush', 0.0031),
    says: /^The runway counts as wet under 3 mm of slush, since that is no more than 3 mm; /,
  },
  {
    code: 'film-counts-as-wet',
    severity: 'note',
    raised: on('wet-snow', 0.002),
    silent: on('frost', undefined),
    says: /under 2 mm of wet snow/,
  },
  {
    code: 'film-counts-as-wet',
    severity: 'note',
    raised: on('wet-snow', 0.002),
    silent: { runway: { surface: { kind: 'paved', state: 'wet' } } },
    says: /under 2 mm of wet snow/,
  },
  {
    code: 'hydroplaning',
    severity: 'caution',
    raised: wetAt('paved', 30),
    silent: wetAt('paved', 40),
    says: /^The lift-off ground speed of \d+\.\d kt is above 49\.3 kt, at which the tyres begin to hydroplane/,
  },
  {
    code: 'hydroplaning',
    severity: 'caution',
    raised: wetAt('paved', undefined),
    silent: wetAt('gravel', undefined),
    says: /at which tyres of 30 psi, since no tyre pressure is stated, begin/,
  },
  {
    code: 'hydroplaning',
    severity: 'caution',
    raised: on('wet-snow', 0.02),
    silent: on('dry-snow', 0.02),
    says: /hydroplane/,
  },
  {
    code: 'hydroplaning',
    severity: 'caution',
    raised: on('slush', 0.005),
    silent: on('ice', undefined),
    says: /hydroplane/,
  },
  {
    code: 'tailwind-beyond-limit',
    severity: 'strong',
    raised: from(250, 5, { gust: 10.1 * kt }),
    silent: from(250, 5, { gust: 10 * kt }),
    says: /^In a gust the tailwind of \d+\.\d kt is 0\.1 kt beyond/,
  },
  {
    code: 'contaminant-holds-back',
    severity: 'caution',
    raised: on('slush', 0.0031),
    silent: on('slush', 0.003),
    says: /^The wheels push aside 3\.1 mm of slush, which holds the aeroplane back by \d+ N at lift-off\. /,
  },
  {
    code: 'stop-not-computed',
    severity: 'strong',
    raised: on('ice', undefined),
    silent: on('frost', undefined),
    says: /^The runway is slippery \(ice, condition code 1\)\./,
  },
  {
    code: 'stop-not-computed',
    severity: 'strong',
    raised: { runway: { surface: { kind: 'paved', state: 'wet', runwayConditionCode: 2 } } },
    silent: { runway: { surface: { kind: 'paved', state: 'wet', runwayConditionCode: 3 } } },
    says: /condition code 2\)/,
  },
  {
    code: 'stop-not-computed',
    severity: 'strong',
    raised: { runway: { surface: { kind: 'snow', state: 'dry' } } },
    silent: { runway: { surface: { kind: 'paved', state: 'dry' } } },
    says: /condition code 3\)/,
  },
  {
    code: 'stop-not-computed',
    severity: 'strong',
    raised: { runway: { surface: { kind: 'grass', state: 'flooded' } } },
    silent: { runway: { surface: { kind: 'grass', state: 'wet' } } },
    says: /slippery/,
  },
  {
    code: 'margin-negative',
    severity: 'caution',
    raised: declared(420),
    silent: declared(421),
    says: /^The check takeoff-distance is short by 1 m: 421 m required, 420 m available\.$/,
  },
  {
    code: 'margin-negative',
    severity: 'caution',
    raised: declared(200),
    silent: declared(421),
    says: /2 checks fail\.$/,
  },
  {
    code: 'margin-thin',
    severity: 'caution',
    raised: declared(462),
    silent: declared(596),
    says: /^The check takeoff-distance passes with 41 m spare on runway 07, 9\.9 % of what is required/,
  },
  {
    code: 'margin-thin',
    severity: 'caution',
    raised: declared(594),
    silent: declared(596),
    says: /^At the high end of the 90 % band, with the same factors, the check takeoff-distance would require 595 m; 594 m is available\.$/,
  },
  {
    code: 'mass-above-maximum',
    severity: 'strong',
    raised: { question: { mass: 1051 } },
    silent: { question: { mass: 1050 } },
    says: /^Mass 1 051 kg is 1 kg above the maximum takeoff mass of 1 050 kg\./,
  },
  {
    code: 'temperature-above-limit',
    severity: 'strong',
    raised: { weather: { temperature: 313.25 } },
    silent: { weather: { temperature: 313.15 } },
    says: /^Temperature 40\.1 °C is 0\.1 °C above the aeroplane's maximum of 40 °C\./,
  },
  {
    code: 'temperature-above-limit',
    severity: 'strong',
    raised: both({ weather: { temperature: 303.15 } }, limit({ maximumTemperature: 300 })),
    silent: both({ weather: { temperature: 303.15 } }, limit({})),
    says: /^Temperature 30 °C/,
  },
  {
    code: 'pressure-altitude-above-limit',
    severity: 'strong',
    raised: hot(10_001, 268),
    silent: hot(10_000, 268),
    says: /^Pressure altitude 10 001 ft is 1 ft above the aeroplane's maximum of 10 000 ft\./,
  },
  {
    code: 'pressure-altitude-above-limit',
    severity: 'strong',
    raised: both(hot(5000, 268), limit({ maximumPressureAltitude: 1000 })),
    silent: both(hot(5000, 268), limit({})),
    says: /above the aeroplane's maximum of 3 281 ft/,
  },
  {
    code: 'tailwind-beyond-limit',
    severity: 'strong',
    raised: along(-10.1),
    silent: along(-10),
    says: /^Tailwind 10\.1 kt is 0\.1 kt beyond 10 kt, where data of aeroplanes usually end\.$/,
  },
  {
    code: 'tailwind-beyond-limit',
    severity: 'strong',
    raised: both(along(-5.1), limit({ tailwind: 5 * kt })),
    silent: both(along(-5), limit({ tailwind: 5 * kt })),
    says: /^Tailwind 5\.1 kt is 0\.1 kt beyond the aeroplane's limitation of 5 kt\.$/,
  },
  {
    code: 'tailwind-beyond-limit',
    severity: 'strong',
    raised: both(along(-13), limit({ tailwind: 12 * kt })),
    silent: both(along(-10), limit({ tailwind: 12 * kt })),
    says: /^Tailwind 13 kt is 1 kt beyond the aeroplane's limitation of 12 kt\.$/,
  },
  {
    code: 'tailwind',
    severity: 'caution',
    raised: along(-0.06),
    silent: along(-0.04),
    says: /^Tailwind 0\.1 kt on runway 07\. It lengthens the ground roll from 215 m to 215 m\.$/,
  },
  {
    code: 'tailwind',
    severity: 'caution',
    raised: both(along(-6), { runway: { surface: { kind: 'snow', state: 'dry' } } }),
    silent: both(along(6), { runway: { surface: { kind: 'snow', state: 'dry' } } }),
    says: /^Tailwind 6 kt on runway 07\. It raises the speed over the ground at lift-off by as much\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'caution',
    raised: across(15.1),
    silent: across(15),
    says: /^Crosswind 15\.1 kt on runway 07 is 0\.1 kt beyond the demonstrated 15 kt\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'caution',
    raised: from(160, 12, { gust: 16 * kt }),
    silent: from(160, 12),
    says: /^Crosswind 16 kt in gusts on runway 07 is 1 kt beyond the demonstrated 15 kt\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'strong',
    raised: both(across(21), limit({ crosswind: 20 * kt, demonstratedCrosswind: 15 * kt })),
    silent: both(across(15), limit({ crosswind: 20 * kt, demonstratedCrosswind: 15 * kt })),
    says: /beyond the limitation 20 kt\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'caution',
    raised: both(across(20), limit({ crosswind: 20 * kt, demonstratedCrosswind: 15 * kt })),
    silent: both(across(20), limit({ crosswind: 20 * kt, demonstratedCrosswind: 20 * kt })),
    says: /is 5 kt beyond the demonstrated 15 kt\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'strong',
    raised: both(across(21), limit({ crosswind: 20 * kt })),
    silent: both(across(20), limit({ crosswind: 20 * kt })),
    says: /is 1 kt beyond the limitation 20 kt\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'caution',
    raised: across(30),
    silent: both(across(30), limit({})),
    says: /^Crosswind 30 kt/,
  },
  {
    code: 'wind-variable',
    severity: 'note',
    raised: from(70, 10, { variable: { from: (40 * Math.PI) / 180, to: (130 * Math.PI) / 180 } }),
    silent: from(70, 10),
    says: /The least favourable of the sector is taken: headwind 5 kt\.$/,
  },
  {
    code: 'gust-not-credited',
    severity: 'note',
    raised: from(70, 10, { gust: 20 * kt }),
    // 27.78 km/h, which is 15 kt but for the last bit
    silent: from(70, 15, { gust: 27.78 * (1 / 3.6) }),
    says: /^Gusts of 20 kt, 10 kt over the mean wind\. Distances count the mean of 10 kt only\.$/,
  },
  {
    code: 'gust-not-credited',
    severity: 'note',
    raised: from(250, 5, { gust: 9 * kt }),
    silent: from(250, 5),
    says: /in a gust the tailwind is 9 kt, the mean is 5 kt\.$/,
  },
  {
    code: 'acceleration-marginal',
    severity: 'strong',
    raised: dragging(0.22),
    silent: dragging(0.21),
    says: /^The least acceleration of the ground roll is [01]\.\d+ % of that of gravity\./,
  },
  {
    code: 'climb-gradient-marginal',
    severity: 'caution',
    raised: both(steep, hot(5000, 295)),
    silent: both(steep, hot(4800, 295)),
    says: /^The least climb gradient on the way to the screen is [12]\.\d+ %\./,
  },
  {
    code: 'density-altitude-high',
    severity: 'caution',
    raised: hot(4950, 280),
    silent: hot(4500, 280),
    says: /^Density altitude 5 \d+ ft, \d+ ft above the elevation of runway 07\. The lift-off speed of 53\.4 kt calibrated is \d+\.?\d* kt true\.$/,
  },
  {
    code: 'density-altitude-high',
    severity: 'note',
    raised: hot(1000, 304.5),
    silent: hot(1000, 301),
    says: /^Density altitude 3 \d+ ft, 2 \d+ ft above/,
  },
  {
    code: 'temperature-far-from-standard',
    severity: 'caution',
    raised: both(hot(0, 318.2), limit({})),
    silent: both(hot(0, 318.1), limit({})),
    says: /^Temperature 45\.1 °C is 30\.1 °C above standard\. The air is 9\.4 % thinner than on a standard day\.$/,
  },
  {
    code: 'temperature-far-from-standard',
    severity: 'caution',
    raised: hot(0, 258.05),
    silent: hot(0, 258.2),
    says: /30\.1 °C below standard/,
  },
  {
    code: 'pressure-extreme',
    severity: 'caution',
    raised: { weather: { pressure: { kind: 'qnh', value: 94_990 } } },
    silent: { weather: { pressure: { kind: 'qnh', value: 95_000 } } },
    says: /^QNH 949\.9 hPa is below 950 hPa\. It puts the pressure altitude 1 77\d ft above the elevation\.$/,
  },
  {
    code: 'pressure-extreme',
    severity: 'caution',
    raised: { weather: { pressure: { kind: 'qnh', value: 105_010 } } },
    silent: { weather: { pressure: { kind: 'qnh', value: 105_000 } } },
    says: /^QNH 1 050\.1 hPa is above 1 050 hPa\. It puts the pressure altitude 99\d ft below the elevation\.$/,
  },
  {
    code: 'pressure-extreme',
    severity: 'caution',
    raised: { weather: { pressure: { kind: 'qnh', value: 94_000 } } },
    silent: { weather: { pressure: { kind: 'stationPressure', value: 94_000 } } },
    says: /^QNH 940 hPa/,
  },
  {
    code: 'slope-steep',
    severity: 'caution',
    raised: { runway: { slope: 0.0201 } },
    silent: { runway: { slope: 0.02 } },
    says: /^Runway 07 slopes 2\.01 % uphill/,
  },
  {
    code: 'slope-steep',
    severity: 'caution',
    raised: { runway: { slope: -0.0201 } },
    silent: { runway: { slope: -0.02 } },
    says: /^Runway 07 slopes 2\.01 % downhill/,
  },
  {
    code: 'clearway-capped',
    severity: 'caution',
    raised: declared(1000, 1510),
    silent: declared(1000, 1500),
    says: /10 m of the declared TODA is not counted: 1 500 m is available\.$/,
  },
  {
    code: 'screen-speed-below-lift-off',
    severity: 'caution',
    raised: screenAt(1.14),
    silent: screenAt(1.15),
    says: /^The speed at the screen, 52\.9 kt calibrated, is below the lift-off speed of 53\.4 kt\./,
  },
  {
    code: 'reduced-power',
    severity: 'note',
    raised: atPower(0.9),
    silent: atPower(1),
    says: /^The takeoff is at 90 % of full power\. It lengthens the takeoff distance from 421 m to 4[6-9]\d m\.$/,
  },
  {
    code: 'stage-not-known',
    severity: 'caution',
    raised: { question: { ruleSet: 'eu-class-b', stage: 'in-flight' } },
    silent: { question: { ruleSet: 'eu-class-b', stage: 'dispatch' } },
    says: /class B\) have no figures of their own for in flight\. Those for before departure are used: takeoff-run requires 526 m\.$/,
  },
  {
    code: 'stage-not-known',
    severity: 'caution',
    raised: { question: { ruleSet: 'eu-class-b', stage: 'in-flight' } },
    silent: { question: { ruleSet: 'unfactored', stage: 'in-flight' } },
    says: /class B/,
  },
  {
    code: 'rolling-start',
    severity: 'note',
    raised: rolling('rolling'),
    silent: rolling('standing'),
    says: /^Rolling start: 45 m are added to the ground roll/,
  },
  {
    code: 'aeroplane-changed',
    severity: 'note',
    raised: {
      question: {
        changes: {
          basedOn: 'plain-trainer',
          revision: '1',
          because: 'a new propeller',
          changed: ['propulsion/staticThrust 2366 N in place of 2300 N'],
        },
      },
    },
    silent: {},
    says: /^The aeroplane is plain-trainer, revision 1, with changes: propulsion\/staticThrust 2366 N in place of 2300 N\. The reason given: "a new propeller"\./,
  },
  {
    code: 'slope-steep',
    severity: 'caution',
    raised: { runway: { slope: 0.005, profile: { ends: [200, 9000], slopes: [0.021, 0.0046] } } },
    silent: { runway: { slope: 0.005, profile: { ends: [200, 9000], slopes: [0.02, 0.0046] } } },
    says: /^A stretch of runway 07 slopes 2\.1 % uphill/,
  },
  {
    code: 'point-at-full-length',
    severity: 'caution',
    raised: atPoint(1500),
    silent: atPoint(1501),
    says: /^TORA from B is 1 500 m, no less than for the whole of runway 07\./,
  },
  {
    code: 'runway-changed',
    severity: 'note',
    raised: { runway: { onFile: { ...filed, changed: ['declared/tora 1400 m in place of 1500 m'] } } },
    silent: { runway: { onFile: filed } },
    says: /^Runway 07 is that of some-field, revision 2, with changes of the question: declared\/tora 1400 m/,
  },
  {
    code: 'takeoff-speeds-raised',
    severity: 'caution',
    raised: twinAt(1.09, 1.2),
    silent: twinAt(1.1, 1.2),
    says: /^The rotation speed of the schedule is 50\.6 kt calibrated at this mass; cs-23-amendment-4 asks for at least 1\.05 times the minimum control speed and 1\.10 times the stall speed\. 51\.1 kt is taken instead\.$/,
  },
  {
    code: 'takeoff-speeds-raised',
    severity: 'note',
    raised: both(twinAt(1.15, 1.25), { aeroplane: { engines: 2, engineOut: { vmc: 54 * kt } } }),
    silent: both(twinAt(1.15, 1.25), { aeroplane: { engines: 2, engineOut: { vmc: 50 * kt } } }),
    says: /asks for at least 1\.05 times.*56\.7 kt is taken instead\. The speed at the screen .* 59\.4 kt is taken instead\.$/,
  },
  {
    code: 'engine-out-cannot-continue',
    severity: 'strong',
    raised: twinOf(1183),
    silent: twinOf(2366),
    says: /^With one engine out the aeroplane does not climb to the screen: the least gradient is -1\.81 %\. Rejected at 53\.4 kt calibrated the takeoff ends after \d+ m; later there is no distance\.$/,
  },
  {
    code: 'engine-out-climb-not-positive',
    severity: 'strong',
    raised: twinOf(1183),
    silent: twinOf(2366),
    says: /^With one engine out the climb gradient is -1\.88 % at lift-off, .* at 1 500 ft above the runway: no height is gained there\.$/,
  },
  {
    code: 'no-decision-speed',
    severity: 'strong',
    raised: twinOf(2366, 54),
    silent: twinOf(2366, 53),
    says: /^No decision speed: it is at least 54\.\d kt true airspeed by the minimum control speed on the ground, and at most 53\.8 kt by the rotation speed\.$/,
  },
  {
    code: 'decision-range-empty',
    severity: 'strong',
    raised: both(twinOf(2366), declared(350)),
    silent: both(twinOf(2366), declared(360)),
    says: /^With one engine out the aeroplane does not go on within TODA: that takes 357 m, 350 m available, and stops within ASDA from up to 53\.8 kt true airspeed\.$/,
  },
  {
    code: 'decision-range-empty',
    severity: 'strong',
    raised: both(twinOf(4000), { runway: { declared: { tora: 240, toda: 245, asda: 240 } } }),
    silent: both(twinOf(4000), declared(250)),
    says: /goes on within TODA from 53 kt true airspeed on, and stops within ASDA from up to 52\.1 kt true airspeed\. After an engine failure between 52\.1 kt and 53 kt it does neither\.$/,
  },
  {
    code: 'decision-speed-out-of-range',
    severity: 'strong',
    raised: both(both(twinOf(4000), declared(250)), decided(46)),
    silent: both(both(twinOf(4000), declared(260)), decided(46)),
    says: /^The decision speed of 46 kt calibrated is below the speed from which the continued takeoff fits, \d+\.\d kt: after a failure then the aeroplane does not pass the screen within TODA\.$/,
  },
  {
    code: 'decision-speed-unbalanced',
    severity: 'note',
    raised: both(twinOf(4000, 30), decided(40)),
    silent: both(twinOf(4000, 30), decided(52)),
    says: /^At the decision speed of 40 kt calibrated the longer of stop and continued takeoff is 2\d\d m, [\d.]+ % more than the 24\d m at 52\.\d kt true airspeed\.$/,
  },
  {
    code: 'decision-limited-by-control',
    severity: 'caution',
    raised: twinOf(4000, 53),
    silent: twinOf(4000, 52),
    says: /^The decision speed of 53 kt calibrated is the minimum control speed on the ground\. The stop from it takes 2\d\d m, the continued takeoff 2\d\d m\.$/,
  },
  {
    code: 'engine-out-data-missing',
    severity: 'strong',
    raised: both(twinOf(2366), { aeroplane: { engineOut: {}, brakes: {} } }),
    silent: twinOf(2366),
    says: /^No minimum control speed is stated \(\/aeroplane\/definition\/engineOut\/vmcg\): .* No braking friction is stated \(\/aeroplane\/definition\/brakes\/brakingFrictionCoefficient\)/,
  },
  {
    code: 'engine-out-by-physics',
    severity: 'note',
    raised: twinOf(2366, 44, withManual()),
    silent: twinOf(2366),
    says: /^The distances with 1 engine out are computed, not read in the flight manual\. With all engines physics has \d+ m, [\d.]+ % (less|more) than the manual\.$/,
  },
  {
    code: 'assumption-matters',
    severity: 'note',
    raised: { runway: { surface: { kind: 'paved', state: 'dry' } } },
    silent: { runway: { surface: { kind: 'paved', state: 'dry', rollingFrictionCoefficient: 0.03 } } },
    says: /^One assumed value moves the takeoff distance by more than 1 %: rolling friction, taken as 0\.03\. At 0\.04 the distance is [\d.]+ % longer\.$/,
  },
  {
    code: 'assumption-matters',
    severity: 'caution',
    raised: { runway: { surface: { kind: 'grass', state: 'wet', grass: 'short' } } },
    silent: { runway: { surface: { kind: 'paved', state: 'dry', rollingFrictionCoefficient: 0.03 } } },
    says: /rolling friction, taken as 0\.08\./,
  },
  {
    code: 'method-is-estimate',
    severity: 'note',
    raised: {},
    silent: { runway: { surface: { kind: 'snow', state: 'dry' } } },
    says: /The takeoff distance of 421 m has a 90 % band from 29\d m to 59\d m\.$/,
  },
];

describe('the cautions of a takeoff', () => {
  it.each(pairs)('$code ($severity): raised on one side and silent on the other: $says', (pair) => {
    const { code, severity, raised, silent, says } = pair;
    const found = answered(changed(plainQuestion, raised)).cautions.find((one) => one.code === code);
    expect(found?.message).toMatch(says);
    expect(found?.severity).toBe(severity);
    expect(found?.at).toMatch(/^\//);
    expect(answered(changed(plainQuestion, silent)).cautions.map((one) => one.code)).not.toContain(code);
  });

  it('has a pair for every caution there is', () => {
    expect([...new Set(pairs.map(({ code }) => code))].sort()).toEqual(takeoffCautions.map(({ code }) => code).sort());
  });
  it.each([
    [
      'the manual',
      undefined,
      /^The flight manual gives a takeoff distance of [\d ]+ m, physics [\d ]+ m: [\d.]+ % more\.$/,
    ],
    [
      'physics',
      'stated',
      /^Physics gives a takeoff distance of [\d ]+ m, the flight manual [\d ]+ m: [\d.]+ % less\.$/,
    ],
  ] as const)('says of which of the two the distance is where they differ, carried uphill: %s', (_, method, says) => {
    const manual = manualOf({ contains: { factor: 2.5, windAllowance: false } });
    const uphill = changed(plainQuestion, { ...withManual(manual), runway: { ...withManual().runway, slope: 0.01 } });
    const found = answered(method === undefined ? uphill : { ...uphill, method });
    expect(found.cautions.find(({ code }) => code === 'flight-manual-and-physics-differ')?.message).toMatch(says);
  });
  it('expects the edge of a table to be longer than physics, and never to be shorter', () => {
    const light = (factor: number) =>
      answered(
        changed(plainQuestion, {
          ...withManual(manualOf({ contains: { factor, windAllowance: false } })),
          question: { mass: 760 },
        }),
      );
    const [longer, shorter] = [light(1), light(4)];
    expect(longer.basis.other?.ratio).toBeLessThan(Math.exp(-0.3));
    expect(longer.cautions.map(({ code }) => code)).not.toContain('flight-manual-and-physics-differ');
    expect(shorter.cautions.map(({ code }) => code)).toContain('flight-manual-and-physics-differ');
  });
  it('is quiet about a plain question but for the method', () => {
    expect(answered(plainQuestion).cautions.map(({ code }) => code)).toEqual(['method-is-estimate']);
  });
  it('writes codes in kebab-case, each once, with a meaning and a known source', () => {
    const codes = takeoffCautions.map(({ code }) => code);
    expect(new Set(codes).size).toBe(codes.length);
    for (const { code, meaning, source } of takeoffCautions) {
      expect(code).toMatch(/^[a-z]+(-[a-z]+)*$/);
      expect(meaning).toMatch(/^[A-Z].*\.$/);
      expect(Object.keys(references)).toContain(source);
    }
  });
  it('writes facts with numbers: no orders, capitals or exclamation marks', () => {
    for (const { raised } of pairs) {
      for (const { message } of answered(changed(plainQuestion, raised)).cautions) {
        expect(message).toMatch(/\d/);
        expect(message).toMatch(/^[A-Z].*\.$/);
        expect(message).not.toMatch(/!|must|should|do not|NaN|undefined|go\/no/i);
      }
    }
  });
});
