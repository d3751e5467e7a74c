import { aeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import * as q from '../../src/contract/quantities.ts';
import { antiSkids, certificationBases, wheelArrangements } from '../../src/performance/aeroplane.ts';
import { configuredStallSpeed } from '../../src/performance/speeds/configured-stall-speed.ts';
import { boundsAt } from './bounds-at.ts';
import type { Dice } from './dice.ts';
import { randomPropulsion } from './random-propulsion.ts';
import { anyQuantity, quantityOf } from './random-quantity.ts';
import type { OnFile } from './random-question.ts';

/**
 * A whole aeroplane within the contract's bounds, its members in keeping with one another, most of the optional ones left out
 * now and then: from a kite of 20 kg to 400 t, each number often on its bound.
 */
export function randomDefinition(dice: Dice): OnFile {
  const { pick, chance, within, between, maybe } = dice;
  const figure = (path: string) => within(...boundsAt(aeroplaneDefinition, path));
  const engine = pick(['piston', 'electric', 'turboprop', 'jet'] as const);
  const engines = pick([1, 2]);
  const mass = chance(0.3) ? within(20, 400_000) : between(300, 20_000);
  const area = Math.min(600, Math.max(1, mass / within(10, 800)));
  const span = Math.min(90, Math.max(2, Math.sqrt(area * within(3, 40))));
  const empty = Math.max(20, mass * within(0.2, 0.97));
  const ids = pick([['one'], ['t', 'landing-full'], ['0', '15', 'constructor', 'takeoff-25', 'landing']]);
  const definition = {
    id: pick(['x', 'random-tourer', 'a'.repeat(64)]),
    revision: pick(['1', 'R 7 – "β" <b>', 'é'.repeat(64)]),
    name: 'Random (invented)',
    category: `${engines === 2 ? 'twin' : 'single'}-${engine}`,
    engines,
    certification: {
      basis: pick(certificationBases.filter((basis) => engines === 2 || !/25|commuter/.test(basis))),
      screenHeight: anyQuantity(dice, q.screenHeight),
    },
    masses: {
      maximumTakeoff: quantityOf(dice, q.mass, 'mass', mass),
      ...maybe(0.6, () => ({ empty: quantityOf(dice, q.mass, 'mass', empty) })),
      ...maybe(0.5, () => ({ maximumLanding: quantityOf(dice, q.mass, 'mass', between(empty * 1.001, mass)) })),
    },
    wing: {
      area: quantityOf(dice, q.wingArea, 'area', area),
      span: quantityOf(dice, q.span, 'length', span),
      heightAboveGround: quantityOf(dice, q.dimension, 'length', Math.min(12, span / 2) * within(0.05, 0.99)),
      ...maybe(0.3, () => ({ taperRatio: figure('wing/taperRatio'), sweep: anyQuantity(dice, q.wingAngle) })),
      ...maybe(0.2, () => ({ washout: anyQuantity(dice, q.wingAngle), section: pick(['0012', '23015']) })),
    },
    drag: { zeroLiftCoefficient: figure('drag/zeroLiftCoefficient'), oswaldFactor: figure('drag/oswaldFactor') },
    configurations: Object.fromEntries(ids.map((id) => [id, configuration(dice, mass, area, usesOf(id))])),
    propulsion: randomPropulsion(dice, engine, mass, engines),
    ...maybe(0.3, () => ({
      wheels: {
        ...maybe(0.5, () => ({ arrangement: pick(wheelArrangements) })),
        ...maybe(0.5, () => ({ tyrePressure: anyQuantity(dice, q.tyrePressure) })),
        ...maybe(0.5, () => ({ tyreSpeedLimit: anyQuantity(dice, q.airspeed) })),
      },
    })),
    ...maybe(0.3, () => ({
      brakes: {
        brakingFrictionCoefficient: figure('brakes/brakingFrictionCoefficient'),
        loadFactor: figure('brakes/loadFactor'),
        antiSkid: pick(antiSkids),
        energyLimit: anyQuantity(dice, q.brakeEnergy),
      },
    })),
    ...maybe(0.2, () => ({
      reverseThrust: { thrust: anyQuantity(dice, q.thrust), cutOffSpeed: anyQuantity(dice, q.airspeed) },
    })),
    ...maybe(engines === 2 ? 0.4 : 0, () => ({
      engineOut: {
        vmc: anyQuantity(dice, q.airspeed),
        dragIncrementCoefficient: figure('engineOut/dragIncrementCoefficient'),
        propeller: pick(['feathered', 'windmilling', 'stopped']),
      },
    })),
    ...maybe(0.5, () => ({
      limitations: {
        ...maybe(0.6, () => ({ demonstratedCrosswind: anyQuantity(dice, q.windSpeed) })),
        ...maybe(0.3, () => ({ crosswind: anyQuantity(dice, q.windSpeed) })),
        ...maybe(0.6, () => ({ tailwind: anyQuantity(dice, q.windSpeed) })),
        ...maybe(0.6, () => ({ maximumTemperature: anyQuantity(dice, q.temperature) })),
        ...maybe(0.6, () => ({ maximumPressureAltitude: anyQuantity(dice, q.pressureAltitude) })),
      },
    })),
    ...maybe(0.3, () => ({ airspeedCalibration: calibration(dice) })),
  };
  return definition;
}

/** Every definition has a setting for each phase. */
function usesOf(id: string): ('takeoff' | 'landing')[] {
  if (id === 'one') return ['landing', 'takeoff'];
  return id.startsWith('landing') ? ['landing'] : ['takeoff'];
}

function configuration(dice: Dice, mass: number, area: number, uses: ('takeoff' | 'landing')[]) {
  const { chance, within, between, maybe } = dice;
  const figure = (path: string) => within(...boundsAt(aeroplaneDefinition, path));
  const coefficient = within(0.7, 3.5);
  const stall = (at: number) => configuredStallSpeed({ kind: 'coefficient', coefficient }, area, at);
  const scheduled = (ratio: number) => {
    const at = mass * between(0.5, 1);
    const cas = ratio * stall(at);
    return chance(0.7) || cas < 5 || cas > 150 || ratio < 1.001 || ratio > 2.499
      ? { stallRatio: ratio }
      : { cas: quantityOf(dice, q.airspeed, 'speed', cas), mass: quantityOf(dice, q.mass, 'mass', at) };
  };
  const [first = 1, second = 1, third = 1] = [0, 1, 2].map(() => within(1, 2.5)).sort((a, b) => a - b);
  const stallSpeed = stall(mass);
  return {
    for: uses,
    flap: anyQuantity(dice, q.flapAngle),
    maximumLift:
      chance(0.6) || stallSpeed < 5 || stallSpeed > 150 || coefficient === 0.7 || coefficient === 3.5
        ? { coefficient }
        : {
            stallSpeed: quantityOf(dice, q.airspeed, 'speed', stallSpeed),
            type: 'cas',
            ...maybe(0.5, () => ({ kind: 'one-g' })),
            mass: quantityOf(dice, q.mass, 'mass', mass),
          },
    ...maybe(0.7, () => ({ groundDragIncrementCoefficient: within(0, 0.5) })),
    ...maybe(0.7, () => ({ airDragIncrementCoefficient: within(-0.004, 0.5) })),
    ...maybe(0.7, () => ({ groundLiftCoefficient: within(-0.5, Math.min(2.5, coefficient * 0.99)) })),
    ...maybe(0.8, () => ({
      speeds: {
        ...maybe(0.7, () => ({ rotation: scheduled(first) })),
        ...maybe(0.8, () => ({ liftOff: scheduled(second) })),
        ...maybe(0.8, () => ({ screen: scheduled(third) })),
        ...maybe(0.3, () => ({ touchdown: scheduled(first), landingReference: scheduled(second) })),
      },
    })),
    ...maybe(0.6, () => ({ rotationTime: anyQuantity(dice, q.shortTime) })),
    ...maybe(0.6, () => ({ pullUpLoadFactor: figure('configurations/*/pullUpLoadFactor') })),
    ...maybe(0.3, () => ({ rollingStartAllowance: anyQuantity(dice, q.runwayLength) })),
    ...maybe(0.3, () => ({
      approachAngle: anyQuantity(dice, q.approachAngle),
      flareLoadFactor: figure('configurations/*/flareLoadFactor'),
    })),
    ...maybe(0.3, () => ({
      freeRollTime: anyQuantity(dice, q.shortTime),
      floatDecelerationRatio: figure('configurations/*/floatDecelerationRatio'),
    })),
    ...maybe(0.3, () => ({ idleThrust: quantityOf(dice, q.idleThrust, 'force', mass * within(0, 1)) })),
  };
}

function calibration(dice: Dice): object {
  const rows: [number, number][] = [];
  for (let indicated = dice.between(5, 60); indicated < 600 && rows.length < 12; indicated += dice.between(10, 120)) {
    const calibrated = Math.min(600, Math.max(5, indicated * dice.between(0.9, 1.1)));
    if (calibrated > (rows.at(-1)?.[1] ?? 0)) rows.push([indicated, calibrated]);
  }
  while (rows.length < 2) rows.push([599 + rows.length, 599 + rows.length]);
  const unit = dice.pick(['m/s', 'kt', 'km/h', 'mph']);
  return {
    columns: [
      { name: 'indicated', unit },
      { name: 'calibrated', unit },
    ],
    rows,
  };
}
