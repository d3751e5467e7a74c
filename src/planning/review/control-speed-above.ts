import { referenceSpeedRules } from '../rules/certification/reference-speed.ts';
import type { FindingTest } from './finding-test.ts';
import { overStall, stallAt } from './over-stall.ts';
import { configurationsOf, textIn } from './review-context.ts';

/** Over the minimum control speed: rotation, and the speed at the screen. @see references.Cfr23s51 */
const least = { rotation: 1.05, screen: 1.1 };

/** Speeds of the procedure that keep too little above the minimum control speed, at the maximum masses. */
export const controlSpeedAbove: FindingTest = {
  code: 'control-speed-above',
  severity: 'caution',
  meaning:
    'At the maximum mass rotation is below 1.05, the screen below 1.10, or the landing reference speed below 1.00 to 1.05 times the minimum control speed.',
  source: 'Cfr23s51',
  test: (context) => {
    const { aeroplane } = context;
    const vmc = aeroplane.engineOut?.vmc;
    if (vmc === undefined) return [];
    const { maximumTakeoff, maximumLanding = maximumTakeoff } = aeroplane.masses;
    const rule = referenceSpeedRules[aeroplane.certification.basis];
    return configurationsOf(context).flatMap(({ id, configuration, at }) => {
      const { speeds = {} } = configuration;
      const asked = [
        ['rotation', speeds.rotation ?? speeds.liftOff, least.rotation, maximumTakeoff],
        ['screen', speeds.screen, least.screen, maximumTakeoff],
        ['landingReference', speeds.landingReference, rule.controlRatio, maximumLanding],
      ] as const;
      return asked.flatMap(([name, speed, ratio, mass]) => {
        if (speed === undefined || ratio === undefined) return [];
        const stands = name === 'rotation' && speeds.rotation === undefined ? 'liftOff' : name;
        const cas = overStall(speed, aeroplane, configuration) * stallAt(aeroplane, configuration, mass);
        if (cas >= ratio * vmc * (1 - 1e-3)) return [];
        return [
          {
            message: `${stands} in ${id} is ${textIn(context, 'speed', cas)} at ${textIn(context, 'mass', mass)}; ${ratio} times the minimum control speed is ${textIn(context, 'speed', ratio * vmc)}.`,
            at: `${at}/speeds/${stands}`,
            value: cas / vmc,
            threshold: ratio,
          },
        ];
      });
    });
  },
};
