import { certifiedTakeoff } from '../certification/certified-takeoff.ts';
import { transportTakeoffClimbs } from '../certification/transport-climbs.ts';
import { clearwayShare } from '../clearway-share.ts';
import type { TakeoffRules } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

/** CAT.POL.A.205: takeoff of class A aeroplanes, with one decision speed for going on and for stopping. */
export const euClassATakeoff: TakeoffRules = {
  source: 'EuAirOps205',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('EuAirOps205', ', (c)(5)'),
  surfaces: [],
  readings: certifiedTakeoff('EuAirOps205'),
  demands: transportTakeoffClimbs,
  clearwayShare,
  nothingBeyond: 'the check of a length that is not declared is not assessed',
};
