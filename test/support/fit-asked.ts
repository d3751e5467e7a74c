import type { MaximumLift } from '../../src/performance/aeroplane.ts';
import type { LandingFitAsked } from '../../src/performance/fit/fit-landing.ts';
import type { FitPoint, Observation } from '../../src/performance/fit/fit-point.ts';
import { printedSd } from '../../src/performance/fit/fit-point.ts';
import type { TakeoffFitAsked } from '../../src/performance/fit/fit-takeoff.ts';
import { roundingStep } from '../../src/performance/fit/rounding-step.ts';
import type { MadeTable } from '../published/made-tables.ts';

const foot = 0.3048;
const knot = 1852 / 3600;
const ratio = (of: number) => ({ kind: 'stall-ratio', ratio: of }) as const;

/** Rows of mass [kg], pressure altitude [ft], temperature [degC], ground roll, whole distance [m] as points of a fit. */
export function pointsOf(rows: readonly (readonly number[])[], rollingFriction: number): FitPoint[] {
  const roundings = [3, 4].map((column) => roundingStep(rows.map((row) => row[column] as number)));
  return rows.map(([mass = 0, altitude = 0, temperature = 0, ...distances], row) => ({
    row,
    mass,
    pressureAltitude: altitude * foot,
    temperature: temperature + 273.15,
    headwind: 0,
    slope: 0,
    rollingFriction,
    observations: distances.map((distance, i): Observation => {
      const printed = roundings[i] as { unit: number; step: number };
      const kind = i === 0 ? 'groundRoll' : 'wholeDistance';
      return { kind, distance, relativeSd: printedSd(distance, printed.step), printed };
    }),
  }));
}

/** What a fit is asked of a made table of takeoffs. */
export function takeoffAsked({ aeroplane: a, rows, stallSpeed }: MadeTable): TakeoffFitAsked {
  const span = Math.sqrt(a.aspectRatio * a.area);
  const { power } = a;
  if (power === undefined) throw new Error('no power');
  const maximumLift: MaximumLift =
    stallSpeed === undefined
      ? { kind: 'coefficient', coefficient: a.maximumLift }
      : { kind: 'stall-speed', cas: stallSpeed * knot, mass: a.mass, definition: 'one-g' };
  return {
    aeroplane: {
      category: 'single-piston',
      engines: 1,
      certification: { basis: 'none', screenHeight: 15.24 },
      masses: { maximumTakeoff: a.mass },
      wing: { area: a.area, span, heightAboveGround: a.heightOverSpan * span },
      drag: { zeroLiftCoefficient: a.groundDrag, oswaldFactor: a.oswaldFactor },
      propulsion:
        power.kind === 'fixed-pitch'
          ? {
              kind: power.kind,
              staticThrust: power.staticThrust,
              propellerDiameter: power.diameter,
              polarSlopeCoefficient: power.slope,
            }
          : { kind: power.kind, power: power.power, propellerDiameter: power.diameter },
    },
    configuration: { flap: 10 * (Math.PI / 180), maximumLift },
    figures: () => ({
      rotation: ratio(a.speedRatios[0]),
      liftOff: ratio(a.speedRatios[0]),
      screen: ratio(a.speedRatios[1]),
      rotationTime: 0,
      pullUpLoadFactor: 1.15,
      groundLiftCoefficient: a.groundLift,
      groundDragIncrement: 0,
      airDragIncrement: a.airDrag - a.groundDrag,
    }),
    points: pointsOf(rows, a.friction),
    declared: {
      groundRoll: 'm',
      wholeDistance: 'm',
      distances: 'm',
      mass: 'kg',
      temperature: 'degC',
      pressureAltitude: 'ft',
      speeds: 'kt',
    },
  };
}

/** What a fit is asked of a made table of landings. */
export function landingAsked({ aeroplane: a, rows }: MadeTable): LandingFitAsked {
  const span = Math.sqrt(a.aspectRatio * a.area);
  return {
    aeroplane: {
      category: 'single-piston',
      engines: 1,
      certification: { basis: 'none', screenHeight: 15.24 },
      masses: { maximumTakeoff: a.mass },
      wing: { area: a.area, span, heightAboveGround: a.heightOverSpan * span },
      drag: { zeroLiftCoefficient: a.groundDrag, oswaldFactor: a.oswaldFactor },
      propulsion: { kind: 'fixed-pitch', staticThrust: 2366, propellerDiameter: 1.905 },
    },
    configuration: {
      flap: 30 * (Math.PI / 180),
      maximumLift: { kind: 'coefficient', coefficient: a.maximumLift },
    },
    figures: () => ({
      landingReference: ratio(a.speedRatios[0]),
      touchdown: ratio(a.speedRatios[1]),
      flareLoadFactor: a.flareLoadFactor ?? 1.2,
      freeRollTime: a.freeRollTime ?? 1,
      idleThrust: 0,
      screenHeight: 15.24,
      groundLiftCoefficient: a.groundLift,
      groundDragIncrement: 0,
    }),
    points: pointsOf(rows, a.friction),
  };
}
