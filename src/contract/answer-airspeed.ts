import type { AirspeedCalibration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { calibratedFromIndicated, indicatedFromCalibrated } from '../performance/airspeed-calibration.ts';
import { casFromEas, easFromCas, easFromMach, easFromTas, machFromEas, tasFromEas } from '../physics/airspeed.ts';
import type { Fault, Refused } from '../planning/fault.ts';
import { measureText } from '../planning/sentences/measure-text.ts';
import type { UnitFamily } from '../units/presentation.ts';
import { asChosen } from './aeroplane-choice.ts';
import type { AeroplaneLookup, KnownAeroplane } from './aeroplane-lookup.ts';
import type { AirspeedRequest, AirspeedResponse } from './airspeed.ts';
import { airSources, assumedDry, notGivenAir } from './answer-air.ts';
import { assumedPresentation, presentationOf } from './assumed-presentation.ts';
import { changedCautions } from './changed-cautions.ts';
import { foundAir } from './found-air.ts';
import { si } from './quantity.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';
import { toAdvisory } from './to-advisory.ts';
import { toAir } from './to-air.ts';
import { type Stamp, toAssumed, toSources } from './to-basis.ts';
import { aeroplaneAt, toKnownAeroplane } from './to-known-aeroplane.ts';

/** One speed in all its kinds [m/s], or why there is none. */
type Finding =
  | {
      readonly outcome: 'computed';
      readonly cas: number;
      readonly eas: number;
      readonly tas: number;
      readonly mach: number;
      readonly ias?: number;
    }
  | { readonly outcome: 'not-subsonic' | 'outside-calibration' };

/** One speed in all its kinds, from gate to gate. */
export function answerAirspeed(
  request: AirspeedRequest,
  lookup: AeroplaneLookup,
  stamp: Stamp,
): AirspeedResponse | Refused {
  const known = request.aeroplane && toKnownAeroplane(request.aeroplane, lookup);
  const air = foundAir(request.weather, request.elevation);
  const faults = [
    ...(Array.isArray(known) ? known : checkCalibration(request, known)),
    ...(Array.isArray(air) ? air : []),
  ];
  if (Array.isArray(known) || Array.isArray(air) || faults.length > 0) return { refused: faults };
  const how = presentationOf(request);
  const found = kindsOf(request.speed, air, known?.aeroplane.airspeedCalibration);
  const { reference, asOf, aeroplane, speed, elevation, weather } = request;
  return {
    outcome: found.outcome,
    advisory: toAdvisory(how, sentenceOf(found, how.units), changedCautions(known)),
    air: toAir(how, air),
    ...(found.outcome === 'computed' ? { speed: toKinds(how, found) } : {}),
    basis: {
      assumed: toAssumed(how, [...assumedPresentation(request), ...assumedDry(weather)]),
      notGiven: notGivenAir(weather),
      sources: toSources(airSources(weather), ['GraceyRp1046', 'Cfr1s1']),
      modelVersion: stamp.modelVersion,
      ...(known === undefined ? {} : { digests: { aeroplane: known.digest } }),
    },
    question: {
      ...(reference === undefined ? {} : { reference }),
      ...(asOf === undefined ? {} : { asOf }),
      ...(aeroplane === undefined || known === undefined ? {} : { aeroplane: asChosen(aeroplane, known) }),
      speed,
      ...(elevation === undefined ? {} : { elevation }),
      weather,
      ...how,
    },
  };
}

function checkCalibration({ speed, aeroplane }: AirspeedRequest, known: KnownAeroplane | undefined): Fault[] {
  if (!('ias' in speed) || known?.aeroplane.airspeedCalibration !== undefined) return [];
  if (aeroplane === undefined || known === undefined) {
    return [
      {
        pointer: '/aeroplane',
        code: 'missing',
        message: 'An indicated airspeed needs the aeroplane whose instrument shows it.',
        hint: 'Give aeroplane, or the speed as cas.',
      },
    ];
  }
  return [
    {
      pointer: `${aeroplaneAt(aeroplane)}${'id' in aeroplane ? '/id' : '/airspeedCalibration'}`,
      code: 'missing',
      message: `${known.aeroplane.id} has no airspeed calibration: an indicated airspeed says nothing of the others.`,
      hint: 'Give the speed as cas.',
    },
  ];
}

function kindsOf(speed: AirspeedRequest['speed'], air: Air, calibration: AirspeedCalibration | undefined): Finding {
  const eas = easOf(speed, air, calibration);
  if (typeof eas === 'string') return { outcome: eas };
  const cas = casFromEas(eas, air.pressure);
  if (cas === 'not-subsonic') return { outcome: cas };
  const kinds = { cas, eas, tas: tasFromEas(eas, air.density), mach: machFromEas(eas, air.pressure) };
  const ias = 'ias' in speed ? si('speed', speed.ias) : calibration && indicatedFromCalibrated(calibration, cas);
  return { outcome: 'computed', ...kinds, ...(typeof ias === 'number' ? { ias } : {}) };
}

function easOf(
  speed: AirspeedRequest['speed'],
  { pressure, density }: Air,
  calibration: AirspeedCalibration | undefined,
): number | 'not-subsonic' | 'outside-calibration' {
  if ('eas' in speed) return si('speed', speed.eas);
  if ('tas' in speed) return easFromTas(si('speed', speed.tas), density);
  if ('mach' in speed) return easFromMach(speed.mach, pressure);
  if ('cas' in speed) return easFromCas(si('speed', speed.cas), pressure);
  const cas = calibration ? calibratedFromIndicated(calibration, si('speed', speed.ias)) : 'outside';
  return cas === 'outside' ? 'outside-calibration' : easFromCas(cas, pressure);
}

function toKinds(how: Presentation, { cas, eas, tas, mach, ias }: Extract<Finding, { outcome: 'computed' }>) {
  return {
    cas: shownQuantity(how, 'speed', cas),
    eas: shownQuantity(how, 'speed', eas),
    tas: shownQuantity(how, 'speed', tas),
    mach: shownRatio(how, mach),
    ...(ias === undefined ? {} : { ias: shownQuantity(how, 'speed', ias) }),
  };
}

function sentenceOf(found: Finding, units: UnitFamily): string {
  if (found.outcome === 'computed') {
    const text = (speed: number) => measureText(units, 'speed', speed);
    return `${text(found.cas)} CAS is ${text(found.eas)} EAS and ${text(found.tas)} TAS.`;
  }
  return found.outcome === 'not-subsonic'
    ? 'This speed is above that of sound, where these relations do not hold.'
    : 'The airspeed calibration does not reach this indicated airspeed.';
}
