import { describe, expect, it } from 'vitest';
import { aeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import { checkAeroplane } from '../../src/contract/check-aeroplane.ts';
import { named, sampleDefinition, withMember } from '../support/sample-questions.ts';

const at = '/aeroplane/definition';
const takeoff = '/configurations/takeoff-10';
const landing = '/configurations/landing-full';

/** One slip, the fault it must give, and a word of its message or hint. */
const slips: [title: string, pointer: string, value: unknown, fault: string, says: RegExp][] = [
  [
    'an empty mass above the greatest',
    '/masses/empty',
    { value: 1100, unit: 'kg' },
    'contradiction /masses/empty',
    /not below/,
  ],
  [
    'a greatest mass of another aeroplane',
    '/masses/maximumTakeoff',
    { value: 3300, unit: 'kg' },
    'implausible /masses/empty',
    /19 %.*units/,
  ],
  [
    'a landing mass above the takeoff mass',
    '/masses/maximumLanding',
    { value: 1040, unit: 'kg' },
    'contradiction /masses/maximumLanding',
    /above the maximum takeoff/,
  ],
  [
    'a landing mass below the empty mass',
    '/masses/maximumLanding',
    { value: 600, unit: 'kg' },
    'contradiction /masses/maximumLanding',
    /not above the empty/,
  ],
  ['a wing area in square feet', '/wing/area', { value: 166, unit: 'm2' }, 'implausible /wing/area', /wing loading/],
  ['a span in feet', '/wing/span', { value: 34, unit: 'm' }, 'implausible /wing/span', /aspect ratio/],
  [
    'a wing above its own half span',
    '/wing/heightAboveGround',
    { value: 5.3, unit: 'm' },
    'implausible /wing/heightAboveGround',
    /half the span/,
  ],
  ['two engines on a single', '/engines', 2, 'contradiction /engines', /single-piston/],
  [
    'a jet in a piston aeroplane',
    '/propulsion',
    { kind: 'jet', staticThrust: { value: 2400, unit: 'N' } },
    'contradiction /propulsion/kind',
    /not driven by jet/,
  ],
  [
    'a single by the large aeroplane code',
    '/certification/basis',
    'cs-25',
    'contradiction /certification/basis',
    /two or more engines/,
  ],
  [
    'a single by the commuter category',
    '/certification/basis',
    'cs-23-commuter',
    'contradiction /certification/basis',
    /two or more engines/,
  ],
  [
    'engine-out figures of a single',
    '/engineOut',
    { vmc: { value: 60, unit: 'kt' } },
    'contradiction /engineOut',
    /no second engine/,
  ],
  [
    'thrust in pounds',
    '/propulsion/staticThrust',
    { value: 240, unit: 'N' },
    'implausible /propulsion/staticThrust',
    /of the weight/,
  ],
  [
    'power of a toy',
    '/propulsion',
    { kind: 'constant-speed', power: { value: 13, unit: 'kW' }, propellerDiameter: { value: 1.9, unit: 'm' } },
    'implausible /propulsion/power',
    /W for each kilogram/,
  ],
  [
    'a lift coefficient nobody reaches',
    `${landing}/maximumLift/coefficient`,
    3.6,
    `implausible ${landing}/maximumLift/coefficient`,
    /outside what aeroplanes reach/,
  ],
  [
    'a stall speed in km/h called knots',
    `${takeoff}/maximumLift/stallSpeed`,
    { value: 93, unit: 'kt' },
    `implausible ${takeoff}/maximumLift/stallSpeed`,
    /In km\/h it would fit/,
  ],
  [
    'a stall speed of another mass',
    `${takeoff}/maximumLift/mass`,
    { value: 2271, unit: 'kg' },
    `implausible ${takeoff}/maximumLift/stallSpeed`,
    /coefficient/,
  ],
  [
    'more lift in the roll than at the stall',
    `${landing}/groundLiftCoefficient`,
    1.95,
    `contradiction ${landing}/groundLiftCoefficient`,
    /not below the maximum/,
  ],
  [
    'drag below nothing',
    `${takeoff}/airDragIncrementCoefficient`,
    -0.034,
    `contradiction ${takeoff}/airDragIncrementCoefficient`,
    /not above 0/,
  ],
  [
    'lift-off before rotation',
    `${takeoff}/speeds/rotation/stallRatio`,
    1.22,
    `contradiction ${takeoff}/speeds/liftOff`,
    /liftOff .* below rotation/,
  ],
  [
    'a screen speed below lift-off',
    `${takeoff}/speeds/screen/stallRatio`,
    1.1,
    `contradiction ${takeoff}/speeds/screen`,
    /screen .* below liftOff/,
  ],
  [
    'lift-off below the stall',
    `${takeoff}/speeds/liftOff/cas`,
    { value: 44, unit: 'kt' },
    `implausible ${takeoff}/speeds/liftOff/cas`,
    /times the stall speed/,
  ],
  [
    'touchdown above the reference speed',
    `${landing}/speeds/touchdown/stallRatio`,
    1.4,
    `contradiction ${landing}/speeds/landingReference`,
    /below touchdown/,
  ],
  ['a use named twice', `${takeoff}/for`, ['takeoff', 'takeoff'], `contradiction ${takeoff}/for/1`, /twice/],
  [
    'indicated speeds that fall',
    '/airspeedCalibration/rows',
    [
      [40, 46],
      [60, 62],
      [59, 99],
    ],
    'contradiction /airspeedCalibration/rows/2/0',
    /must rise/,
  ],
  [
    'calibrated speeds that stand still',
    '/airspeedCalibration/rows',
    [
      [40, 46],
      [60, 46],
      [100, 99],
    ],
    'contradiction /airspeedCalibration/rows/1/1',
    /must rise/,
  ],
  [
    'a calibration of another unit',
    '/airspeedCalibration/columns',
    [
      { name: 'indicated', unit: 'kt' },
      { name: 'calibrated', unit: 'km/h' },
    ],
    'implausible /airspeedCalibration/rows/0',
    /units of the two columns/,
  ],
  [
    'measured thrust out of order',
    '/propulsion',
    {
      kind: 'measured',
      columns: [
        { name: 'trueAirspeed', unit: 'kt' },
        { name: 'thrust', unit: 'N' },
      ],
      rows: [
        [0, 2400],
        [40, 2000],
        [40, 1900],
      ],
      density: { value: 1.2, unit: 'kg/m3' },
      densityExponent: 1,
    },
    'contradiction /propulsion/rows/2/0',
    /must rise/,
  ],
  ['no configuration', '/configurations', {}, 'missing /configurations', /0 configurations/],
];

describe('what a definition says against itself', () => {
  it('nothing, where it is in order', () => {
    expect(checkAeroplane(sampleDefinition(), at)).toEqual([]);
  });

  it.each(slips)('%s gives one fault', (_, pointer, value, fault, says) => {
    const slipped = withMember(sampleDefinition(), pointer, value);
    expect(aeroplaneDefinition.safeParse(slipped).error).toBeUndefined();
    const faults = checkAeroplane(slipped, at);
    expect(named(faults)).toEqual([fault.replace(' ', ` ${at}`)]);
    expect(`${faults[0]?.message} ${faults[0]?.hint}`).toMatch(says);
  });

  it('an indicated stall speed needs the calibration, and one that reaches it', () => {
    const indicated = withMember(sampleDefinition(), `${takeoff}/maximumLift/type`, 'ias');
    expect(checkAeroplane(indicated, at)).toEqual([]);
    expect(named(checkAeroplane(withMember(indicated, '/airspeedCalibration', undefined), at))).toEqual([
      `missing ${at}/airspeedCalibration`,
    ]);
    const low = withMember(indicated, `${takeoff}/maximumLift/stallSpeed`, { value: 39, unit: 'kt' });
    expect(named(checkAeroplane(low, at))).toEqual([`contradiction ${at}${takeoff}/maximumLift/stallSpeed`]);
  });

  it('25 configurations are too many, 24 are not', () => {
    const one = sampleDefinition().configurations['landing-full'];
    const many = (n: number) => Object.fromEntries(Array.from({ length: n }, (_, i) => [`landing-${i}`, one]));
    expect(checkAeroplane(withMember(sampleDefinition(), '/configurations', many(24)), at)).toEqual([]);
    expect(named(checkAeroplane(withMember(sampleDefinition(), '/configurations', many(25)), at))).toEqual([
      `out-of-range ${at}/configurations`,
    ]);
  });

  it('several slips give several faults', () => {
    const slipped = withMember(withMember(sampleDefinition(), '/engines', 2), '/wing/span', { value: 34, unit: 'm' });
    expect(named(checkAeroplane(slipped, at))).toEqual([`implausible ${at}/wing/span`, `contradiction ${at}/engines`]);
  });
});

describe('one engine out', () => {
  it('names a configuration of the approach that is there', () => {
    const approach = (configuration: string) =>
      checkAeroplane(
        { ...sampleDefinition(), engineOut: { approach: { configuration, airDragIncrementCoefficient: 0.01 } } },
        '',
      ).filter(({ code }) => code === 'unknown-id');
    expect(approach('takeoff-11')).toMatchObject([
      { pointer: '/engineOut/approach/configuration', received: 'takeoff-11' },
    ]);
    expect(approach('takeoff-10')).toEqual([]);
  });
});
