import { surfaceKinds, surfaceStates } from '../planning/question.ts';
import type { RuleSet } from '../planning/rules/rule-set.ts';

const slopes = [-0.02, 0, 0.01, 0.02];
const lengths = [
  { tora: 1000, toda: undefined, asda: undefined },
  { tora: 1000, toda: 1000, asda: 1000 },
  { tora: 1000, toda: 1200, asda: undefined },
  { tora: 1000, toda: undefined, asda: 1200 },
  { tora: 1000, toda: 1200, asda: 1200 },
];

/**
 * Every figure of a rule set in one tree: what is written down, and what its functions give over all surfaces, some slopes
 * and each pattern of declared distances. A changed figure changes the tree, and so the digest that answers carry.
 */
export function ruleSetFigures({ id, source, windCredit, thinMargin, takeoff }: RuleSet) {
  const surfaces = surfaceKinds.flatMap((kind) =>
    surfaceStates.flatMap((state) => [undefined, 'firm', 'soft'].map((firmness) => ({ kind, state, firmness }))),
  );
  return {
    id,
    source,
    windCredit,
    thinMargin,
    clearwayShare: takeoff.clearwayShare,
    startsFrom: takeoff.startsFrom,
    runwayFactors: surfaces.flatMap(({ kind, state, firmness }) =>
      slopes.map(
        (slope) =>
          takeoff.runwayFactors(
            { kind, state, ...(firmness === 'firm' || firmness === 'soft' ? { firmness } : {}) },
            slope,
          ) ?? 'none',
      ),
    ),
    requirements: lengths.map((published) =>
      takeoff.requirements({ published, credited: published, clearwayNotCredited: undefined }),
    ),
  };
}
