import { type Surface, surfaceKinds, surfaceStates } from '../planning/question.ts';
import type { PhaseRules, RuleSet } from '../planning/rules/rule-set.ts';

const slopes = [-0.02, -0.01, 0, 0.01, 0.02];
const lengths = [
  { tora: 1000, toda: undefined, asda: undefined },
  { tora: 1000, toda: 1000, asda: 1000 },
  { tora: 1000, toda: 1200, asda: undefined },
  { tora: 1000, toda: undefined, asda: 1200 },
  { tora: 1000, toda: 1200, asda: 1200 },
].map((published) => ({ ...published, lda: 1000 }));
const grounds: readonly Pick<Surface, 'grass' | 'firmness'>[] = [
  {},
  { firmness: 'firm' },
  { firmness: 'soft' },
  { grass: 'short' },
  { grass: 'long' },
];
const surfaces: readonly Surface[] = surfaceKinds.flatMap((kind) =>
  surfaceStates.flatMap((state) => grounds.map((ground) => ({ kind, state, ...ground }))),
);

/**
 * Every figure of a rule set in one tree: what is written down, and what its functions give over all surfaces, some slopes
 * and each pattern of declared distances. A changed figure changes the tree, and so the digest that answers carry.
 */
export function ruleSetFigures({ id, source, windCredit, thinMargin, takeoff, landing }: RuleSet) {
  return {
    id,
    source,
    windCredit,
    thinMargin,
    clearwayShare: takeoff.clearwayShare,
    takeoff: phaseFigures(takeoff),
    landing: phaseFigures(landing),
  };
}

function phaseFigures({ startsFrom, runwayFactors, requirements }: PhaseRules) {
  return {
    startsFrom,
    runwayFactors: surfaces.flatMap((surface) => slopes.map((slope) => runwayFactors(surface, slope) ?? 'none')),
    requirements: lengths.map((published) =>
      requirements({ published, credited: published, clearwayNotCredited: undefined }),
    ),
  };
}
