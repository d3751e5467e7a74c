import type { FindingTest } from './finding-test.ts';
import { configurationsOf } from './review-context.ts';

/** Speeds stated as calibrated, and no page that tells calibrated from indicated. */
export const calibrationNotGiven: FindingTest = {
  code: 'calibration-not-given',
  severity: 'note',
  meaning:
    'Speeds are stated as calibrated and there is no airspeed calibration: manuals usually print indicated ones, and answers cannot show indicated speeds.',
  source: 'Cfr1s1',
  test: (context) => {
    if (context.aeroplane.airspeedCalibration !== undefined) return [];
    const [first] = [
      ...configurationsOf(context).flatMap(({ configuration, at }) => [
        ...(configuration.maximumLift.kind === 'stall-speed' ? [`${at}/maximumLift/type`] : []),
        ...Object.entries(configuration.speeds ?? {}).flatMap(([name, speed]) =>
          speed?.kind === 'cas' ? [`${at}/speeds/${name}`] : [],
        ),
      ]),
      ...context.speedTables.map(({ at }) => `${at}/airspeed`),
    ];
    if (first === undefined) return [];
    return [
      {
        message: `${first} is stated as calibrated, and there is no airspeed calibration. An indicated stall speed taken as calibrated is several knots low, and every distance short.`,
        at: '/airspeedCalibration',
        hint: 'Type in the calibration page, and give the speeds as printed.',
      },
    ];
  },
};
