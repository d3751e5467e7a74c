import { quantitySchema } from './quantity.ts';

/**
 * The quantity families of the contract. Bounds are in SI and wide: they stop a slip of unit or digit, not an unusual
 * aeroplane.
 */
const metresOrFeet = ['m', 'ft'] as const;
const airspeedUnits = ['m/s', 'kt', 'km/h', 'mph'] as const;
const weatherPressureUnits = ['hPa', 'Pa', 'kPa', 'inHg'] as const;
const radians = Math.PI / 180;

export const mass = quantitySchema('Mass', 'A mass.', 'mass', ['kg', 't', 'lb'], 20, 400_000);

export const runwayLength = quantitySchema(
  'RunwayLength',
  'A length along the runway.',
  'length',
  ['m', 'km', 'ft', 'NM'],
  0,
  10_000,
);
export const runwayWidth = quantitySchema('RunwayWidth', 'Width of a runway.', 'length', metresOrFeet, 3, 120);
export const elevation = quantitySchema(
  'Elevation',
  'Height of the aerodrome above mean sea level.',
  'length',
  ['m', 'km', 'ft'],
  -500,
  6000,
);
export const pressureAltitude = quantitySchema(
  'PressureAltitude',
  'Altitude in the standard atmosphere at which its pressure is the one meant.',
  'length',
  ['m', 'km', 'ft'],
  -1200,
  7500,
);
export const flightAltitude = quantitySchema(
  'FlightAltitude',
  'Pressure altitude of an aeroplane in flight.',
  'length',
  ['m', 'km', 'ft'],
  -1200,
  15_000,
);
export const climbHeight = quantitySchema('ClimbHeight', 'Height above the runway.', 'length', metresOrFeet, 3, 500);
export const obstacleHeight = quantitySchema(
  'ObstacleHeight',
  'Height of an obstacle above the runway where its distance is measured from.',
  'length',
  metresOrFeet,
  -100,
  1000,
);
export const obstacleDistance = quantitySchema(
  'ObstacleDistance',
  'Distance of an obstacle straight ahead.',
  'length',
  ['m', 'km', 'ft', 'NM'],
  0,
  30_000,
);
export const contaminantDepth = quantitySchema(
  'ContaminantDepth',
  'Depth of water, slush or snow on the runway.',
  'length',
  ['m', 'in'],
  0,
  0.5,
);
export const screenHeight = quantitySchema(
  'ScreenHeight',
  'Height of the screen above the runway, to be passed at its end.',
  'length',
  metresOrFeet,
  3,
  30,
);
export const span = quantitySchema('Span', 'Wing span from tip to tip.', 'length', metresOrFeet, 2, 90);
export const dimension = quantitySchema(
  'Dimension',
  'A dimension of the aeroplane smaller than its span.',
  'length',
  ['m', 'ft', 'in'],
  0.05,
  12,
);
export const wingArea = quantitySchema('WingArea', 'Reference wing area.', 'area', ['m2', 'ft2'], 1, 600);

export const temperature = quantitySchema(
  'Temperature',
  'A temperature of the air.',
  'temperature',
  ['degC', 'degF', 'K'],
  213.15,
  333.15,
);
export const temperatureAboveStandard = quantitySchema(
  'TemperatureAboveStandard',
  'A temperature difference from the standard day.',
  'temperatureDifference',
  ['deltaC', 'deltaF'],
  -40,
  60,
);
export const qnh = quantitySchema(
  'Qnh',
  'Altimeter setting that shows the elevation on the ground.',
  'pressure',
  weatherPressureUnits,
  87_000,
  108_500,
);
export const stationPressure = quantitySchema(
  'StationPressure',
  'Pressure of the air at the aerodrome itself, not reduced to sea level.',
  'pressure',
  weatherPressureUnits,
  35_000,
  115_000,
);
export const flightPressure = quantitySchema(
  'FlightPressure',
  'Static pressure around the aeroplane.',
  'pressure',
  weatherPressureUnits,
  12_000,
  115_000,
);
export const windSpeed = quantitySchema('WindSpeed', 'Speed of the wind.', 'speed', airspeedUnits, 0, 60);
export const headwind = quantitySchema(
  'Headwind',
  'Wind along the runway, positive on the nose, negative on the tail.',
  'speed',
  airspeedUnits,
  -60,
  60,
);
export const direction = quantitySchema('Direction', 'Clockwise from north.', 'angle', ['deg'], 0, 360 * radians);
export const magneticVariation = quantitySchema(
  'MagneticVariation',
  'From true to magnetic north, east positive.',
  'angle',
  ['deg'],
  -180 * radians,
  180 * radians,
);
export const slope = quantitySchema(
  'Slope',
  'Rise over length, uphill positive in the direction of movement.',
  'proportion',
  ['percent'],
  -0.1,
  0.1,
);

export const airspeed = quantitySchema(
  'Airspeed',
  'A speed of the procedure or a limit of the aeroplane, of the kind named by its member.',
  'speed',
  airspeedUnits,
  5,
  150,
);
export const speedIncrement = quantitySchema(
  'SpeedIncrement',
  'What is flown on top of a speed of the procedure.',
  'speed',
  airspeedUnits,
  0,
  20,
);
export const flightSpeed = quantitySchema(
  'FlightSpeed',
  'An airspeed in flight, of the kind named by its member.',
  'speed',
  airspeedUnits,
  0,
  340,
);
export const flapAngle = quantitySchema(
  'FlapAngle',
  'Flap deflection, down positive.',
  'angle',
  ['deg'],
  -15 * radians,
  70 * radians,
);
export const wingAngle = quantitySchema(
  'WingAngle',
  'Sweep of the quarter chord (backward positive) or washout (tip down positive).',
  'angle',
  ['deg'],
  -20 * radians,
  60 * radians,
);
export const approachAngle = quantitySchema(
  'ApproachAngle',
  'Descent path below the horizon.',
  'angle',
  ['deg'],
  1 * radians,
  10 * radians,
);
export const bankAngle = quantitySchema('BankAngle', 'Angle of bank.', 'angle', ['deg'], 0, 75 * radians);
export const shortTime = quantitySchema('ShortTime', 'A time of the procedure.', 'time', ['s'], 0, 30);

export const thrust = quantitySchema('Thrust', 'A thrust.', 'force', ['N', 'kN', 'lbf'], 10, 600_000);
export const idleThrust = quantitySchema(
  'IdleThrust',
  'Thrust at idle of the whole aeroplane.',
  'force',
  ['N', 'kN', 'lbf'],
  0,
  60_000,
);
export const power = quantitySchema('Power', 'Shaft power of one engine.', 'power', ['W', 'kW', 'hp'], 500, 10_000_000);
export const airDensity = quantitySchema('AirDensity', 'Density of the air.', 'density', ['kg/m3'], 0.2, 1.7);
export const tyrePressure = quantitySchema(
  'TyrePressure',
  'Tyre pressure above that of the air.',
  'pressure',
  ['kPa', 'bar', 'psi'],
  50_000,
  3_000_000,
);
export const tyreWidth = quantitySchema('TyreWidth', 'Width of a tyre.', 'length', ['m', 'ft', 'in'], 0.03, 1);
export const tyreDeflection = quantitySchema(
  'TyreDeflection',
  'How far a loaded tyre is flattened.',
  'length',
  ['m', 'ft', 'in'],
  0,
  0.3,
);
export const sprayLength = quantitySchema(
  'SprayLength',
  'Length of fuselage wetted by spray.',
  'length',
  metresOrFeet,
  0,
  60,
);
export const brakeEnergy = quantitySchema(
  'BrakeEnergy',
  'Energy the brakes take in one stop.',
  'energy',
  ['J', 'MJ'],
  1000,
  1e9,
);
export const manualDistance = quantitySchema(
  'ManualDistance',
  'A distance that a flight manual prints.',
  'length',
  metresOrFeet,
  10,
  10_000,
);
export const rateOfClimb = quantitySchema('RateOfClimb', 'A rate of climb.', 'speed', ['ft/min', 'm/s'], -20, 60);
export const climbGradient = quantitySchema(
  'ClimbGradient',
  'Height gained over distance.',
  'proportion',
  ['percent'],
  -0.3,
  1,
);
export const windStep = quantitySchema('WindStep', 'So much wind along the runway.', 'speed', airspeedUnits, 0.05, 40);
export const slopeStep = quantitySchema('SlopeStep', 'So much slope.', 'proportion', ['percent'], 0.0005, 0.1);
export const temperatureStep = quantitySchema(
  'TemperatureStep',
  'So much difference of temperature.',
  'temperatureDifference',
  ['deltaC', 'deltaF'],
  0.1,
  100,
);
export const massStep = quantitySchema('MassStep', 'So much mass.', 'mass', ['kg', 't', 'lb'], 0.4, 100_000);
