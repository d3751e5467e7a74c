import { describe, expect, it } from 'vitest';
import { landingCautions } from '../../../src/planning/cautions/landing-cautions.ts';
import { takeoffCautions } from '../../../src/planning/cautions/takeoff-cautions.ts';
import type { contaminantKinds } from '../../../src/planning/question.ts';
import { references } from '../../../src/references.ts';
import { fittedUpTo, manualOf, withManual, withRollTimes, withSpeedsTo } from '../../support/flown-by-manual.ts';
import {
  along,
  type LandingChanges,
  landed,
  plainLanding,
  wetGrass,
  wetPavement,
} from '../../support/landing-question.ts';
import { changed } from '../../support/takeoff-question.ts';

const kt = 1852 / 3600;
const ft = 0.3048;
const degree = Math.PI / 180;
const { brakes, limitations, propulsion } = plainLanding.aeroplane;
const slope = (percent: number): LandingChanges => ({ runway: { slope: percent / 100 } });
const declared = (lda: number): LandingChanges => ({ runway: { declared: { lda } } });
const mass = (kilograms: number): LandingChanges => ({ question: { mass: kilograms } });
const flown = (procedure: object): LandingChanges => ({ question: { procedure } });
const limited = (changes: object): LandingChanges => ({ aeroplane: { limitations: { ...limitations, ...changes } } });
const from = (degrees: number, speed: number, more: object = {}): LandingChanges => ({
  weather: { wind: { kind: 'from', from: degrees * degree, fromReference: 'true', speed: speed * kt, ...more } },
});
const hot = (altitude: number, temperature: number): LandingChanges => ({
  runway: { elevation: altitude * ft },
  weather: { temperature, dewPoint: 250, pressure: { kind: 'pressureAltitude', value: altitude * ft } },
});
const referenceAt = (ratio: number): LandingChanges => ({
  configuration: {
    speeds: { landingReference: { kind: 'stall-ratio', ratio }, touchdown: { kind: 'stall-ratio', ratio: 1.15 } },
  },
});
const controlled = (vmc: number): LandingChanges => ({ aeroplane: { engineOut: { vmc: vmc * kt } } });
const reversed = (reverse: boolean): LandingChanges => ({
  aeroplane: { reverseThrust: { thrust: 1500, cutOffSpeed: 20 * kt } },
  question: { procedure: { reverse } },
});
const modulated = (antiSkid: 'operative' | 'inoperative'): LandingChanges => ({
  aeroplane: { brakes: { ...brakes, brakingFrictionCoefficient: 0.45, antiSkid: 'fully-modulating' } },
  question: { procedure: { antiSkid } },
});
const climbing = (staticThrust: number): LandingChanges => ({
  aeroplane: { propulsion: { ...propulsion, staticThrust } as typeof propulsion },
});
const measuredTo = (knots: number): LandingChanges => ({
  aeroplane: {
    propulsion: {
      kind: 'measured',
      airspeeds: [0, knots * kt],
      thrusts: [2400, 2100],
      density: 1.225,
      densityExponent: 1,
      thrustFactor: 1,
    },
  },
});

const filed = { aerodrome: 'some-field', revision: '2', changed: [] };
const atPoint = (full: number): LandingChanges => ({
  runway: { start: { kind: 'point', name: 'B' }, onFile: { ...filed, full: { lda: full } } },
});

const psi = 6894.757293168361;
/** A paved runway with something on it, and tyres that run in it. */
const on = (
  kind: (typeof contaminantKinds)[number],
  depth: number | undefined,
  code?: number | [number, number, number],
  tyrePressure = 30 * psi,
): LandingChanges => ({
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
const wetAt = (kind: 'paved' | 'gravel', pressure: number | undefined): LandingChanges => ({
  aeroplane: { wheels: pressure === undefined ? { arrangement: 'tricycle' } : { tyrePressure: pressure * psi } },
  runway: { surface: { kind, state: 'wet' } },
});

/** A report of which everything was taken. */
const report = { station: 'ZZAB', replaced: [], notUnderstood: [], rounding: {} };

interface Pair {
  readonly code: string;
  readonly severity: string;
  /** differs from the other in one figure only, on the other side of what decides */
  readonly raised: LandingChanges;
  readonly silent: LandingChanges;
  readonly says: RegExp;
}

const pairs: readonly Pair[] = [
  {
    code: 'flight-manual-beside',
    severity: 'strong',
    raised: withManual(withSpeedsTo(1000, 'landing')),
    silent: withManual(withSpeedsTo(1010, 'landing')),
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
    says: /^The physics was fitted to masses from 800 kg to 1 000 kg, and 1 010 kg is asked: the landing distance of \d+ m is beyond/,
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
    says: /landing-table begins at a temperature of 0 °C, and -5 °C is asked\. The figure at its edge is used as it stands/,
  },
  {
    code: 'flight-manual-silent',
    severity: 'caution',
    raised: { ...withManual(), runway: { ...withManual().runway, slope: 0.01 } },
    silent: withManual(),
    says: /does not speak of a slope of 1 % uphill\. Its landing distance of 424 m is carried there by physics on stated figures: the landing distance is \d+ m\.$/,
  },
  {
    code: 'flight-manual-and-physics-differ',
    severity: 'caution',
    raised: withManual(manualOf({}, { contains: { factor: 0.5, windAllowance: false } })),
    silent: withManual(),
    says: /^The flight manual gives a landing distance of [\d ]+ m, physics \d+ m: [\d.]+ % less\.$/,
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
    says: /The flight manual has none: landing-table ends at a temperature of 40 °C, and 45 °C is asked\.$/,
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
    silent: wetAt('paved', 45),
    says: /^The touchdown ground speed of \d+\.\d kt is above 42\.2 kt, at which the tyres begin to hydroplane/,
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
    code: 'margin-negative',
    severity: 'caution',
    raised: declared(484),
    silent: declared(485),
    says: /^The check landing-distance is short by 1 m: 485 m required, 484 m available\.$/,
  },
  {
    code: 'margin-thin',
    severity: 'caution',
    raised: declared(533),
    silent: declared(800),
    says: /^The check landing-distance passes with 48 m spare on runway 07, 9\.9 % of what is required\./,
  },
  {
    code: 'margin-thin',
    severity: 'caution',
    raised: declared(786),
    silent: declared(787),
    says: /^At the high end of the 90 % band, .* would require 787 m; 786 m is available\.$/,
  },
  {
    code: 'stage-not-known',
    severity: 'caution',
    raised: { question: { ruleSet: 'us-part-135', stage: 'in-flight' } },
    silent: { question: { ruleSet: 'us-part-135', stage: 'dispatch' } },
    says: /Part 135\) have no figures of their own for in flight\. Those for before departure are used: landing-distance requires \d+ m\.$/,
  },
  {
    code: 'stage-not-known',
    severity: 'caution',
    raised: { question: { ruleSet: 'us-landing-by-condition-code', stage: 'dispatch' } },
    silent: { question: { ruleSet: 'us-landing-by-condition-code', stage: 'in-flight' } },
    says: /for the time of arrival alone, and a rule for before departure may ask for more\. They are used: landing-distance requires \d+ m\.$/,
  },
  {
    code: 'stage-not-known',
    severity: 'caution',
    raised: { question: { ruleSet: 'us-part-135', stage: 'in-flight' } },
    silent: { question: { ruleSet: 'eu-class-b', stage: 'in-flight' } },
    says: /Part 135/,
  },
  {
    code: 'mass-above-maximum-landing',
    severity: 'strong',
    raised: { aeroplane: { masses: { maximumTakeoff: 1050, maximumLanding: 1000 } } },
    silent: { aeroplane: { masses: { maximumTakeoff: 1050, maximumLanding: 1010 } } },
    says: /^Mass 1 010 kg is 10 kg above the maximum landing mass of 1 000 kg\./,
  },
  {
    code: 'mass-above-maximum-landing',
    severity: 'strong',
    raised: { aeroplane: { masses: { maximumTakeoff: 1009 } } },
    silent: { aeroplane: { masses: { maximumTakeoff: 1010 } } },
    says: /above the maximum takeoff mass of 1 009 kg\./,
  },
  {
    code: 'temperature-above-limit',
    severity: 'strong',
    raised: limited({ maximumTemperature: 288 }),
    silent: limited({ maximumTemperature: 288.15 }),
    says: /^Temperature 15 °C is 0\.1 °C above/,
  },
  {
    code: 'pressure-altitude-above-limit',
    severity: 'strong',
    raised: limited({ maximumPressureAltitude: 99 }),
    silent: limited({ maximumPressureAltitude: 101 }),
    says: /^Pressure altitude 328 ft is 3 ft above/,
  },
  {
    code: 'tailwind-beyond-limit',
    severity: 'strong',
    raised: along(-10.1),
    silent: along(-9.9),
    says: /^Tailwind 10\.1 kt is 0\.1 kt beyond 10 kt/,
  },
  {
    code: 'tailwind',
    severity: 'caution',
    raised: along(-5),
    silent: along(0),
    says: /^Tailwind 5 kt on runway 07\. It lengthens the ground roll from 154 m to 18\d m\.$/,
  },
  {
    code: 'crosswind-beyond-demonstrated',
    severity: 'caution',
    raised: from(160, 15.1),
    silent: from(160, 14.9),
    says: /^Crosswind 15\.1 kt on runway 07 is 0\.1 kt beyond the demonstrated 15 kt\./,
  },
  {
    code: 'wind-variable',
    severity: 'note',
    raised: from(70, 8, { variable: { from: 40 * degree, to: 100 * degree } }),
    silent: from(70, 8),
    says: /headwind 6\.9 kt\.$/,
  },
  {
    code: 'gust-not-credited',
    severity: 'note',
    raised: from(70, 8, { gust: 14 * kt }),
    silent: from(70, 8),
    says: /Gusts of 14 kt/,
  },
  {
    code: 'downslope',
    severity: 'caution',
    raised: slope(-1.1),
    silent: slope(-1),
    says: /^Runway 07 falls 1\.1 % in the direction of movement\. It lengthens the ground roll from 154 m to 15\d m\.$/,
  },
  {
    code: 'very-short-wet-grass',
    severity: 'caution',
    raised: { runway: { surface: wetGrass } },
    silent: { runway: { surface: { ...wetGrass, grass: 'long' } } },
    says: /^The grass is wet\. Where it is very short on firm subsoil, landings take up to 60 % more than on dry pavement: 776 m where 685 m is computed\.$/,
  },
  {
    code: 'very-short-wet-grass',
    severity: 'caution',
    raised: { runway: { surface: { ...wetGrass, grass: 'short' } } },
    silent: { runway: { surface: { ...wetGrass, grass: 'short' } }, question: { ruleSet: 'eu-class-b' } },
    says: /60 %/,
  },
  {
    code: 'deceleration-marginal',
    severity: 'strong',
    raised: { runway: { surface: { kind: 'ice', state: 'dry' } } },
    silent: { runway: { surface: wetGrass } },
    says: /^The least deceleration of the braked roll is 1\.\d+ % of that of gravity\./,
  },
  {
    code: 'anti-skid-inoperative',
    severity: 'caution',
    raised: modulated('inoperative'),
    silent: modulated('operative'),
    says: /braking friction at touchdown is 0\.298 of the weight\. It lengthens the ground roll from 127 m to 154 m\.$/,
  },
  {
    code: 'reverse-counted',
    severity: 'caution',
    raised: reversed(true),
    silent: reversed(false),
    says: /^Reverse thrust of 1 500 N is counted down to 20 kt over the ground\. It shortens the ground roll from 154 m to 1[12]\d m\.$/,
  },
  {
    code: 'reference-speed-raised',
    severity: 'caution',
    raised: referenceAt(1.29),
    silent: referenceAt(1.3),
    says: /^The stated landing reference speed is 56 kt calibrated at this mass; cs-23-amendment-4 asks for at least 1\.3 times the stall speed, and the minimum control speed\. 56\.5 kt is taken instead\.$/,
  },
  {
    code: 'reference-speed-raised',
    severity: 'note',
    raised: controlled(58),
    silent: controlled(56),
    says: /58 kt is taken instead\.$/,
  },
  {
    code: 'approach-speed-increment',
    severity: 'caution',
    raised: flown({ approachSpeedIncrement: 5 * kt }),
    silent: flown({ approachSpeedIncrement: 0 }),
    says: /^The approach is 5 kt above the landing reference speed of 56\.5 kt calibrated\. It lengthens the landing distance from 485 m to 54\d m\.$/,
  },
  {
    code: 'approach-steep',
    severity: 'caution',
    raised: { configuration: { approachAngle: 4.1 * degree } },
    silent: { configuration: { approachAngle: 4 * degree } },
    says: /^The approach angle of 4\.1° is steeper than 4°; certification approaches at 3°\. It shortens the air distance from 332 m to 2\d\d m\.$/,
  },
  {
    code: 'flare-above-screen',
    severity: 'note',
    raised: { configuration: { approachAngle: 10 * degree, flareLoadFactor: 1.05 } },
    silent: { configuration: { approachAngle: 3 * degree, flareLoadFactor: 1.05 } },
    says: /^With a load factor of 1\.05 the flare begins above the screen of 50 ft\./,
  },
  {
    code: 'balked-landing-climb-low',
    severity: 'caution',
    raised: climbing(1800),
    silent: climbing(2000),
    says: /^After a balked landing the aeroplane climbs at [12]\.\d+ %, \d+ ft\/min, at full power, in this configuration, at 56\.5 kt calibrated\.$/,
  },
  {
    code: 'balked-landing-climb-low',
    severity: 'strong',
    raised: climbing(1200),
    silent: climbing(2000),
    says: /^After a balked landing the aeroplane sinks at/,
  },
  {
    code: 'balked-landing-unknown',
    severity: 'caution',
    raised: measuredTo(50),
    silent: measuredTo(70),
    says: /the thrust is asked for at 56\.\d kt true airspeed, and its data end at 50 kt\.$/,
  },
  {
    code: 'density-altitude-high',
    severity: 'caution',
    raised: hot(5000, 279),
    silent: hot(5000, 277),
    says: /The touchdown speed of 49\.9 kt calibrated is \d\d(\.\d)? kt true\.$/,
  },
  {
    code: 'temperature-far-from-standard',
    severity: 'caution',
    raised: { weather: { temperature: 288.15 - 31, dewPoint: 250 } },
    silent: { weather: { temperature: 288.15 - 30, dewPoint: 250 } },
    says: /below standard/,
  },
  {
    code: 'pressure-extreme',
    severity: 'caution',
    raised: { weather: { pressure: { kind: 'qnh', value: 94_900 } } },
    silent: { weather: { pressure: { kind: 'qnh', value: 95_100 } } },
    says: /^QNH 949 hPa is below 950 hPa/,
  },
  {
    code: 'slope-steep',
    severity: 'caution',
    raised: slope(2.1),
    silent: slope(1.9),
    says: /acts along the runway against the landing/,
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
    says: /^LDA from B is 1 500 m, no less than for the whole of runway 07\./,
  },
  {
    code: 'runway-changed',
    severity: 'note',
    raised: { runway: { onFile: { ...filed, changed: ['declared/tora 1400 m in place of 1500 m'] } } },
    silent: { runway: { onFile: filed } },
    says: /^Runway 07 is that of some-field, revision 2, with changes of the question: declared\/tora 1400 m/,
  },
  {
    code: 'aeroplane-changed',
    severity: 'note',
    raised: {
      question: {
        changes: { basedOn: 'plain-trainer', revision: '1', because: 'larger tyres', changed: ['wheels taken out'] },
      },
    },
    silent: {},
    says: /^The aeroplane is plain-trainer, revision 1, with changes: wheels taken out\. The reason given: "larger tyres"\./,
  },
  {
    code: 'assumption-matters',
    severity: 'caution',
    raised: { runway: { surface: wetPavement } },
    silent: { runway: { surface: { ...wetPavement, brakingFrictionCoefficient: 0.2 } } },
    says: /^One assumed value moves the landing distance by more than 1 %: braking friction, taken as 0\.2 at rest, 0\.159 at 50 kt over the ground\. At 75 % of that the distance is [\d.]+ % longer\.$/,
  },
  {
    code: 'method-is-estimate',
    severity: 'note',
    raised: {},
    silent: { runway: { surface: { kind: 'paved', state: 'flooded' } } },
    says: /The landing distance of 485 m has a 90 % band from 298 m to 787 m\.$/,
  },
];

describe('the cautions of a landing', () => {
  it.each(pairs)('$code ($severity): raised on one side and silent on the other: $says', (pair) => {
    const { code, severity, raised, silent, says } = pair;
    const found = landed(changed(plainLanding, raised)).cautions.find((one) => one.code === code);
    expect(found?.message).toMatch(says);
    expect(found?.severity).toBe(severity);
    expect(found?.at).toMatch(/^\//);
    expect(landed(changed(plainLanding, silent)).cautions.map((one) => one.code)).not.toContain(code);
  });

  it('has a pair for every caution there is', () => {
    expect([...new Set(pairs.map(({ code }) => code))].sort()).toEqual(landingCautions.map(({ code }) => code).sort());
  });
  it('is quiet about a plain question but for the method', () => {
    expect(landed(plainLanding).cautions.map(({ code }) => code)).toEqual(['method-is-estimate']);
  });
  it('writes codes in kebab-case, each once, with a meaning and a known source, and the same as for a takeoff', () => {
    const codes = landingCautions.map(({ code }) => code);
    expect(new Set(codes).size).toBe(codes.length);
    for (const caution of landingCautions) {
      expect(caution.code).toMatch(/^[a-z]+(-[a-z]+)*$/);
      expect(caution.meaning).toMatch(/^[A-Z].*\.$/);
      expect(Object.keys(references)).toContain(caution.source);
      const shared = takeoffCautions.find(({ code }) => code === caution.code);
      if (shared !== undefined) expect(caution).toBe(shared);
    }
  });
  it('writes facts with numbers: no orders, capitals or exclamation marks', () => {
    for (const { raised } of pairs) {
      for (const { message } of landed(changed(plainLanding, raised)).cautions) {
        expect(message).toMatch(/\d/);
        expect(message).toMatch(/^[A-Z].*\.$/);
        expect(message).not.toMatch(/!|must|should|do not|NaN|undefined|go\/no/i);
      }
    }
  });
  it('says nothing of a mass below both maxima', () => {
    expect(landed(changed(plainLanding, mass(900))).cautions.map(({ code }) => code)).toEqual(['method-is-estimate']);
  });
});
