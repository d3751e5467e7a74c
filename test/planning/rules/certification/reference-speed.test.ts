import { describe, it } from 'vitest';
import { referenceSpeedRules } from '../../../../src/planning/rules/certification/reference-speed.ts';
import { landingDefaults } from '../../../../src/planning/rules/landing-defaults.ts';
import { takeoffDefaults } from '../../../../src/planning/rules/takeoff-defaults.ts';
import { approachGradients, referenceRatios, screenRatios } from '../../../published/certification.ts';
import { expectNear } from '../../../support/near.ts';

describe('speeds and angles of certification', () => {
  it.each(referenceRatios)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(referenceSpeedRules[inputs.basis].stallRatio, expected, tolerance);
  });
  it.each(screenRatios)('$title', ({ expected, tolerance }) => {
    expectNear(takeoffDefaults.screenStallRatio.value, expected, tolerance);
  });
  it.each(approachGradients)('$title', ({ expected, tolerance }) => {
    expectNear(100 * Math.tan(landingDefaults.approachAngle.value), expected, tolerance);
  });
});
