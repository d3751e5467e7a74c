import { commuterTakeoff, transportTakeoff } from '../certification/certified-takeoff.ts';
import { transportTakeoffClimbs } from '../certification/transport-climbs.ts';
import { clearwayShare } from '../clearway-share.ts';
import { isCommuter } from '../named-aeroplanes.ts';
import type { Reading, TakeoffRules } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';
import { isLargeNontransport } from './large-nontransport.ts';

const commuter: readonly Reading[] = commuterTakeoff('Cfr135s398').map(({ when, holds, requirements }) => ({
  when: `commuter category, ${when}`,
  holds: (asked) => isCommuter(asked.aeroplane) && holds(asked),
  requirements,
}));

/** 135.379, 135.389, 135.398 and 135.399: takeoff by category and size. */
export const usPart135Takeoff: TakeoffRules = {
  source: 'Cfr135s379',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('Cfr135s367'),
  surfaces: [],
  readings: [
    ...transportTakeoff('Cfr135s379'),
    ...commuter,
    {
      when: 'large aeroplane outside the transport and commuter categories',
      holds: isLargeNontransport,
      requirements: [
        {
          code: 'accelerate-stop',
          of: 'accelerateStopDistance',
          against: 'tora',
          notAssessed:
            'a stop within the effective length from 105 % of the minimum control speed or 115 % of the stall speed is not computed',
          source: 'Cfr135s389',
        },
      ],
    },
    {
      when: 'small aeroplane outside the transport and commuter categories',
      holds: () => true,
      requirements: [{ code: 'takeoff-run', of: 'takeoffDistance', against: 'tora', source: 'Cfr135s399' }],
    },
  ],
  demands: transportTakeoffClimbs,
  clearwayShare,
  nothingBeyond: 'for transport and commuter aeroplanes the check of a length that is not declared is not assessed',
};
