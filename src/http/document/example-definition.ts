import type { AeroplaneDefinition } from '../../contract/aeroplane-definition.ts';

/** An invented aeroplane with a table of its flight manual, as the document shows one and the service warms up with. */
export const exampleDefinition: AeroplaneDefinition = {
  id: 'ambrellin-tourer',
  revision: '1',
  name: 'Ambrellin Tourer (invented)',
  category: 'single-piston',
  engines: 1,
  certification: { basis: 'cs-23-amendment-4', screenHeight: { value: 50, unit: 'ft' } },
  masses: { empty: { value: 680, unit: 'kg' }, maximumTakeoff: { value: 1050, unit: 'kg' } },
  wing: {
    area: { value: 16.2, unit: 'm2' },
    span: { value: 10.89, unit: 'm' },
    heightAboveGround: { value: 2.18, unit: 'm' },
  },
  drag: { zeroLiftCoefficient: 0.04, oswaldFactor: 0.72 },
  configurations: {
    'takeoff-10': {
      for: ['takeoff'],
      flap: { value: 10, unit: 'deg' },
      maximumLift: { stallSpeed: { value: 49.5, unit: 'kt' }, type: 'cas', mass: { value: 1050, unit: 'kg' } },
      groundLiftCoefficient: 0.4,
      speeds: { liftOff: { stallRatio: 1.15 }, screen: { stallRatio: 1.2 } },
    },
    'landing-30': {
      for: ['landing'],
      flap: { value: 30, unit: 'deg' },
      maximumLift: { stallSpeed: { value: 45.3, unit: 'kt' }, type: 'cas', mass: { value: 1050, unit: 'kg' } },
      speeds: { landingReference: { stallRatio: 1.3 } },
    },
  },
  propulsion: {
    kind: 'fixed-pitch',
    staticThrust: { value: 2366, unit: 'N' },
    propellerDiameter: { value: 1.905, unit: 'm' },
  },
  flightManual: {
    document: 'Ambrellin Tourer flight manual (invented)',
    revision: '3',
    tables: [
      {
        id: 'takeoff-10-short-field',
        for: 'takeoff',
        configurations: ['takeoff-10'],
        page: 'page 5-11',
        conditions: { surface: { kind: 'paved', state: 'dry' }, mass: { value: 1050, unit: 'kg' } },
        columns: [
          { name: 'pressureAltitude', unit: 'ft' },
          { name: 'temperature', unit: 'degC' },
          { name: 'groundRoll', unit: 'ft' },
          { name: 'takeoffDistance', unit: 'ft' },
        ],
        rows: [
          [0, 0, 800, 1450],
          [0, 20, 920, 1650],
          [0, 40, 1050, 1880],
          [2000, 0, 960, 1760],
          [2000, 20, 1110, 2010],
          [2000, 40, 1270, 2310],
          [4000, 0, 1160, 2160],
          [4000, 20, 1350, 2500],
          [4000, 40, 1550, 2920],
        ],
        notes: [
          {
            about: 'headwind',
            changePercent: -10,
            per: { value: 9, unit: 'kt' },
            multiplies: 'both',
            text: 'Decrease distances 10 % for each 9 knots headwind.',
          },
        ],
      },
    ],
  },
};
