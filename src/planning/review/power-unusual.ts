import { g0 } from '../../physics/constants.ts';
import type { FindingTest, Raised } from './finding-test.ts';
import { textIn } from './review-context.ts';

/** Shaft power of all engines over the maximum takeoff mass [W/kg], and static thrust over weight. @see references.Judgement */
const usual = {
  power: { piston: [70, 300], electric: [70, 350], turboprop: [110, 600] },
  thrust: { propeller: [0.18, 0.6], jet: [0.2, 0.6] },
} as const;

/** Much or little power or thrust for the mass. */
export const powerUnusual: FindingTest = {
  code: 'power-unusual',
  severity: 'caution',
  meaning:
    'Power or static thrust of all engines against the maximum takeoff mass is outside what aeroplanes of the category have: another unit, or that of all engines in place of one.',
  source: 'Judgement',
  test: (context) => {
    const { propulsion, engines, masses, category } = context.aeroplane;
    const mass = masses.maximumTakeoff;
    const found: Raised[] = [];
    if ('power' in propulsion) {
      const engine = category.split('-')[1] as keyof typeof usual.power;
      const [low, high] = usual.power[engine] ?? usual.power.turboprop;
      const loading = (engines * propulsion.power) / mass;
      if (loading < low || loading > high) {
        found.push({
          message: `${textIn(context, 'power', propulsion.power)} of each of ${engines === 1 ? 'one engine' : 'two engines'} at ${textIn(context, 'mass', mass)} is ${Math.round(loading)} W/kg; usual is ${low} to ${high} W/kg.`,
          at: '/propulsion/power',
          value: loading,
          threshold: loading < low ? low : high,
          hint: 'Power is of one engine; check its unit.',
        });
      }
    }
    const thrust = propulsion.kind === 'measured' ? propulsion.thrusts[0] : propulsion.staticThrust;
    if (thrust !== undefined) {
      const [low, high] = usual.thrust[category.endsWith('jet') ? 'jet' : 'propeller'];
      const ratio = (engines * thrust) / (mass * g0);
      if (ratio < low || ratio > high) {
        found.push({
          message: `The thrust at rest of all engines is ${ratio.toFixed(2)} of the weight at ${textIn(context, 'mass', mass)}; usual is ${low} to ${high}.`,
          at: propulsion.kind === 'measured' ? '/propulsion/rows/0' : '/propulsion/staticThrust',
          value: ratio,
          threshold: ratio < low ? low : high,
          hint: 'Thrust is of one engine; check its unit.',
        });
      }
    }
    return found;
  },
};
