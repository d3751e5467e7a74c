import { z } from 'zod';
import { antiSkids, categories, certificationBases, stopRules, wheelArrangements } from '../performance/aeroplane.ts';
import { configuration } from './configuration.ts';
import { fit } from './fit/fit-member.ts';
import { flightManual } from './flight-manual/flight-manual.ts';
import { propulsion } from './propulsion.ts';
import {
  airspeed,
  brakeEnergy,
  dimension,
  mass,
  pressureAltitude,
  screenHeight,
  span,
  sprayLength,
  temperature,
  thrust,
  tyreDeflection,
  tyrePressure,
  tyreWidth,
  windSpeed,
  wingAngle,
  wingArea,
} from './quantities.ts';
import { id, shortText } from './text.ts';

const wing = z
  .strictObject({
    area: wingArea,
    span,
    heightAboveGround: dimension.meta({ description: 'Of the quarter chord of the mean chord above the runway.' }),
    taperRatio: z.number().min(0.1).max(1.5).meta({ description: 'Tip chord over root chord.' }).exactOptional(),
    sweep: wingAngle.exactOptional(),
    washout: wingAngle.exactOptional(),
    section: z
      .string()
      .max(5)
      .regex(/^[0-9]{4,5}$/)
      .meta({ description: 'Four- or five-digit number of the wing section.' })
      .exactOptional(),
  })
  .meta({ id: 'Wing', description: 'The wing.' });

const airspeedCalibration = z
  .strictObject({
    columns: z
      .tuple([
        z.strictObject({ name: z.literal('indicated'), unit: z.enum(['m/s', 'kt', 'km/h', 'mph']) }),
        z.strictObject({ name: z.literal('calibrated'), unit: z.enum(['m/s', 'kt', 'km/h', 'mph']) }),
      ])
      .meta({ description: 'The columns of the rows, each with its unit.' }),
    rows: z
      .array(z.tuple([z.number().min(5).max(600), z.number().min(5).max(600)]))
      .min(2)
      .max(100)
      .meta({ description: 'Calibrated at indicated airspeeds, both rising.' }),
  })
  .meta({ id: 'AirspeedCalibration', description: 'Position error: calibrated airspeed at each indicated airspeed.' });

const brakes = z
  .strictObject({
    brakingFrictionCoefficient: z
      .number()
      .min(0.02)
      .max(1)
      .meta({ description: 'Friction of braked wheels over their load, on a dry paved runway.' })
      .exactOptional(),
    loadFactor: z
      .number()
      .min(0.3)
      .max(1)
      .meta({ description: 'Part of the weight on the braked wheels; 1 only where the coefficient was fitted.' })
      .exactOptional(),
    antiSkid: z.enum(antiSkids).meta({ description: 'Kind of anti-skid system.' }).exactOptional(),
    energyLimit: brakeEnergy.exactOptional(),
  })
  .meta({ id: 'Brakes', description: 'The brakes.' });

const reverseThrust = z
  .strictObject({
    thrust: thrust.meta({ description: 'Backward thrust of the whole aeroplane.' }),
    cutOffSpeed: airspeed.meta({ description: 'Ground speed below which reverse is not used.' }),
  })
  .meta({ id: 'ReverseThrust', description: 'Reverse thrust in the landing roll.' });

const spoilers = z
  .strictObject({
    dragIncrementCoefficient: z
      .number()
      .min(0)
      .max(0.3)
      .meta({ description: 'Drag coefficient that they add on the ground.' }),
  })
  .meta({ id: 'Spoilers', description: 'Ground spoilers, out with the brakes in a rejected takeoff.' });

const engineOut = z
  .strictObject({
    vmc: airspeed.meta({ description: 'Minimum control speed in the air, calibrated.' }).exactOptional(),
    vmcg: airspeed.meta({ description: 'Minimum control speed on the ground, calibrated.' }).exactOptional(),
    dragIncrementCoefficient: z
      .number()
      .min(0)
      .max(0.2)
      .meta({ description: 'Drag coefficient added by the dead engine and the rudder.' })
      .exactOptional(),
    propeller: z
      .enum(['feathered', 'windmilling', 'stopped'])
      .meta({ description: 'State of the propeller of the dead engine.' })
      .exactOptional(),
    approach: z
      .strictObject({
        configuration: id.meta({ description: 'The configuration whose flap and greatest lift the approach has.' }),
        airDragIncrementCoefficient: z
          .number()
          .min(-0.05)
          .max(0.3)
          .meta({ description: 'Drag coefficient added in the air with that flap and the gear up.' }),
        stallRatio: z
          .number()
          .min(1.1)
          .max(1.4)
          .meta({ description: 'Speed of the climb over the stall speed of that configuration.' })
          .exactOptional(),
      })
      .meta({ id: 'ApproachClimb', description: 'The climb of an approach with one engine out, gear up.' })
      .exactOptional(),
  })
  .meta({ id: 'EngineOut', description: 'What is different with one engine out.' });

const limitations = z
  .strictObject({
    demonstratedCrosswind: windSpeed.exactOptional(),
    crosswind: windSpeed.meta({ description: 'Limiting crosswind, where there is one.' }).exactOptional(),
    tailwind: windSpeed.meta({ description: 'Limiting tailwind.' }).exactOptional(),
    maximumTemperature: temperature.exactOptional(),
    maximumPressureAltitude: pressureAltitude.exactOptional(),
  })
  .meta({ id: 'Limitations', description: 'Limitations of the flight manual.' });

/** A whole aeroplane; a catalogue file and an inline definition have exactly this form. */
export const aeroplaneDefinition = z
  .strictObject({
    id,
    revision: shortText.meta({ description: 'Revision of the definition.' }),
    name: shortText.meta({ description: 'Name for people to read.' }),
    category: z.enum(categories).meta({ description: 'Number and kind of engines.' }),
    engines: z.number().int().min(1).max(2).meta({ description: 'Number of engines.' }),
    passengerSeats: z
      .number()
      .int()
      .min(0)
      .max(300)
      .meta({ description: 'The most passengers it is operated with; some rules begin or end at 9.' })
      .exactOptional(),
    certification: z
      .strictObject({
        basis: z.enum(certificationBases).meta({ description: 'Certification specification of the aeroplane.' }),
        screenHeight,
        stopRule: z
          .enum(stopRules)
          .meta({
            description:
              'By which rule its accelerate-stop distances were found: since amendment 25-92 of 1998, or before. Transport category alone; absent: current.',
          })
          .exactOptional(),
      })
      .meta({ id: 'Certification', description: 'What the aeroplane was certified to.' }),
    masses: z
      .strictObject({
        empty: mass.exactOptional(),
        maximumTakeoff: mass,
        maximumLanding: mass.exactOptional(),
      })
      .meta({ id: 'Masses', description: 'Masses of the aeroplane.' }),
    wing,
    drag: z
      .strictObject({
        zeroLiftCoefficient: z
          .number()
          .min(0.005)
          .max(0.3)
          .meta({ description: 'Drag coefficient at zero lift, gear down if it is fixed.' }),
        oswaldFactor: z.number().min(0.3).max(1.2).meta({ description: 'e in the induced drag CL^2/(pi A e).' }),
      })
      .meta({ id: 'Drag', description: 'The drag polar without flap.' }),
    configurations: z
      .record(id, configuration)
      .meta({ description: 'The configurations by id, 1 to 24 of them.', minProperties: 1, maxProperties: 24 }),
    propulsion,
    wheels: z
      .strictObject({
        arrangement: z
          .enum(wheelArrangements)
          .meta({ description: 'Whether the third wheel is at the nose or at the tail.' })
          .exactOptional(),
        tyrePressure: tyrePressure.exactOptional(),
        tyreSpeedLimit: airspeed.meta({ description: 'Greatest ground speed of the tyres.' }).exactOptional(),
        tyres: z
          .number()
          .int()
          .min(1)
          .max(40)
          .meta({ description: 'How many tyres roll through what lies on the runway, those of nose or tail too.' })
          .exactOptional(),
        maximumTyreWidth: tyreWidth.meta({ description: 'Greatest width of any tyre.' }).exactOptional(),
        tyreDeflection: tyreDeflection
          .meta({ description: 'How far the loaded tyre of that width is flattened.' })
          .exactOptional(),
        sprayLength: sprayLength
          .meta({ description: 'Length of fuselage behind the wheels that their spray wets.' })
          .exactOptional(),
      })
      .meta({ id: 'Wheels', description: 'Wheels and tyres.' })
      .exactOptional(),
    brakes: brakes.exactOptional(),
    spoilers: spoilers.exactOptional(),
    reverseThrust: reverseThrust.exactOptional(),
    engineOut: engineOut.exactOptional(),
    limitations: limitations.exactOptional(),
    airspeedCalibration: airspeedCalibration.exactOptional(),
    flightManual: flightManual.exactOptional(),
    fit: fit.exactOptional(),
  })
  .meta({ id: 'AeroplaneDefinition', description: 'A whole aeroplane.' });

export type AeroplaneDefinition = z.infer<typeof aeroplaneDefinition>;
