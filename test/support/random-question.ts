import * as q from '../../src/contract/quantities.ts';
import { pressureAltitude, stationPressure } from '../../src/physics/altimetry.ts';
import { standardTemperature } from '../../src/physics/atmosphere.ts';
import { ruleSets } from '../../src/planning/rules/rule-sets.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import type { Dice } from './dice.ts';
import { randomDefinition } from './random-definition.ts';
import { anyQuantity, inSi, quantityOf, type WrittenQuantity } from './random-quantity.ts';
import { randomSurface } from './random-surface.ts';

/** A setting of flap and gear: only what the dice need of it. */
interface OfOneSetting {
  readonly for: readonly string[];
  readonly speeds?: { readonly landingReference?: unknown };
  readonly approachAngle?: unknown;
  readonly freeRollTime?: { readonly value: number };
}

/** A definition, on file or made up: only what the dice need of it. */
export interface OnFile {
  readonly id: string;
  readonly engines: number;
  readonly masses: { readonly empty?: WrittenQuantity; readonly maximumTakeoff: WrittenQuantity };
  readonly configurations: Readonly<Record<string, OfOneSetting>>;
  readonly propulsion: { readonly powerSettings?: object };
  readonly brakes?: { readonly antiSkid?: string };
  readonly reverseThrust?: unknown;
}

export type Phase = 'takeoff' | 'landing';

/**
 * A question within the contract's bounds, its members in keeping with one another, each number often on its bound and in any
 * unit: nearly every one has an answer, the rest are refused for what two members say together.
 *
 * @param onFile - the catalogue's definitions; three questions in five name one of them, one in five carries one, one in five
 *   brings an aeroplane of its own
 */
export function randomQuestion(dice: Dice, onFile: readonly OnFile[], phase: Phase): Record<string, unknown> {
  const { pick, maybe } = dice;
  const way = dice.roll();
  const definition = way < 0.8 ? pick(onFile) : randomDefinition(dice);
  const { id, configuration } = chosenConfiguration(dice, definition, phase);
  const procedure = phase === 'takeoff' ? takeoffProcedure : landingProcedure;
  return {
    ...maybe(0.2, () => ({ reference: pick(['Flight 7', '→ ЁЖ 漢 🛫', '=cmd()', '<script>']) })),
    ...maybe(0.2, () => ({ asOf: pick(['2031-02-28T23:59:59Z', '1999-12-31T00:00:00.123+14:00']) })),
    aeroplane: way < 0.6 ? { id: definition.id } : { definition: structuredClone(definition) },
    mass: randomMass(dice, definition),
    configuration: id,
    ...randomPlace(dice),
    ...maybe(0.4, () => ({ procedure: procedure(dice, definition, configuration) })),
    ruleSet: pick(ruleSets).id,
    ...maybe(0.2, () => ({ stage: pick(['dispatch', 'in-flight']) })),
    ...maybe(0.7, () => ({ units: pick(unitFamilies) })),
    ...maybe(0.7, () => ({ rounding: pick(['safe', 'none']) })),
    ...(phase === 'takeoff' && definition.engines > 1
      ? maybe(0.3, () => ({ decisionSpeed: { value: Math.round(45 + 70 * dice.roll()), unit: 'kt' } }))
      : {}),
    ...(phase === 'takeoff' ? maybe(0.15, () => ({ detail: ['rejected'] })) : {}),
  };
}

function chosenConfiguration({ pick }: Dice, { configurations }: OnFile, phase: Phase) {
  const made = Object.entries(configurations).filter(([, one]) => one.for.includes(phase));
  const [id, configuration] = pick(made);
  return { id, configuration };
}

/** How it is flown, of what the aeroplane has data for. */
function takeoffProcedure({ pick, maybe }: Dice, { propulsion }: OnFile, configuration: object): object {
  const settings = Object.keys(propulsion.powerSettings ?? {});
  return {
    ...maybe(settings.length > 0 ? 0.6 : 0, () => ({ power: pick(settings) })),
    ...maybe(0.6, () => ({
      start: pick('rollingStartAllowance' in configuration ? ['standing', 'rolling'] : ['standing']),
    })),
  };
}

function landingProcedure(dice: Dice, { brakes, reverseThrust }: OnFile, configuration: OfOneSetting): object {
  const { pick, maybe } = dice;
  const { speeds, approachAngle, freeRollTime } = configuration;
  const increments = [q.speedIncrement].filter(() => speeds?.landingReference !== undefined);
  const antiSkid = brakes?.antiSkid;
  return {
    ...maybe(increments.length / 2, () => ({ approachSpeedIncrement: anyQuantity(dice, q.speedIncrement) })),
    ...maybe(approachAngle === undefined ? 0 : 0.5, () => ({
      approachAngle: quantityOf(dice, q.approachAngle, 'angle', (dice.within(1, 4) * Math.PI) / 180),
    })),
    ...maybe(0.5, () => ({ reverse: pick(reverseThrust === undefined ? [false] : [true, false]) })),
    ...maybe(antiSkid === undefined ? 0 : 0.5, () => ({
      antiSkid: pick(antiSkid === 'none' ? ['inoperative'] : ['operative', 'inoperative']),
    })),
    ...maybe(freeRollTime === undefined ? 0 : 0.5, () => ({
      reactionTime: quantityOf(dice, q.shortTime, 'time', dice.within(freeRollTime?.value ?? 0, 30)),
    })),
  };
}

function randomMass(dice: Dice, { masses }: OnFile) {
  const maximum = inSi('mass', masses.maximumTakeoff);
  const lowest = masses.empty === undefined ? 0.25 * maximum : 0.9 * inSi('mass', masses.empty);
  return quantityOf(dice, q.mass, 'mass', dice.within(lowest * (1 + 1e-9), 1.1 * maximum * (1 - 1e-9)));
}

/** A runway and the weather on it. */
function randomPlace(dice: Dice): { readonly runway: object; readonly weather: object } {
  const { pick, maybe } = dice;
  const elevation = dice.chance(0.5)
    ? anyQuantity(dice, q.elevation)
    : quantityOf(dice, q.elevation, 'length', dice.between(0, 2500));
  const height = inSi('length', elevation);
  const directionReference = pick(['true', 'magnetic']);
  const wind = randomWind(dice);
  const references = [directionReference, ...('fromReference' in wind ? [wind.fromReference] : [])];
  return {
    runway: {
      designator: pick(['07', '25L', '∅']),
      direction: anyQuantity(dice, q.direction),
      directionReference,
      ...maybe(new Set(references).size > 1 ? 1 : 0.2, () => ({
        magneticVariation: anyQuantity(dice, q.magneticVariation),
      })),
      elevation,
      slope: anyQuantity(dice, q.slope),
      surface: randomSurface(dice),
      ...randomLengths(dice),
    },
    weather: { ...randomAir(dice, height), wind },
  };
}

/** Where the run starts and what is declared; the start leaves something of it. */
function randomLengths(dice: Dice): object {
  const { pick, maybe, between } = dice;
  const length = (metres: number) => quantityOf(dice, q.runwayLength, 'length', metres);
  const tora = dice.chance(0.2) ? dice.within(1, 10_000) : between(150, 4000);
  const more = () => Math.min(10_000, tora * dice.within(1, 1.6));
  const left = tora * between(0.1, 0.9);
  return {
    start: pick([
      'threshold',
      'threshold',
      { offset: length(left / 2) },
      { offset: length(0) },
      { point: 'B' },
      { point: 'Ä'.repeat(64) },
    ]),
    ...maybe(0.3, () => ({ lineUp: { tora: length(left / 3), asda: length(left / 3) } })),
    ...maybe(0.9, () => ({
      declared: {
        ...maybe(0.9, () => ({ tora: length(tora) })),
        ...maybe(0.5, () => ({ toda: length(more()) })),
        ...maybe(0.5, () => ({ asda: length(more()) })),
        ...maybe(0.6, () => ({ lda: length(more()) })),
      },
    })),
  };
}

function randomWind(dice: Dice): object {
  const { pick, maybe, chance } = dice;
  if (chance(0.15)) return { headwind: quantityOf(dice, q.headwind, 'speed', 0) };
  if (chance(0.4)) {
    return {
      headwind: chance(0.5)
        ? anyQuantity(dice, q.headwind)
        : quantityOf(dice, q.headwind, 'speed', dice.between(-8, 12)),
      ...maybe(0.6, () => ({ crosswind: anyQuantity(dice, q.windSpeed) })),
    };
  }
  const speed = chance(0.3) ? dice.within(0, 60) : dice.between(0, 15);
  const from = dice.within(0, 360);
  return {
    from: { value: from, unit: 'deg' },
    fromReference: pick(['true', 'magnetic']),
    speed: quantityOf(dice, q.windSpeed, 'speed', speed),
    ...maybe(0.4, () => ({ gust: quantityOf(dice, q.windSpeed, 'speed', dice.between(speed, 60)) })),
    ...maybe(0.3, () => ({
      variable: {
        from: { value: (from + 360 - dice.between(0, 170)) % 360, unit: 'deg' },
        to: { value: (from + dice.between(0, 170)) % 360, unit: 'deg' },
      },
    })),
  };
}

/**
 * Temperature, perhaps a dew point, and the pressure in one of its three forms.
 *
 * @param elevation - [m]
 */
export function randomAir(dice: Dice, elevation: number): object {
  const { pick, chance, between, maybe } = dice;
  const temperature = chance(0.4)
    ? anyQuantity(dice, q.temperature)
    : quantityOf(dice, q.temperature, 'temperature', standardTemperature(Math.max(0, elevation)) + between(-25, 35));
  const kelvin = inSi('temperature', temperature);
  const setting = chance(0.3) ? dice.within(87_001, 108_499) : between(98_000, 104_000);
  return {
    temperature,
    ...maybe(0.6, () => ({
      dewPoint: quantityOf(
        dice,
        q.temperature,
        'temperature',
        chance(0.2) ? kelvin : Math.max(Math.min(kelvin, 213.15), kelvin - between(0, 60)),
      ),
    })),
    pressure: pick([
      () => ({ qnh: chance(0.3) ? anyQuantity(dice, q.qnh) : quantityOf(dice, q.qnh, 'pressure', setting) }),
      () => ({
        pressureAltitude: quantityOf(dice, q.pressureAltitude, 'length', pressureAltitude(elevation, setting)),
      }),
      () => ({
        stationPressure: quantityOf(dice, q.stationPressure, 'pressure', stationPressure(elevation, setting)),
      }),
    ])(),
  };
}
