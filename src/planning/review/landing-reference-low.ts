import { minimumToOneG } from '../../performance/speeds/maximum-lift-coefficient.ts';
import { referenceSpeedRules } from '../rules/certification/reference-speed.ts';
import type { FindingTest } from './finding-test.ts';
import { overStall } from './over-stall.ts';
import { configurationsOf } from './review-context.ts';

/** A landing reference speed below that of the certification basis; answers raise it. */
export const landingReferenceLow: FindingTest = {
  code: 'landing-reference-low',
  severity: 'caution',
  meaning:
    'The landing reference speed is below that of the certification basis (1.3 times the stall speed, transport 1.23); answers raise it where the basis binds.',
  test: (context) => {
    const rule = referenceSpeedRules[context.aeroplane.certification.basis];
    return configurationsOf(context, 'landing').flatMap(({ id, configuration, at }) => {
      const speed = configuration.speeds?.landingReference;
      if (speed === undefined) return [];
      const { maximumLift } = configuration;
      const ofMinimum =
        rule.ofMinimumSpeed && maximumLift.kind === 'stall-speed' && maximumLift.definition === 'minimum';
      const ratio = overStall(speed, context.aeroplane, configuration) / (ofMinimum ? minimumToOneG : 1);
      if (ratio >= rule.stallRatio * (1 - 1e-3)) return [];
      return [
        {
          message: `The landing reference speed in ${id} is ${ratio.toFixed(2)} times the stall speed; ${rule.phrase} is the rule.`,
          at: `${at}/speeds/landingReference`,
          value: ratio,
          threshold: rule.stallRatio,
          source: rule.source,
          hint: 'One of the two speeds may be indicated, or of another mass.',
        },
      ];
    });
  },
};
