import { turnLoadFactor } from '../physics/stall-speed.ts';
import { raisedCautions } from '../planning/cautions/caution-test.ts';
import { referenceSpeedRaised } from '../planning/cautions/reference-speed-raised.ts';
import { takeoffSpeedsRaised } from '../planning/cautions/takeoff-speeds-raised.ts';
import { isRefused, type Refused } from '../planning/fault.ts';
import { measureText } from '../planning/sentences/measure-text.ts';
import { asChosen } from './aeroplane-choice.ts';
import type { AeroplaneLookup } from './aeroplane-lookup.ts';
import { airSources, assumedDry, notGivenAir } from './answer-air.ts';
import { assumedPresentation, presentationOf } from './assumed-presentation.ts';
import { changedCautions } from './changed-cautions.ts';
import { foundAir } from './found-air.ts';
import { type FoundSpeeds, foundSpeeds } from './found-speeds.ts';
import { si } from './quantity.ts';
import { checkConfigurationId } from './question-checks/check-configuration-id.ts';
import { checkMass } from './question-checks/check-mass.ts';
import { type Presentation, shownRatio } from './shown-quantity.ts';
import type { SpeedsRequest, SpeedsResponse } from './speeds.ts';
import { toAdvisory } from './to-advisory.ts';
import { toAir } from './to-air.ts';
import { type Stamp, toAssumed, toSources } from './to-basis.ts';
import { aeroplaneAt, toKnownAeroplane } from './to-known-aeroplane.ts';
import { stillAsUnderstood, toKnownStillWeather } from './to-known-weather.ts';
import { toSpeedSet } from './to-speed-set.ts';

/** Stall and reference speeds, from gate to gate. */
export function answerSpeeds(request: SpeedsRequest, lookup: AeroplaneLookup, stamp: Stamp): SpeedsResponse | Refused {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  const weather = toKnownStillWeather(request.weather);
  const air = Array.isArray(weather) ? weather : foundAir(weather, request.elevation);
  const faults = [
    ...(Array.isArray(known)
      ? known
      : [...checkMass(request.mass, known.aeroplane), ...checkConfigurationId(request.configuration, known.aeroplane)]),
    ...(Array.isArray(air) ? air : []),
  ];
  if (Array.isArray(known) || Array.isArray(weather) || Array.isArray(air) || faults.length > 0)
    return { refused: faults };
  const { reference, asOf, aeroplane, mass, configuration, elevation, bank } = request;
  const loadFactor = bank && turnLoadFactor(si('angle', bank));
  const configured = {
    aeroplane: known.aeroplane,
    aeroplaneAt: aeroplaneAt(aeroplane),
    configuration,
    mass: si('mass', mass),
  };
  const found = foundSpeeds(configured, air, loadFactor);
  if (isRefused(found)) return found;
  const how = presentationOf(request);
  const question = { aeroplane: known.aeroplane, units: how.units };
  const cautions = [
    ...changedCautions(known),
    ...raisedCautions([takeoffSpeedsRaised], { question, raised: found.raised }),
    ...(found.landing === undefined ? [] : raisedCautions([referenceSpeedRaised], { ...found.landing, question })),
  ];
  return {
    outcome: 'computed',
    advisory: toAdvisory(how, sentenceOf(how, found, configured.mass, configuration), cautions),
    air: toAir(how, air),
    ...(loadFactor === undefined ? {} : { loadFactor: shownRatio(how, loadFactor) }),
    speeds: toSpeeds(how, found.speeds),
    basis: {
      assumed: toAssumed(how, [...found.assumed, ...assumedPresentation(request), ...assumedDry(weather)]),
      notGiven: notGivenAir(weather),
      sources: toSources(
        airSources(weather),
        bank === undefined ? ['Cfr25s103', 'GraceyRp1046', 'Cfr1s1'] : ['Cfr25s103', 'GraceyRp1046', 'Cfr1s1', 'Phak'],
        cautions.flatMap(({ source }) => (source === undefined ? [] : [source])),
        found.assumed.flatMap(({ source }) => (source === undefined ? [] : [source])),
      ),
      modelVersion: stamp.modelVersion,
      digests: { aeroplane: known.digest },
    },
    question: {
      ...(reference === undefined ? {} : { reference }),
      ...(asOf === undefined ? {} : { asOf }),
      aeroplane: asChosen(aeroplane, known),
      mass,
      configuration,
      ...(elevation === undefined ? {} : { elevation }),
      weather: stillAsUnderstood(request.weather, weather),
      ...(bank === undefined ? {} : { bank }),
      ...how,
    },
  };
}

function toSpeeds(how: Presentation, speeds: FoundSpeeds['speeds']): SpeedsResponse['speeds'] {
  const { stall, stallInBank, rotation, liftOff, screen, landingReference, touchdown } = speeds;
  return {
    stall: toSpeedSet(how, stall),
    ...(stallInBank === undefined ? {} : { stallInBank: toSpeedSet(how, stallInBank) }),
    ...(rotation === undefined ? {} : { rotation: toSpeedSet(how, rotation) }),
    ...(liftOff === undefined ? {} : { liftOff: toSpeedSet(how, liftOff) }),
    ...(screen === undefined ? {} : { screen: toSpeedSet(how, screen) }),
    ...(landingReference === undefined ? {} : { landingReference: toSpeedSet(how, landingReference) }),
    ...(touchdown === undefined ? {} : { touchdown: toSpeedSet(how, touchdown) }),
  };
}

function sentenceOf({ units }: Presentation, { speeds }: FoundSpeeds, mass: number, configuration: string): string {
  const level = `Stall speed ${measureText(units, 'speed', speeds.stall.cas)} CAS at ${measureText(units, 'mass', mass)} in ${configuration}`;
  return speeds.stallInBank === undefined
    ? `${level}.`
    : `${level}, ${measureText(units, 'speed', speeds.stallInBank.cas)} CAS in the turn.`;
}
