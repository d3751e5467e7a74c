import { z } from 'zod';
import { airDensity, dimension, power, pressureAltitude, temperatureAboveStandard, thrust } from './quantities.ts';
import { id } from './text.ts';

const thrustFactor = z
  .number()
  .min(0.3)
  .max(1.5)
  .meta({ description: 'Multiplies the thrust: a worn engine or a finding from trials.' })
  .exactOptional();

/** So many power settings at most; our choice. */
export const mostPowerSettings = 8;

const powerSettings = z
  .record(
    id,
    z
      .strictObject({
        fullPowerRatio: z.number().min(0.4).max(1).meta({
          description:
            'Power over full power, or thrust over full thrust where the definition gives thrust; at every altitude and temperature.',
        }),
      })
      .meta({ id: 'PowerSetting', description: 'A setting below full power that the flight manual has figures for.' }),
  )
  .meta({
    description: 'Power settings by id, 1 to 8 of them; full power needs none.',
    minProperties: 1,
    maxProperties: mostPowerSettings,
  })
  .exactOptional();

const lapse = {
  altitudeLapseCoefficient: z
    .number()
    .min(0)
    .max(0.5)
    .meta({ description: 'C in (sigma - C)/(1 - C), the part of full power that falls with density.' })
    .exactOptional(),
  temperatureExponent: z
    .number()
    .min(0)
    .max(2)
    .meta({ description: 'Exponent of standard over actual temperature in the power.' })
    .exactOptional(),
  humidityFactor: z
    .number()
    .min(0)
    .max(5)
    .meta({ description: 'Multiplies the loss of power to moisture; 0 switches it off.' })
    .exactOptional(),
};

const disc = {
  propellerDiameter: dimension.meta({ description: 'Diameter of one propeller.' }),
  profileFactor: z
    .number()
    .min(0.4)
    .max(1)
    .meta({ description: 'Part of the shaft power left after the drag of the blades.' })
    .exactOptional(),
  inducedFactor: z
    .number()
    .min(1)
    .max(2)
    .meta({ description: 'Induced power over that of an ideal actuator disc.' })
    .exactOptional(),
  staticThrust: thrust
    .meta({ description: 'Known static thrust of one engine; it caps the computed thrust.' })
    .exactOptional(),
};

const shared = { thrustFactor, powerSettings };

const shaftPower = power.meta({
  description: 'Greatest continuous takeoff power of one engine, at sea level on a standard day.',
});

const flatRating = temperatureAboveStandard
  .meta({ description: 'Temperature above standard up to which the rating holds.' })
  .exactOptional();

const fixedPitch = z.strictObject({
  kind: z.literal('fixed-pitch'),
  staticThrust: thrust.meta({ description: 'Static thrust of one engine at sea level on a standard day.' }),
  propellerDiameter: dimension.meta({ description: 'Diameter of one propeller.' }),
  polarSlopeCoefficient: z
    .number()
    .min(0.005)
    .max(0.3)
    .meta({ description: 'Size of the slope of the linear propeller polar.' })
    .exactOptional(),
  ...lapse,
  ...shared,
});

const constantSpeed = z.strictObject({
  kind: z.literal('constant-speed'),
  power: shaftPower,
  ...disc,
  criticalAltitude: pressureAltitude
    .meta({ description: 'Pressure altitude up to which the turbocharger keeps full power.' })
    .exactOptional(),
  ...lapse,
  ...shared,
});

const turboprop = z.strictObject({
  kind: z.literal('turboprop'),
  power: shaftPower,
  ...disc,
  flatRating,
  lapseExponent: z
    .number()
    .min(0.5)
    .max(4)
    .meta({
      description: 'n in theta^-n, the fall of power with temperature beyond the flat rating; about 1.5 to 2.5.',
    })
    .exactOptional(),
  ...shared,
});

const jet = z.strictObject({
  kind: z.literal('jet'),
  staticThrust: thrust.meta({ description: 'Static thrust of one engine at sea level on a standard day.' }),
  flatRating,
  bypassRatio: z.number().min(0).max(15).meta({ description: 'Bypass ratio of the engine.' }).exactOptional(),
  ...shared,
});

const electric = z.strictObject({ kind: z.literal('electric'), power: shaftPower, ...disc, ...shared });

const measured = z.strictObject({
  kind: z.literal('measured'),
  columns: z
    .tuple([
      z.strictObject({ name: z.literal('trueAirspeed'), unit: z.enum(['m/s', 'kt', 'km/h', 'mph']) }),
      z.strictObject({ name: z.literal('thrust'), unit: z.enum(['N', 'kN', 'lbf']) }),
    ])
    .meta({ description: 'The columns of the rows, each with its unit.' }),
  rows: z
    .array(z.tuple([z.number().min(0).max(600), z.number().min(0).max(600_000)]))
    .min(2)
    .max(100)
    .meta({ description: 'Thrust of one engine at rising true airspeeds.' }),
  density: airDensity.meta({ description: 'Density of the air in which the thrust was measured.' }),
  densityExponent: z.number().min(0).max(2).meta({ description: 'Exponent of the density ratio in the thrust.' }),
  ...shared,
});

export const propulsion = z
  .discriminatedUnion('kind', [fixedPitch, constantSpeed, turboprop, jet, electric, measured])
  .meta({
    id: 'Propulsion',
    description: 'The engines and propellers. Power, static thrust and measured thrust are of one engine.',
  });

export type PropulsionOnWire = z.infer<typeof propulsion>;
