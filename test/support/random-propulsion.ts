import { propulsion } from '../../src/contract/propulsion.ts';
import * as q from '../../src/contract/quantities.ts';
import { g0 } from '../../src/physics/constants.ts';
import { boundsAt } from './bounds-at.ts';
import type { Dice } from './dice.ts';
import { anyQuantity, quantityOf } from './random-quantity.ts';

/** Which propulsion goes with which engine. */
const kinds = {
  piston: ['fixed-pitch', 'constant-speed', 'measured'],
  electric: ['electric', 'fixed-pitch', 'measured'],
  turboprop: ['turboprop', 'measured'],
  jet: ['jet', 'measured'],
} as const;

type Kind = (typeof kinds)[keyof typeof kinds][number];

/**
 * Engines and propellers of a size that goes with the mass.
 *
 * @param mass - greatest, of the aeroplane [kg]
 */
export function randomPropulsion(dice: Dice, engine: keyof typeof kinds, mass: number, engines: number): object {
  const { within, between, maybe } = dice;
  const kind = dice.pick(kinds[engine] as readonly Kind[]);
  const figure = (member: string) => within(...boundsAt(propulsion, member));
  const force = Math.min(600_000, Math.max(10, (mass * g0 * within(0.04, 1.5)) / engines));
  const watts = Math.min(1e7, Math.max(500, (mass * within(20, 1500)) / engines));
  const shared = {
    ...maybe(0.3, () => ({ thrustFactor: figure('thrustFactor') })),
    ...maybe(0.3, () => ({ powerSettings: { reduced: { fullPowerRatio: figure('powerSettings/*/fullPowerRatio') } } })),
  };
  const lapse = maybe(0.6, () => ({
    altitudeLapseCoefficient: figure('altitudeLapseCoefficient'),
    temperatureExponent: figure('temperatureExponent'),
    humidityFactor: figure('humidityFactor'),
  }));
  const staticThrust = quantityOf(dice, q.thrust, 'force', force);
  const propellerDiameter = anyQuantity(dice, q.dimension);
  const disc = {
    power: quantityOf(dice, q.power, 'power', watts),
    propellerDiameter,
    ...maybe(0.5, () => ({ profileFactor: figure('profileFactor'), inducedFactor: figure('inducedFactor') })),
    ...maybe(0.3, () => ({ staticThrust })),
  };
  const flatRating = maybe(0.6, () => ({ flatRating: anyQuantity(dice, q.temperatureAboveStandard) }));
  switch (kind) {
    case 'fixed-pitch':
      return {
        kind,
        staticThrust,
        propellerDiameter,
        ...maybe(0.7, () => ({ polarSlopeCoefficient: figure('polarSlopeCoefficient') })),
        ...lapse,
        ...shared,
      };
    case 'constant-speed':
      return {
        kind,
        ...disc,
        ...maybe(0.3, () => ({ criticalAltitude: anyQuantity(dice, q.pressureAltitude) })),
        ...lapse,
        ...shared,
      };
    case 'turboprop':
      return {
        kind,
        ...disc,
        ...flatRating,
        ...maybe(0.5, () => ({ lapseExponent: figure('lapseExponent') })),
        ...shared,
      };
    case 'jet':
      return {
        kind,
        staticThrust,
        ...flatRating,
        ...maybe(0.5, () => ({ bypassRatio: figure('bypassRatio') })),
        ...shared,
      };
    case 'electric':
      return { kind, ...disc, ...shared };
    case 'measured': {
      const unit = dice.pick(['N', 'kN', 'lbf'] as const);
      const inUnit = force / { N: 1, kN: 1000, lbf: 4.4482216152605 }[unit];
      const speeds = [0, between(10, 60), between(61, 200), 600].slice(0, dice.pick([2, 3, 4]));
      return {
        kind,
        columns: [
          { name: 'trueAirspeed', unit: dice.pick(['m/s', 'kt', 'km/h', 'mph']) },
          { name: 'thrust', unit },
        ],
        rows: speeds.map((speed, i) => [speed, Math.min(600_000, inUnit * (i === 0 ? 1 : within(0, 1.2)))]),
        density: anyQuantity(dice, q.airDensity),
        densityExponent: figure('densityExponent'),
        ...shared,
      };
    }
  }
}
