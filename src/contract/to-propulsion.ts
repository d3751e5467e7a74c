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
      });
    case 'constant-speed':
      return present<Of<'constant-speed'>>({
        kind: given.kind,
        power: si('power', given.power),
        ...disc(given),
        criticalAltitude: perhaps((altitude) => si('length', altitude), given.criticalAltitude),
        ...lapse(given),
      });
    case 'turboprop':
      return present<Of<'turboprop'>>({
        kind: given.kind,
        power: si('power', given.power),
        ...disc(given),
        flatRating: perhaps(difference, given.flatRating),
        lapseExponent: given.lapseExponent,
        thrustFactor: given.thrustFactor,
      });
    case 'jet':
      return present<Of<'jet'>>({
        kind: given.kind,
        staticThrust: si('force', given.staticThrust),
        flatRating: perhaps(difference, given.flatRating),
        bypassRatio: given.bypassRatio,
        thrustFactor: given.thrustFactor,
      });
    case 'electric':
      return present<Of<'electric'>>({
        kind: given.kind,
        power: si('power', given.power),
        ...disc(given),
        thrustFactor: given.thrustFactor,
      });
    case 'measured':
      return present<Of<'measured'>>({
        kind: given.kind,
        airspeeds: given.rows.map(([airspeed]) => toSi('speed', airspeed, given.columns[0].unit) + 0),
        thrusts: given.rows.map(([, thrust]) => toSi('force', thrust, given.columns[1].unit) + 0),
        density: si('density', given.density),
        densityExponent: given.densityExponent,
        thrustFactor: given.thrustFactor,
      });
  }
}

function difference(given: Q<'deltaC' | 'deltaF'>): number {
  return si('temperatureDifference', given);
}

function lapse(given: Extract<PropulsionOnWire, { kind: 'fixed-pitch' | 'constant-speed' }>) {
  return {
    altitudeLapseCoefficient: given.altitudeLapseCoefficient,
    temperatureExponent: given.temperatureExponent,
    humidityFactor: given.humidityFactor,
    thrustFactor: given.thrustFactor,
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
