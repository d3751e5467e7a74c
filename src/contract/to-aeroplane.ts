import type { Aeroplane, AirspeedCalibration, Configuration } from '../performance/aeroplane.ts';
import { toSi } from '../units/units.ts';
import type { AeroplaneDefinition } from './aeroplane-definition.ts';
import { toFit } from './fit/to-fit.ts';
import { toFlightManual } from './flight-manual/to-flight-manual.ts';
import { perhaps, present } from './present.ts';
import { type Q, si } from './quantity.ts';
import { toConfiguration } from './to-configuration.ts';
import { toPropulsion } from './to-propulsion.ts';

type Given<K extends keyof AeroplaneDefinition> = NonNullable<AeroplaneDefinition[K]>;
type Made<K extends keyof Aeroplane> = NonNullable<Aeroplane[K]>;

/**
 * A definition in SI.
 *
 * @param definition - read by its schema and without a fault of checkAeroplane
 */
export function toAeroplane(definition: AeroplaneDefinition): Aeroplane {
  const calibration = perhaps(toCalibration, definition.airspeedCalibration);
  const configurations: Record<string, Configuration> = {};
  for (const [id, given] of Object.entries(definition.configurations)) {
    configurations[id] = toConfiguration(given, calibration);
  }
  return present<Aeroplane>({
    id: definition.id,
    revision: definition.revision,
    name: definition.name,
    category: definition.category,
    engines: definition.engines,
    passengerSeats: definition.passengerSeats,
    certification: present<Made<'certification'>>({
      basis: definition.certification.basis,
      screenHeight: metres(definition.certification.screenHeight),
      stopRule: definition.certification.stopRule,
    }),
    masses: toMasses(definition.masses),
    wing: toWing(definition.wing),
    drag: definition.drag,
    configurations,
    propulsion: toPropulsion(definition.propulsion),
    wheels: perhaps(toWheels, definition.wheels),
    brakes: perhaps(toBrakes, definition.brakes),
    spoilers: definition.spoilers,
    reverseThrust: perhaps(toReverseThrust, definition.reverseThrust),
    engineOut: perhaps(toEngineOut, definition.engineOut),
    limitations: perhaps(toLimitations, definition.limitations),
    airspeedCalibration: calibration,
    flightManual: perhaps((manual) => toFlightManual(manual, calibration), definition.flightManual),
    fit: perhaps(toFit, definition.fit),
  });
}

/** The table of position error in SI. */
export function toCalibration({ columns, rows }: Given<'airspeedCalibration'>): AirspeedCalibration {
  return {
    indicated: rows.map(([indicated]) => toSi('speed', indicated, columns[0].unit)),
    calibrated: rows.map(([, calibrated]) => toSi('speed', calibrated, columns[1].unit)),
  };
}

function toMasses(given: Given<'masses'>): Made<'masses'> {
  return present<Made<'masses'>>({
    empty: perhaps(kilograms, given.empty),
    maximumTakeoff: kilograms(given.maximumTakeoff),
    maximumLanding: perhaps(kilograms, given.maximumLanding),
  });
}

function toWing(given: Given<'wing'>): Made<'wing'> {
  return present<Made<'wing'>>({
    area: si('area', given.area),
    span: metres(given.span),
    heightAboveGround: metres(given.heightAboveGround),
    taperRatio: given.taperRatio,
    sweep: perhaps((angle) => si('angle', angle), given.sweep),
  });
}

function toWheels(given: Given<'wheels'>): Made<'wheels'> {
  return present<Made<'wheels'>>({
    arrangement: given.arrangement,
    tyrePressure: perhaps((pressure) => si('pressure', pressure), given.tyrePressure),
    tyreSpeedLimit: perhaps(metresPerSecond, given.tyreSpeedLimit),
    tyres: given.tyres,
    maximumTyreWidth: perhaps(metres, given.maximumTyreWidth),
    tyreDeflection: perhaps(metres, given.tyreDeflection),
    sprayLength: perhaps(metres, given.sprayLength),
  });
}

function toBrakes(given: Given<'brakes'>): Made<'brakes'> {
  return present<Made<'brakes'>>({
    brakingFrictionCoefficient: given.brakingFrictionCoefficient,
    loadFactor: given.loadFactor,
    antiSkid: given.antiSkid,
    energyLimit: perhaps((energy) => si('energy', energy), given.energyLimit),
  });
}

function toReverseThrust(given: Given<'reverseThrust'>): Made<'reverseThrust'> {
  return { thrust: si('force', given.thrust), cutOffSpeed: si('speed', given.cutOffSpeed) };
}

function toEngineOut(given: Given<'engineOut'>): Made<'engineOut'> {
  return present<Made<'engineOut'>>({
    vmc: perhaps(metresPerSecond, given.vmc),
    vmcg: perhaps(metresPerSecond, given.vmcg),
    dragIncrementCoefficient: given.dragIncrementCoefficient,
    propeller: given.propeller,
    approach: given.approach,
  });
}

function toLimitations(given: Given<'limitations'>): Made<'limitations'> {
  return present<Made<'limitations'>>({
    demonstratedCrosswind: perhaps(metresPerSecond, given.demonstratedCrosswind),
    crosswind: perhaps(metresPerSecond, given.crosswind),
    tailwind: perhaps(metresPerSecond, given.tailwind),
    maximumTemperature: perhaps((kelvin) => si('temperature', kelvin), given.maximumTemperature),
    maximumPressureAltitude: perhaps(metres, given.maximumPressureAltitude),
  });
}

function metres(given: Q<'m' | 'km' | 'ft' | 'NM' | 'in'>): number {
  return si('length', given);
}

function kilograms(given: Q<'kg' | 't' | 'lb'>): number {
  return si('mass', given);
}

function metresPerSecond(given: Q<'m/s' | 'kt' | 'km/h' | 'mph'>): number {
  return si('speed', given);
}
