import type { Propulsion } from '../performance/aeroplane.ts';
import { toSi } from '../units/units.ts';
import { perhaps, present } from './present.ts';
import type { PropulsionOnWire } from './propulsion.ts';
import { type Q, si } from './quantity.ts';

type Of<K extends Propulsion['kind']> = Extract<Propulsion, { kind: K }>;

/** The engines and propellers of a definition, in SI. */
export function toPropulsion(given: PropulsionOnWire): Propulsion {
  switch (given.kind) {
    case 'fixed-pitch':
      return present<Of<'fixed-pitch'>>({
        kind: given.kind,
        staticThrust: si('force', given.staticThrust),
        propellerDiameter: si('length', given.propellerDiameter),
        polarSlopeCoefficient: given.polarSlopeCoefficient,
        ...lapse(given),
        ...shared(given),
      });
    case 'constant-speed':
      return present<Of<'constant-speed'>>({
        kind: given.kind,
        power: si('power', given.power),
        ...disc(given),
        criticalAltitude: perhaps((altitude) => si('length', altitude), given.criticalAltitude),
        ...lapse(given),
        ...shared(given),
      });
    case 'turboprop':
      return present<Of<'turboprop'>>({
        kind: given.kind,
        power: si('power', given.power),
        ...disc(given),
        flatRating: perhaps(difference, given.flatRating),
        lapseExponent: given.lapseExponent,
        ...shared(given),
      });
    case 'jet':
      return present<Of<'jet'>>({
        kind: given.kind,
        staticThrust: si('force', given.staticThrust),
        flatRating: perhaps(difference, given.flatRating),
        bypassRatio: given.bypassRatio,
        ...shared(given),
      });
    case 'electric':
      return present<Of<'electric'>>({
        kind: given.kind,
        power: si('power', given.power),
        ...disc(given),
        ...shared(given),
      });
    case 'measured':
      return present<Of<'measured'>>({
        kind: given.kind,
        airspeeds: given.rows.map(([airspeed]) => toSi('speed', airspeed, given.columns[0].unit) + 0),
        thrusts: given.rows.map(([, thrust]) => toSi('force', thrust, given.columns[1].unit) + 0),
        density: si('density', given.density),
        densityExponent: given.densityExponent,
        ...shared(given),
      });
  }
}

function difference(given: Q<'deltaC' | 'deltaF'>): number {
  return si('temperatureDifference', given);
}

function shared({ thrustFactor, powerSettings }: PropulsionOnWire) {
  return { thrustFactor, powerSettings };
}

function lapse(given: Extract<PropulsionOnWire, { kind: 'fixed-pitch' | 'constant-speed' }>) {
  return {
    altitudeLapseCoefficient: given.altitudeLapseCoefficient,
    temperatureExponent: given.temperatureExponent,
    humidityFactor: given.humidityFactor,
  };
}

function disc(given: Extract<PropulsionOnWire, { kind: 'constant-speed' | 'turboprop' | 'electric' }>) {
  return {
    propellerDiameter: si('length', given.propellerDiameter),
    profileFactor: given.profileFactor,
    inducedFactor: given.inducedFactor,
    staticThrust: perhaps((thrust) => si('force', thrust), given.staticThrust),
  };
}
